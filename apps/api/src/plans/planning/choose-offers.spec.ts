import fc from 'fast-check';

import { chooseOffers, type Offer } from './choose-offers.js';

const offer = (o: Partial<Offer>): Offer => ({
  listingId: `${o.shopId}-${o.itemId}`,
  itemId: 'shock',
  shopId: 'a',
  priceMinor: 100,
  carriageMinor: 5,
  available: 9,
  ...o,
});

describe('the cheapest basket', () => {
  it('pays carriage once per shop, so one shop can beat the cheapest single prices', () => {
    const offers = [
      offer({ shopId: 'a', itemId: 'shock', priceMinor: 1000, carriageMinor: 600 }),
      offer({ shopId: 'b', itemId: 'shock', priceMinor: 1100, carriageMinor: 600 }),
      offer({ shopId: 'b', itemId: 'kit', priceMinor: 100, carriageMinor: 600 }),
    ];
    const basket = chooseOffers(
      [
        { itemId: 'shock', quantity: 1 },
        { itemId: 'kit', quantity: 1 },
      ],
      offers,
    );
    expect(basket?.totalMinor).toBe(1800);
    expect(basket?.offers.map((o) => o.shopId)).toEqual(['b', 'b']);
  });

  it('does not count a shop that has too few', () => {
    expect(chooseOffers([{ itemId: 'shock', quantity: 2 }], [offer({ available: 1 })])).toBeNull();
  });

  it('is never dearer than any combination', () => {
    const items = ['shock', 'kit', 'coil'];
    fc.assert(
      fc.property(
        fc.array(
          fc.record({
            itemId: fc.constantFrom(...items),
            shopId: fc.constantFrom('a', 'b', 'c'),
            priceMinor: fc.integer({ min: 1, max: 50_000 }),
          }),
          { maxLength: 9 },
        ),
        (drawn) => {
          const carriage: Record<string, number> = { a: 400, b: 700, c: 550 };
          const offers = drawn.map((o, i) =>
            offer({ ...o, listingId: String(i), carriageMinor: carriage[o.shopId] }),
          );
          const basket = chooseOffers(
            items.map((itemId) => ({ itemId, quantity: 1 })),
            offers,
          );
          const of = (itemId: string) => offers.filter((o) => o.itemId === itemId);
          let least = Infinity;
          for (const x of of('shock'))
            for (const y of of('kit'))
              for (const z of of('coil')) {
                const shops = new Set([x.shopId, y.shopId, z.shopId]);
                const sent = [...shops].reduce((sum, id) => sum + (carriage[id] ?? 0), 0);
                least = Math.min(least, x.priceMinor + y.priceMinor + z.priceMinor + sent);
              }
          expect(basket?.totalMinor ?? Infinity).toBe(least);
        },
      ),
      { numRuns: 300, seed: 11 },
    );
  });
});
