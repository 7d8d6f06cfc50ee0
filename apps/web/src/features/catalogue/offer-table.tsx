import type { ShopOffer } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { formatMoneyExact } from '../../lib/format-money';

const Cell = chakra('td', {
  base: { paddingBlock: '3', paddingRight: '6', verticalAlign: 'top', lineHeight: 'heading' },
  variants: { figure: { yes: { textAlign: 'right', whiteSpace: 'nowrap' }, no: {} } },
});
const Head = chakra('th', {
  base: {
    textAlign: 'left',
    color: 'slate',
    fontSize: 'sm',
    fontWeight: 'bold',
    lineHeight: 'heading',
    paddingBottom: '2',
    paddingRight: '6',
    verticalAlign: 'bottom',
  },
  variants: { figure: { yes: { textAlign: 'right' }, no: {} } },
});

const workingDays = (days: number): string =>
  days === 0
    ? 'sent the same working day'
    : days === 1
      ? 'sent in 1 working day'
      : `sent in ${days} working days`;
const onTheWay = (days: number): string => (days === 1 ? '1 day on the way' : `${days} days on the way`);

/** Which shops have it: price, carriage, both together, and how long it takes. */
export function OfferTable({ offers }: { offers: readonly ShopOffer[] }) {
  return (
    <chakra.table width="full" borderBottomWidth="1px" borderColor="hair">
      <chakra.caption srOnly>
        Shops that have it, cheapest with carriage first; all prices with VAT
      </chakra.caption>
      <thead>
        <tr>
          <Head scope="col">Shop</Head>
          <Head scope="col" display={{ base: 'none', md: 'table-cell' }}>
            Time
          </Head>
          <Head scope="col" figure="yes" display={{ base: 'none', md: 'table-cell' }}>
            Free
          </Head>
          <Head scope="col" figure="yes" display={{ base: 'none', md: 'table-cell' }}>
            Carriage
          </Head>
          <Head scope="col" figure="yes" paddingRight="0">
            Price
          </Head>
        </tr>
      </thead>
      <tbody>
        {offers.map((offer) => (
          <chakra.tr key={offer.shopId} borderTopWidth="1px" borderColor="hair">
            <chakra.th scope="row" textAlign="left" paddingBlock="3" paddingRight="4" lineHeight="heading">
              {offer.shopName}
              <chakra.span display="block" color="slate" fontSize="sm" fontWeight="normal">
                {offer.town}
                <chakra.span display={{ md: 'none' }}>
                  , {offer.available} free, {workingDays(offer.leadDays)}, {onTheWay(offer.carrierDays)}
                </chakra.span>
              </chakra.span>
            </chakra.th>
            <Cell display={{ base: 'none', md: 'table-cell' }}>
              {workingDays(offer.leadDays)}, {onTheWay(offer.carrierDays)}
            </Cell>
            <Cell figure="yes" display={{ base: 'none', md: 'table-cell' }}>
              {offer.available}
            </Cell>
            <Cell figure="yes" display={{ base: 'none', md: 'table-cell' }}>
              {formatMoneyExact(offer.carriageMinor)}
            </Cell>
            <Cell figure="yes" paddingRight="0">
              <chakra.span fontWeight="heavy" fontSize="lg">
                {formatMoneyExact(offer.priceMinor)}
              </chakra.span>
              <chakra.span display={{ base: 'block', md: 'none' }} color="slate" fontSize="sm">
                + {formatMoneyExact(offer.carriageMinor)} carriage
              </chakra.span>
            </Cell>
          </chakra.tr>
        ))}
      </tbody>
    </chakra.table>
  );
}
