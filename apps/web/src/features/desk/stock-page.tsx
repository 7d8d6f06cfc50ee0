import { patchStockBody, type StockRow } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useDeferredValue, useState } from 'react';
import { useParams } from 'react-router-dom';
import { Button } from '../../components/button';
import { Field, FieldError } from '../../components/forms/field';
import { parseNumber } from '../../components/forms/parse-number';
import { TextInput } from '../../components/forms/text-input';
import { isApiProblem } from '../../lib/api-problem';
import { patchStock, stockQuery } from './api';
import { DeskFrame } from './desk-frame';

const Cell = chakra('td', {
  base: {
    paddingBlock: '2',
    paddingRight: '4',
    borderTopWidth: '1px',
    borderColor: 'hair',
    verticalAlign: 'top',
  },
});
const Head = chakra('th', {
  base: { textAlign: 'left', color: 'slate', fontSize: 'sm', paddingBottom: '2', paddingRight: '4' },
});

/** A shop's stock, edited in place. */
export function StockPage() {
  const { orgId = '' } = useParams();
  const { data, error } = useQuery(stockQuery(orgId));
  const [typed, setTyped] = useState('');
  const word = useDeferredValue(typed).trim().toLowerCase();
  const rows = (data?.rows ?? []).filter(({ name }) => name.toLowerCase().includes(word));
  return (
    <DeskFrame title="Stock" error={error} ready={data !== undefined}>
      <chakra.div maxWidth="form">
        <Field id="find" label="Find an item">
          {(control) => (
            <TextInput
              {...control}
              type="search"
              value={typed}
              onChange={(event) => setTyped(event.target.value)}
            />
          )}
        </Field>
      </chakra.div>
      <chakra.p role="status" color="slate" fontSize="sm" marginBottom="3">
        {rows.length} of {data?.rows.length ?? 0} items
      </chakra.p>
      <chakra.div overflowX="auto" tabIndex={0} role="region" aria-label="Stock table">
        <chakra.table width="full" minWidth="44rem" fontVariantNumeric="tabular-nums">
          <chakra.caption srOnly>Stock, prices in pounds with VAT</chakra.caption>
          <thead>
            <tr>
              <Head>Item</Head>
              <Head width="8rem">Price, £</Head>
              <Head width="7rem">On hand</Head>
              <Head width="6rem">Held</Head>
              <Head width="7rem">Lead, days</Head>
              <Head width="7rem">
                <chakra.span srOnly>Save</chakra.span>
              </Head>
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <Row key={`${row.listingId}-${row.version}`} orgId={orgId} row={row} />
            ))}
          </tbody>
        </chakra.table>
      </chakra.div>
    </DeskFrame>
  );
}

const whole = (text: string): number | undefined => (/^\s*\d+\s*$/.test(text) ? Number(text) : undefined);

function Row({ orgId, row }: { orgId: string; row: StockRow }) {
  const queries = useQueryClient();
  const [price, setPrice] = useState((row.priceMinor / 100).toFixed(2));
  const [quantity, setQuantity] = useState(String(row.quantity));
  const [lead, setLead] = useState(String(row.leadDays));
  const [fault, setFault] = useState<string | null>(null);
  const pounds = parseNumber(price.replace('£', ''));
  const change = {
    priceMinor: pounds === null ? NaN : Math.round(pounds * 100),
    quantity: whole(quantity) ?? NaN,
    leadDays: whole(lead) ?? NaN,
  };
  const dirty =
    change.priceMinor !== row.priceMinor ||
    change.quantity !== row.quantity ||
    change.leadDays !== row.leadDays;
  const save = useMutation({
    mutationFn: () => patchStock(orgId, row.listingId, row.version, change),
    onSuccess: () => void queries.invalidateQueries({ queryKey: ['stock', orgId] }),
    onError: (error) => {
      if (isApiProblem(error) && error.status === 412) {
        setFault('Somebody changed this line meanwhile, or an order came in. Look at it again.');
        void queries.invalidateQueries({ queryKey: ['stock', orgId] });
      } else
        setFault(
          isApiProblem(error)
            ? (error.errors[0]?.detail ?? error.detail ?? error.title)
            : 'Not saved; try again.',
        );
    },
  });
  const send = () => {
    const parsed = patchStockBody.safeParse(change);
    if (!parsed.success) setFault('Enter a price such as 349.00, and whole numbers for quantity and days.');
    else {
      setFault(null);
      save.mutate();
    }
  };
  const faultId = `fault-${row.listingId}`;
  const field = (label: string, value: string, set: (text: string) => void) => (
    <TextInput
      aria-label={`${label}, ${row.name}`}
      aria-invalid={fault ? true : undefined}
      aria-describedby={fault ? faultId : undefined}
      inputMode="decimal"
      textAlign="right"
      value={value}
      onChange={(event) => set(event.target.value)}
    />
  );
  return (
    <tr>
      <Cell>
        {row.name}
        {fault ? <FieldError id={faultId}>{fault}</FieldError> : null}
      </Cell>
      <Cell>{field('Price in pounds', price, setPrice)}</Cell>
      <Cell>{field('On hand', quantity, setQuantity)}</Cell>
      <Cell textAlign="right" paddingTop="4">
        {row.reserved}
      </Cell>
      <Cell>{field('Lead days', lead, setLead)}</Cell>
      <Cell>
        {dirty ? (
          <Button tone="plain" busy={save.isPending && 'Saving'} onClick={send}>
            Save
          </Button>
        ) : null}
      </Cell>
    </tr>
  );
}
