import { chakra } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { useDeferredValue, useState } from 'react';
import { useParams } from 'react-router-dom';
import { Field } from '../../components/forms/field';
import { TextInput } from '../../components/forms/text-input';
import { stockQuery } from './api';
import { DeskFrame } from './desk-frame';
import { StockRow } from './stock-row';

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
      <chakra.table
        role="table"
        display={{ base: 'block', md: 'table' }}
        width="full"
        borderBottomWidth="1px"
        borderColor="hair"
        fontVariantNumeric="tabular-nums"
      >
        <chakra.caption srOnly>Stock, prices in pounds with VAT</chakra.caption>
        <chakra.thead role="rowgroup" display={{ base: 'none', md: 'table-header-group' }}>
          <tr role="row">
            <Head role="columnheader">Item</Head>
            <Head role="columnheader" width="8rem" textAlign="right">
              Price, £
            </Head>
            <Head role="columnheader" width="7rem" textAlign="right">
              On hand
            </Head>
            <Head role="columnheader" width="5rem" textAlign="right">
              Held
            </Head>
            <Head role="columnheader" width="7rem" textAlign="right">
              Lead, days
            </Head>
            <Head role="columnheader" width="6.5rem">
              <chakra.span srOnly>Save</chakra.span>
            </Head>
          </tr>
        </chakra.thead>
        <chakra.tbody role="rowgroup" display={{ base: 'block', md: 'table-row-group' }}>
          {rows.map((row) => (
            <StockRow key={row.listingId} orgId={orgId} row={row} />
          ))}
        </chakra.tbody>
      </chakra.table>
    </DeskFrame>
  );
}
