export interface NeededItem {
  itemId: string;
  quantity: number;
}
export interface Offer {
  listingId: string;
  itemId: string;
  shopId: string;
  priceMinor: number;
  carriageMinor: number;
  available: number;
}
export interface Basket<O extends Offer = Offer> {
  offers: O[];
  /** Items and one carriage per shop, VAT included. */
  totalMinor: number;
}

/** Only the cheapest of each item are combined: a dearer one can win by at most a saved carriage. */
const offersPerItem = 8;

/**
 * The cheapest way to buy every item, one shop each, carriage once per shop: the exact optimum over all
 * combinations of the offers looked at. Ties go to the earlier listing id, so that equal baskets never flicker.
 * @returns null when something is not to be had in the quantity needed
 */
export function chooseOffers<O extends Offer>(
  needed: readonly NeededItem[],
  offers: readonly O[],
): Basket<O> | null {
  const choices = needed.map((need) =>
    offers
      .filter((offer) => offer.itemId === need.itemId && offer.available >= need.quantity)
      .sort((a, b) => a.priceMinor - b.priceMinor || (a.listingId < b.listingId ? -1 : 1))
      .slice(0, offersPerItem),
  );
  if (choices.some((list) => list.length === 0)) return null;

  let best: Basket<O> | null = null;
  const pick = (index: number, chosen: O[], totalMinor: number): void => {
    if (best && totalMinor >= best.totalMinor) return;
    const need = needed[index];
    if (!need) {
      best = { offers: [...chosen], totalMinor };
      return;
    }
    for (const offer of choices[index] ?? []) {
      const carriage = chosen.some((other) => other.shopId === offer.shopId) ? 0 : offer.carriageMinor;
      pick(index + 1, [...chosen, offer], totalMinor + offer.priceMinor * need.quantity + carriage);
    }
  };
  pick(0, [], 0);
  return best;
}
