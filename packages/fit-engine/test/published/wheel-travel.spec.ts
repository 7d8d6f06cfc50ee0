import { describe, it } from 'vitest';
import { makeCurve } from '../../src/kinematics/leverage-curve.js';
import { linearCurve } from './linear-curve.js';
import { expectNear } from './near.js';
import vectors from './vectors/wheel_travel.json' with { type: 'json' };

const abs = vectors.tolerance_abs_mm;

describe.each(Object.entries(vectors.curves))('wheel travel of %s', (_, given) => {
  const strokeMm = given.x.at(-1) ?? NaN;
  const curve = linearCurve(given.x, given.y, strokeMm);

  it('adds up to the travel and the mean ratio', () => {
    expectNear(curve.totalTravelMm, given.total_travel_mm, { abs });
    expectNear(curve.meanRatio, given.mean_ratio, { abs });
  });

  it.each(given.rows)('at $stroke_mm mm', ({ stroke_mm, ratio, wheel_travel_mm }) => {
    expectNear(curve.ratioAt(stroke_mm), ratio, { abs });
    expectNear(curve.wheelTravelAt(stroke_mm), wheel_travel_mm, { abs });
  });

  it.each(given.stroke_for_wheel_fraction)('back from $wheel_fraction of it', (row) => {
    expectNear(curve.shockTravelAt(row.wheel_fraction * given.total_travel_mm), row.stroke_mm, { abs });
  });

  it('progression, and the travel by the curve the engine draws through the same points', () => {
    const points = given.x.map((x, i) => [x, given.y[i] ?? NaN] as const);
    const made = makeCurve({ by: 'shock-travel', points }, given.total_travel_mm, strokeMm);
    if (!made.ok) throw new Error(made.reason);
    expectNear(made.curve.progressionPercent, 100 * given.progression_start_to_end, { abs });
    // The cubic is not the straight line: a hundredth of a millimetre apart at most for these curves.
    expectNear(made.curve.totalTravelMm, given.total_travel_mm, { abs: 0.01 });
  });
});
