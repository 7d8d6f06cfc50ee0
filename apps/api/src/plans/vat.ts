/**
 * The VAT inside a price that includes it, in minor units: the price less its net, the net rounded half up.
 * Exact in integers: no product leaves 2^53 for prices we can take.
 * @param rateBp basis points, 2000 for 20 %
 */
export function vatWithin(totalMinor: number, rateBp: number): number {
  if (!Number.isSafeInteger(totalMinor) || totalMinor < 0) {
    throw new RangeError('a price is a whole number of pence');
  }
  const divisor = 10_000 + rateBp;
  const net = Math.floor((2 * totalMinor * 10_000 + divisor) / (2 * divisor));
  return totalMinor - net;
}
