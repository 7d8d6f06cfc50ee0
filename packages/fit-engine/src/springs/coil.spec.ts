import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { makeCurve } from '../kinematics/leverage-curve.js';
import { rateForSag, sagForRate } from './coil.js';

const made = makeCurve(
  {
    by: 'shock-travel',
    points: [
      [0, 2.9],
      [20, 2.7],
      [40, 2.45],
      [60, 2.3],
    ],
  },
  null,
  60,
);
if (!made.ok) throw new Error(made.reason);
const { curve } = made;
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('rate and sag', () => {
  it('of one another come back to the same sag', () => {
    fc.assert(
      fc.property(
        between(200, 1500),
        between(5, 55),
        between(0, 4),
        between(0, 150),
        (load, sag, preload, gas) => {
          const rate = rateForSag(curve, load, sag, preload, gas);
          const back = rate === null ? null : sagForRate(curve, load, rate, preload, gas);
          expect(back?.state).toBe('ok');
          if (back?.state === 'ok') expect(Math.abs(back.sagMm - sag)).toBeLessThan(1e-9);
        },
      ),
      { numRuns: 300, seed: 12 },
    );
  });

  it('a harder spring or a lighter rider sags less', () => {
    fc.assert(
      fc.property(between(300, 900), between(60, 140), between(1.01, 1.5), (load, rate, times) => {
        const sag = (n: number, k: number): number => {
          const found = sagForRate(curve, n, k, 1);
          return found.state === 'ok' ? found.sagMm : found.state === 'bottomed' ? 60 : 0;
        };
        expect(sag(load, rate * times)).toBeLessThanOrEqual(sag(load, rate));
        expect(sag(load / times, rate)).toBeLessThanOrEqual(sag(load, rate));
      }),
      { numRuns: 200, seed: 13 },
    );
  });

  it('says where there is no sag', () => {
    expect(sagForRate(curve, 100, 100, 10)).toEqual({ state: 'topped-out' });
    // Just carried at full extension: 29 N/mm x 10 mm = 100 N x 2.9.
    expect(sagForRate(curve, 100, 29, 10)).toEqual({ state: 'topped-out' });
    expect(sagForRate(curve, 5000, 50, 1)).toEqual({ state: 'bottomed' });
    expect(sagForRate(curve, 700, 0, 1)).toEqual({ state: 'bottomed' });
  });

  it('bottoms only when the load at full travel is greater than the spring', () => {
    const exact = (700 * curve.ratioAt(60)) / 60;
    expect(sagForRate(curve, 700, exact * 1.000001, 0).state).toBe('ok');
    expect(sagForRate(curve, 700, exact * 0.999999, 0).state).toBe('bottomed');
  });
});

describe('what is no number', () => {
  it.each([NaN, Infinity, -Infinity])('%s never gives one', (bad) => {
    expect(rateForSag(curve, bad, 18, 1)).toBeNull();
    expect(rateForSag(curve, 700, bad, 1)).toBeNull();
    expect(rateForSag(curve, 700, 18, bad)).toBeNull();
    expect(rateForSag(curve, 700, 18, 1, bad)).toBeNull();
    expect(sagForRate(curve, bad, 100, 1)).toEqual({ state: 'no-answer' });
    expect(sagForRate(curve, 700, bad, 1)).toEqual({ state: 'no-answer' });
    expect(sagForRate(curve, 700, 100, bad)).toEqual({ state: 'no-answer' });
    expect(sagForRate(curve, 700, 100, 1, bad)).toEqual({ state: 'no-answer' });
  });
  it('no rate for a sag of nothing without preload, beyond the stroke, or where gas carries all', () => {
    expect(rateForSag(curve, 700, 0, 0)).toBeNull();
    expect(rateForSag(curve, 700, 61, 0)).toBeNull();
    expect(rateForSag(curve, 700, -1, 5)).toBeNull();
    expect(rateForSag(curve, 50, 18, 1, 150)).toBeNull();
  });
});
