import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import type { AirChambers } from '../../src/facts.js';
import { makeCurve } from '../../src/kinematics/leverage-curve.js';
import { airForceN, fillForSag, sagForFill } from '../../src/springs/air.js';
import { rateForSag, sagForRate } from '../../src/springs/coil.js';

const runs = { numRuns: 3000, seed: 20261201 } as const;
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const patm = 101.325;

/** Frames of one to four pieces of leverage, falling or rising, with strokes of the trade. */
const curves = fc
  .tuple(
    fc.constantFrom(37.5, 45, 50, 55, 60, 65, 75),
    fc.array(between(1.8, 3.4), { minLength: 2, maxLength: 5 }),
  )
  .map(([stroke, ratios]) => {
    const points = ratios.map((ratio, i) => [(stroke * i) / (ratios.length - 1), ratio] as const);
    const made = makeCurve({ by: 'shock-travel', points }, null, stroke);
    if (!made.ok) throw new Error(made.reason);
    return made.curve;
  });

/** Chambers that leave a tenth to a half of the air at the end of the longest stroke. */
const chambers = fc
  .tuple(between(700, 1600), between(0.5, 0.95), between(0.1, 0.5), between(8, 25))
  .map(([areaMm2, share, left, negativeMm]): AirChambers => ({
    areaMm2,
    negativeAreaMm2: share * areaMm2,
    volumeMm3: (areaMm2 * 75) / (1 - left),
    negativeVolumeMm3: share * areaMm2 * negativeMm,
  }));
const load = between(250, 1300);
const share = between(0.05, 0.95);

describe('springs, whatever the frame', () => {
  it('an air spring pushes harder the further it is compressed', () => {
    fc.assert(
      fc.property(chambers, curves, share, between(200, 2500), between(1, 1.4), (c, curve, at, gauge, n) => {
        const s = at * curve.strokeMm;
        const force = (mm: number): number => airForceN(c, mm, gauge + patm, patm, n);
        expect(force(Math.min(s + 0.5, curve.strokeMm))).toBeGreaterThan(force(s));
      }),
      runs,
    );
  });

  it('filled for a sag, it balances there; more pressure never lets it sag further', () => {
    let asked = 0;
    fc.assert(
      fc.property(chambers, curves, share, load, between(1.01, 2), (c, curve, at, loadN, times) => {
        const sagMm = at * curve.strokeMm;
        const fill = fillForSag(c, curve, loadN, sagMm, patm);
        if (fill === null) return;
        asked += 1;
        const surplus = (s: number): number =>
          airForceN(c, s, fill + patm, patm, 1) - loadN * curve.ratioAt(s);
        expect(Math.abs(surplus(sagMm))).toBeLessThan(1e-6);
        const found = sagForFill(c, curve, loadN, fill, patm);
        // A ratio that rises steeply may balance more than once: what is found must balance as well.
        if (found.state === 'ok') expect(Math.abs(surplus(found.sagMm))).toBeLessThan(1e-6);
        const firmer = sagForFill(
          c,
          { ...curve, ratioAt: () => curve.ratioAt(sagMm) },
          loadN,
          fill * times,
          patm,
        );
        if (firmer.state === 'ok') expect(firmer.sagMm).toBeLessThan(sagMm + 1e-9);
        else expect(firmer.state).toBe('topped-out');
      }),
      runs,
    );
    expect(asked).toBeGreaterThan(2000);
  });

  it('the rate for a sag balances there, and gives it back where the leverage does not rise', () => {
    let back = 0;
    fc.assert(
      fc.property(curves, share, load, between(0, 5), between(0, 150), (curve, at, loadN, preload, gas) => {
        const sagMm = at * curve.strokeMm;
        const rate = rateForSag(curve, loadN, sagMm, preload, gas);
        if (rate === null) return;
        const surplus = (s: number): number => rate * (s + preload) + gas - loadN * curve.ratioAt(s);
        expect(Math.abs(surplus(sagMm))).toBeLessThan(1e-6);
        const found = sagForRate(curve, loadN, rate, preload, gas);
        if (found.state === 'ok') expect(Math.abs(surplus(found.sagMm))).toBeLessThan(1e-6);
        const slopes = Array.from({ length: 40 }, (_, i) => curve.slopeAt((curve.strokeMm * i) / 39));
        if (slopes.some((slope) => slope > 0)) return;
        back += 1;
        expect(found.state === 'ok' ? Math.abs(found.sagMm - sagMm) : NaN).toBeLessThan(1e-6);
      }),
      runs,
    );
    expect(back).toBeGreaterThan(500);
  });

  it('a stiffer coil or a lighter rider never sags further', () => {
    fc.assert(
      fc.property(
        curves,
        load,
        between(40, 160),
        between(1, 2),
        between(0, 5),
        (curve, loadN, rate, times, pre) => {
          // Where the leverage rises there may be more than one balance: a mean leverage has one.
          const mean = { ...curve, ratioAt: () => curve.meanRatio };
          const sag = (weight: number, stiff: number): number => {
            const found = sagForRate(mean, weight, stiff, pre);
            return found.state === 'ok' ? found.sagMm : found.state === 'bottomed' ? curve.strokeMm : 0;
          };
          expect(sag(loadN, rate * times)).toBeLessThanOrEqual(sag(loadN, rate) + 1e-9);
          expect(sag(loadN / times, rate)).toBeLessThanOrEqual(sag(loadN, rate) + 1e-9);
        },
      ),
      runs,
    );
  });
});
