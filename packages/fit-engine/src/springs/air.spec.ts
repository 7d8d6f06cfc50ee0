import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { makeCurve } from '../kinematics/leverage-curve.js';
import { airEnergyJ, airFromSag } from './air-energy.js';
import { airForceN, airStiffnessNPerMm, fillForSag, leastFillKPa, sagForFill } from './air.js';

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
const patm = 101.325;
const chambers = { areaMm2: 1100, negativeAreaMm2: 950, volumeMm3: 105000, negativeVolumeMm3: 14000 };
const single = { ...chambers, negativeAreaMm2: 0, negativeVolumeMm3: 0 };
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('air spring', () => {
  it('pushes harder the further it is compressed, by its stiffness', () => {
    fc.assert(
      fc.property(between(0, 59), between(200, 2500), between(1, 1.4), (s, fill, n) => {
        const force = (at: number): number => airForceN(chambers, at, fill + patm, patm, n);
        expect(force(s + 1)).toBeGreaterThan(force(s));
        const slope = (force(s + 5e-4) - force(s)) / 5e-4;
        const stiffness = airStiffnessNPerMm(chambers, s, fill + patm, n);
        expect(Math.abs(slope / stiffness - 1)).toBeLessThan(1e-3);
      }),
      { numRuns: 200, seed: 14 },
    );
  });

  it('filled for a sag, sags so', () => {
    fc.assert(
      fc.property(between(300, 1200), between(8, 40), between(0, 100), (load, sag, gas) => {
        const fill = fillForSag(chambers, curve, load, sag, patm, gas);
        const back = fill === null ? null : sagForFill(chambers, curve, load, fill, patm, gas);
        expect(back?.state).toBe('ok');
        if (back?.state === 'ok') expect(Math.abs(back.sagMm - sag)).toBeLessThan(1e-8);
      }),
      { numRuns: 200, seed: 15 },
    );
  });

  it('more pressure, less sag', () => {
    fc.assert(
      fc.property(between(400, 1100), between(400, 1800), between(1.01, 1.6), (load, fill, times) => {
        const sag = (kPa: number): number => {
          const found = sagForFill(chambers, curve, load, kPa, patm);
          return found.state === 'ok' ? found.sagMm : found.state === 'bottomed' ? 60 : 0;
        };
        expect(sag(fill * times)).toBeLessThanOrEqual(sag(fill));
      }),
      { numRuns: 200, seed: 16 },
    );
  });

  it('without a negative chamber is a plain piston', () => {
    expect(airForceN(single, 0, 500 + patm, patm, 1)).toBeCloseTo(550, 9);
    expect(airStiffnessNPerMm(single, 0, 500 + patm, 1)).toBeCloseTo((1.1 * 601.325 * 1100) / 105000, 9);
    expect(fillForSag(single, curve, 700, 18, patm)).toBeGreaterThan(0);
  });
});

describe('energy', () => {
  /** Simpson's rule, 400 steps, N mm to J. */
  const integral = (force: (s: number) => number, from: number, to: number): number => {
    const h = (to - from) / 400;
    let sum = force(from) + force(to);
    for (let i = 1; i < 400; i += 1) sum += (i % 2 ? 4 : 2) * force(from + i * h);
    return (sum * h) / 3000;
  };

  it.each([1, 1.2, 1.35, 1.4])('is the integral of the force, n = %s', (n) => {
    for (const c of [chambers, single]) {
      const expected = integral((s) => airForceN(c, s, 1200, patm, n), 0, 50);
      expect(airEnergyJ(c, 50, 1200, patm, n)).toBeCloseTo(expected, 6);
    }
  });

  it('from sag starts at the slow force and is the integral of the quick one', () => {
    const from = (endMm: number) => airFromSag(chambers, { sagMm: 18, endMm }, 1200, patm, 60);
    expect(from(18).forceN).toBeCloseTo(airForceN(chambers, 18, 1200, patm, 1, 60), 9);
    expect(from(18).energyJ).toBe(0);
    expect(from(60).energyJ).toBeCloseTo(
      integral((s) => from(s).forceN, 18, 60),
      6,
    );
    expect(from(60).forceN).toBeGreaterThan(airForceN(chambers, 60, 1200, patm, 1, 60));
  });
});

describe('no figure where there is none', () => {
  it('beyond the chamber', () => {
    const short = { ...chambers, volumeMm3: 60000 };
    expect(airForceN(short, 55, 1200, patm, 1)).toBeNaN();
    expect(airStiffnessNPerMm(short, 55, 1200, 1)).toBeNaN();
    expect(airEnergyJ(short, 55, 1200, patm, 1)).toBeNaN();
    expect(fillForSag(short, curve, 700, 56, patm)).toBeNull();
    expect(sagForFill(short, curve, 700, 1000, patm)).toEqual({ state: 'no-answer' });
  });
  it('where gas or the chambers leave nothing for a fill to do', () => {
    expect(fillForSag(chambers, curve, 50, 18, patm, 400)).toBeNull();
    const upsideDown = { ...chambers, areaMm2: 300, negativeAreaMm2: 3000 };
    expect(fillForSag(upsideDown, curve, 700, 0.1, patm)).toBeNull();
    expect(fillForSag(chambers, curve, 700, 61, patm)).toBeNull();
    expect(fillForSag(chambers, curve, 700, -1, patm)).toBeNull();
  });
  it.each([NaN, Infinity, -Infinity])('for %s', (bad) => {
    expect(fillForSag(chambers, curve, bad, 18, patm)).toBeNull();
    expect(fillForSag(chambers, curve, 700, bad, patm)).toBeNull();
    expect(fillForSag(chambers, curve, 700, 18, bad)).toBeNull();
    expect(fillForSag(chambers, curve, 700, 18, patm, bad)).toBeNull();
    expect(fillForSag({ ...chambers, volumeMm3: bad }, curve, 700, 18, patm)).toBeNull();
    expect(sagForFill(chambers, curve, 700, bad, patm)).toEqual({ state: 'no-answer' });
    expect(leastFillKPa(50, curve, bad, 30, patm)).toBeNull();
    expect(leastFillKPa(bad, curve, 700, 30, patm)).toBeNull();
    expect(leastFillKPa(50, curve, 700, bad, patm)).toBeNull();
    expect(leastFillKPa(50, curve, 700, 30, bad)).toBeNull();
  });
});

describe('least fill of unknown chambers', () => {
  it('by hand: 54 mm can, 700 N, 30 % of 60 mm', () => {
    const area = (Math.PI / 4) * 50 ** 2;
    const expected = ((700_000 * curve.ratioAt(18)) / area + patm) * 0.775 - patm;
    expect(leastFillKPa(54, curve, 700, 30, patm)).toBeCloseTo(expected, 9);
  });
  it('no can of 4 mm or less holds a piston', () => {
    expect(leastFillKPa(4, curve, 700, 30, patm)).toBeNull();
    expect(leastFillKPa(0, curve, 700, 30, patm)).toBeNull();
  });
  it('never exceeds what any shock within the bounds needs', () => {
    const bore = between(20, 46);
    fc.assert(
      fc.property(
        bore,
        between(60.01, 120),
        between(0, 0.95),
        between(0.2, 2),
        between(300, 1100),
        (mm, high, share, size, load) => {
          const areaMm2 = (Math.PI / 4) * mm ** 2;
          // A positive chamber as long as its piston could travel leaves more than a quarter at full compression.
          const volumeMm3 = (areaMm2 * high) / 0.75;
          const negativeAreaMm2 = share * areaMm2;
          const c = { areaMm2, volumeMm3, negativeAreaMm2, negativeVolumeMm3: size * 20000 };
          const fill = fillForSag(c, curve, load, 18, patm);
          const least = leastFillKPa(50, curve, load, 30, patm) ?? NaN;
          if (fill !== null) expect(fill).toBeGreaterThanOrEqual(least - 1e-6);
        },
      ),
      { numRuns: 300, seed: 17 },
    );
  });
});
