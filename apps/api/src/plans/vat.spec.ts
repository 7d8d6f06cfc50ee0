import fc from 'fast-check';

import { vatWithin } from './vat.js';

describe('VAT inside a price', () => {
  it.each([
    [1200, 2000, 200],
    [43_800, 2000, 7300],
    [1, 2000, 0],
    [3, 2000, 0], // a net of exactly 2.5 is rounded up
    // Python's decimal, half up on the net:
    [11_900, 1900, 1900],
    [999, 2000, 166],
    [1, 2100, 0],
    [999, 0, 0],
    [10_500, 500, 500],
  ])('of %i at %i basis points is %i', (total, rate, vat) => expect(vatWithin(total, rate)).toBe(vat));

  it('is within half a penny of the exact share, and never more than the price', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 10_000_000 }),
        fc.integer({ min: 0, max: 5000 }),
        (total, rate) => {
          const exact = (total * rate) / (10_000 + rate);
          expect(Math.abs(vatWithin(total, rate) - exact)).toBeLessThanOrEqual(0.5 + 1e-9);
          expect(vatWithin(total, rate)).toBeLessThanOrEqual(total);
        },
      ),
      { seed: 3 },
    );
  });
});
