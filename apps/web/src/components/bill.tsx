import type { LineView, SellerView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { formatMoneyExact } from '../lib/format-money';

const Cell = chakra('td', {
  base: { paddingBlock: '2', borderTopWidth: '1px', borderColor: 'hair', verticalAlign: 'top' },
});
const Sum = chakra('tr', {
  base: { fontWeight: 'heavy', '& > *': { borderTopWidth: '2px', borderColor: 'ink', paddingBlock: '2' } },
});

interface BillProps {
  lines: readonly LineView[];
  sellers: readonly SellerView[];
  totalMinor: number;
  vatMinor: number;
}

/** What is bought, line by line, and who sells it. All prices include VAT. */
export function Bill({ lines, sellers, totalMinor, vatMinor }: BillProps) {
  return (
    <>
      {sellers.map((seller) => (
        <chakra.section key={seller.id} marginBottom="6">
          <chakra.h3 fontSize="md" fontWeight="bold">
            Sold by {seller.name}
          </chakra.h3>
          <chakra.p color="slate" fontSize="sm" marginBottom="1">
            {seller.address.join(', ')}. VAT {seller.vatNumber}. {seller.phone}
          </chakra.p>
          <chakra.table width="full" fontVariantNumeric="tabular-nums">
            <chakra.caption srOnly>Lines of {seller.name}</chakra.caption>
            <tbody>
              {lines
                .filter((line) => line.sellerId === seller.id)
                .map((line, index) => (
                  <tr key={index}>
                    <Cell paddingRight="4">
                      {line.quantity > 1 ? `${line.quantity} x ` : ''}
                      {line.description}
                      {line.note ? (
                        <chakra.span display="block" color="slate" fontSize="sm">
                          {line.note}
                        </chakra.span>
                      ) : null}
                    </Cell>
                    <Cell textAlign="right" whiteSpace="nowrap">
                      {formatMoneyExact(line.totalMinor)}
                    </Cell>
                  </tr>
                ))}
            </tbody>
          </chakra.table>
        </chakra.section>
      ))}
      <chakra.table width="full" fontVariantNumeric="tabular-nums" fontSize="lg">
        <chakra.caption srOnly>Total</chakra.caption>
        <tbody>
          <Sum>
            <chakra.th scope="row" textAlign="left">
              Total, VAT included
            </chakra.th>
            <chakra.td textAlign="right">{formatMoneyExact(totalMinor)}</chakra.td>
          </Sum>
          <tr>
            <chakra.th scope="row" textAlign="left" fontWeight="normal" color="slate" fontSize="md">
              of which VAT
            </chakra.th>
            <chakra.td textAlign="right" color="slate" fontSize="md">
              {formatMoneyExact(vatMinor)}
            </chakra.td>
          </tr>
        </tbody>
      </chakra.table>
    </>
  );
}
