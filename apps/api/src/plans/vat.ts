/**
 * The VAT inside a price that includes it, in minor units, half a unit rounded up.
 * Exact in integers: total x rate / (10000 + rate) never leaves 2^53 for prices we can take.
 * @param rateBp basis points, 2000 for 20 %
 */
export function vatWithin(totalMinor: number, rateBp: number): number {
  if (!Number.isSafeInteger(totalMinor) || totalMinor < 0)
    throw new RangeError('a price is a whole number of pence');
  const divisor = 10_000 + rateBp;
  return Math.floor((2 * totalMinor * rateBp + divisor) / (2 * divisor));
}
