import { patchStockBody, type StockRow as Stock } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { Button } from '../../components/button';
import { FieldError } from '../../components/forms/field';
import { parseNumber } from '../../components/forms/parse-number';
import { TextInput } from '../../components/forms/text-input';
import { isApiProblem } from '../../lib/api-problem';
import { patchStock } from './api';

/** On a telephone a line is a small card, its figures side by side; the roles keep it a table for all. */
const Line = chakra('tr', {
  base: {
    display: { base: 'grid', md: 'table-row' },
    gridTemplateColumns: 'minmax(0, 5fr) minmax(0, 4fr) minmax(0, 3fr) minmax(0, 4fr)',
    columnGap: '2',
    alignItems: 'start',
    borderTopWidth: '1px',
    borderColor: 'hair',
    paddingBlock: { base: '3', md: '0' },
  },
});
const Cell = chakra('td', {
  base: {
    paddingBlock: { base: '1', md: '2' },
    paddingRight: { base: '0', md: '4' },
    verticalAlign: 'top',
  },
});
const Wide = { gridColumn: { base: '1 / -1', md: 'auto' } };

/** The column's head, where there are no columns. */
const Above = ({ children }: { children: ReactNode }) => (
  <chakra.span aria-hidden display={{ base: 'block', md: 'none' }} color="slate" fontSize="sm">
    {children}
  </chakra.span>
);

const whole = (text: string): number => (/^\s*\d+\s*$/.test(text) ? Number(text) : NaN);
const pounds = (text: string): number => {
  const value = parseNumber(text.replace('£', ''));
  return value === null ? NaN : Math.round(value * 100);
};

type Typed = Partial<Record<'price' | 'quantity' | 'lead', string>>;

/** One line of the stock. What was typed stays, whatever happens to the line meanwhile, until it is saved. */
export function StockRow({ orgId, row }: { orgId: string; row: Stock }) {
  const queries = useQueryClient();
  const [typed, setTyped] = useState<Typed>({});
  const [fault, setFault] = useState<string | null>(null);
  const shown = {
    price: typed.price ?? (row.priceMinor / 100).toFixed(2),
    quantity: typed.quantity ?? String(row.quantity),
    lead: typed.lead ?? String(row.leadDays),
  };
  const change = {
    priceMinor: pounds(shown.price),
    quantity: whole(shown.quantity),
    leadDays: whole(shown.lead),
  };
  const dirty =
    change.priceMinor !== row.priceMinor ||
    change.quantity !== row.quantity ||
    change.leadDays !== row.leadDays;
  const fetchAgain = () => queries.invalidateQueries({ queryKey: ['stock', orgId] });
  const save = useMutation({
    mutationFn: () => patchStock(orgId, row.listingId, row.version, change),
    onSuccess: async () => {
      await fetchAgain();
      setTyped({});
    },
    onError: async (error) => {
      if (isApiProblem(error) && error.status === 412) {
        await fetchAgain();
        setFault('This line changed meanwhile, by a colleague or an order. Compare with “Now”, then save.');
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
    setFault(
      parsed.success ? null : 'Enter a price such as 349.00, and whole numbers for quantity and days.',
    );
    if (parsed.success) save.mutate();
  };
  const faultId = `fault-${row.listingId}`;
  const field = (name: keyof Typed, label: string) => (
    <TextInput
      aria-label={`${label}, ${row.name}`}
      aria-invalid={fault ? true : undefined}
      aria-describedby={fault ? faultId : undefined}
      inputMode={name === 'price' ? 'decimal' : 'numeric'}
      textAlign="right"
      value={shown[name]}
      onChange={(event) => setTyped((before) => ({ ...before, [name]: event.target.value }))}
      onKeyDown={(event) => {
        if (event.key === 'Enter' && dirty) send();
      }}
    />
  );
  return (
    <Line role="row">
      <Cell role="cell" {...Wide} paddingTop={{ base: '1', md: '4' }}>
        <chakra.span fontWeight={{ base: 'bold', md: 'normal' }}>{row.name}</chakra.span>
        {fault ? (
          <>
            <FieldError id={faultId}>{fault}</FieldError>
            <chakra.span display="block" color="slate" fontSize="sm">
              Now: £{(row.priceMinor / 100).toFixed(2)}, {row.quantity} on hand, {row.leadDays} days
            </chakra.span>
          </>
        ) : null}
      </Cell>
      <Cell role="cell">
        <Above>Price, £</Above>
        {field('price', 'Price in pounds')}
      </Cell>
      <Cell role="cell">
        <Above>On hand</Above>
        {field('quantity', 'On hand')}
      </Cell>
      <Cell role="cell" textAlign="right" paddingTop={{ base: '1', md: '4' }}>
        <Above>Held</Above>
        <chakra.span display="block" paddingTop={{ base: '3', md: '0' }}>
          {row.reserved}
        </chakra.span>
      </Cell>
      <Cell role="cell">
        <Above>Lead, days</Above>
        {field('lead', 'Lead days')}
      </Cell>
      <Cell role="cell" {...Wide} textAlign="right" paddingRight="0">
        {dirty ? (
          <Button tone="plain" busy={save.isPending && 'Saving'} onClick={send}>
            Save
          </Button>
        ) : null}
      </Cell>
    </Line>
  );
}
