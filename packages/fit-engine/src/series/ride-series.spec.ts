import { describe, expect, it } from 'vitest';
import type { LeverageTable } from '../facts.js';
import { rideSeries } from './ride-series.js';

const load = { loadN: 560, midPercent: 30, patmKPa: 101.325 };
const chambers = { areaMm2: 1000, negativeAreaMm2: 800, volumeMm3: 120000, negativeVolumeMm3: 30000 };
/** A straight line, which the monotone cubic repeats exactly: LR = 3 - s / 50. */
const table: LeverageTable = {
  by: 'shock-travel',
  points: [
    [0, 3],
    [25, 2.5],
    [50, 2],
  ],
};
const frame = { table, travelMm: 125, strokeMm: 50 };

describe('the curves of a coil', () => {
  const made = rideSeries(frame, load, { kind: 'coil', rateNPerMm: null, preloadMm: 1 });
  it.each(made?.points ?? [])('at $wheelMm mm of travel follow virtual work', (point) => {
    const ratio = 3 - point.shockMm / 50;
    expect(point.wheelMm).toBeCloseTo(3 * point.shockMm - point.shockMm ** 2 / 100, 6);
    expect(point.ratio).toBeCloseTo(ratio, 9);
    const rate = (560 * (3 - 15 / 50)) / 16;
    const force = rate * (point.shockMm + 1);
    expect(point.forceN).toBeCloseTo(force / ratio, 6);
    // k_w = (F' LR - F LR') / LR^3, here with LR' = -1/50.
    expect(point.rateNPerMm).toBeCloseTo((rate * ratio + force / 50) / ratio ** 3, 6);
  });
  it('carry the load at the sag aimed at', () => {
    expect(made?.spring?.sagPercent).toBeCloseTo(30, 6);
    expect(made?.spring?.sagWheelMm).toBeCloseTo(3 * 15 - 225 / 100, 6);
    // Work of a linear spring between 15 + 1 and 50 + 1 mm.
    const rate = (560 * 2.7) / 16;
    expect(made?.spring?.energyJ).toBeCloseTo((rate * (51 ** 2 - 16 ** 2)) / 2000, 6);
  });
});

describe('the curves of an air spring', () => {
  const made = rideSeries(frame, load, { kind: 'air', chambers });
  it('carry the load at sag and grow to the end', () => {
    const forces = (made?.points ?? []).map(({ forceN }) => forceN ?? NaN);
    expect(forces.every((force, i) => i === 0 || force > (forces[i - 1] ?? 0))).toBe(true);
    expect(forces.at(-1)).toBeCloseTo(560 * (made?.spring?.endToStatic ?? 0), 6);
    const under = made?.points.filter(({ wheelMm }) => wheelMm <= 42.75).at(-1);
    expect(Math.abs((under?.forceN ?? 0) - 560)).toBeLessThan(60);
  });
  it('agree with the work put in, by the trapezoid rule over the wheel travel', () => {
    const points = (made?.points ?? []).filter(({ wheelMm }) => wheelMm >= 42.75);
    const joules = points.slice(1).reduce((sum, point, i) => {
      const before = points[i];
      return (
        sum +
        (((point.forceN ?? 0) + (before?.forceN ?? 0)) / 2000) * (point.wheelMm - (before?.wheelMm ?? 0))
      );
    }, 0);
    const missing = ((points[0]?.wheelMm ?? 0) - 42.75) * 0.56;
    expect(joules + missing).toBeCloseTo(made?.spring?.energyJ ?? 0, 0);
  });
});

it('draws the leverage alone without load or spring, and nothing without travel', () => {
  expect(rideSeries(frame, null, { kind: 'air', chambers })?.points[0]).toMatchObject({
    ratio: 3,
    forceN: null,
  });
  expect(rideSeries(frame, load, null)?.spring).toBeNull();
  expect(rideSeries({ table: null, travelMm: null, strokeMm: 50 }, load, null)).toBeNull();
});
