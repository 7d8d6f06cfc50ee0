import { describe, expect, it } from 'vitest';
import type { Curve } from '../../src/kinematics/curve.js';
import { makeCurve } from '../../src/kinematics/leverage-curve.js';
import { airForceN, airStiffnessNPerMm } from '../../src/springs/air.js';
import { wheelForceN, wheelRateNPerMm } from '../../src/springs/wheel.js';
import { expectNear } from './near.js';
import travel from './vectors/wheel_travel.json' with { type: 'json' };
import vectors from './vectors/wheel_rate.json' with { type: 'json' };

const rel = vectors.tolerance_rel;

function curveOf(points: readonly (readonly [number, number])[], strokeMm: number): Curve {
  const made = makeCurve({ by: 'shock-travel', points }, null, strokeMm);
  if (!made.ok) throw new Error(made.reason);
  return made.curve;
}
const { x, y } = travel.curves.progressive12;
const linear = curveOf(
  [
    [0, 3.0],
    [55, 2.4],
  ],
  55,
);
const pchip12 = curveOf(
  x.map((s, i) => [s, y[i] ?? NaN] as const),
  55,
);
/** The closed form of the vectors; only ratio and slope are read by the formulas under test. */
const quadratic: Curve = {
  ...linear,
  strokeMm: 60,
  ratioAt: (s) => 2.9 - 0.02 * s + 0.0002 * s * s,
  slopeAt: (s) => -0.02 + 0.0004 * s,
};
const curves: Readonly<Record<string, Curve>> = { linear, quadratic, pchip12 };

type Given = (typeof vectors.cases)[number]['spring'];

function shockForce(spring: Given, s: number): { forceN: number; rateNPerMm: number } {
  if (spring.type === 'coil') {
    const k = spring.k ?? NaN;
    return { forceN: k * (s + (spring.x0 ?? NaN)), rateNPerMm: k };
  }
  const { A = NaN, An = NaN, V0p = NaN, V0n = NaN, pg = NaN, patm = NaN, n = NaN } = spring;
  const chambers = { areaMm2: A, negativeAreaMm2: An, volumeMm3: V0p, negativeVolumeMm3: V0n };
  const fill = 1000 * (pg + patm);
  return {
    forceN: airForceN(chambers, s, fill, 1000 * patm, n),
    rateNPerMm: airStiffnessNPerMm(chambers, s, fill, n),
  };
}

describe.each(vectors.cases)(
  'wheel force and rate, $ratio ratio, $spring.type',
  ({ ratio, spring, rows }) => {
    const curve = curves[ratio];
    if (!curve) throw new Error(ratio);
    it.each(rows)('at $s mm', (row) => {
      const { forceN, rateNPerMm } = shockForce(spring, row.s);
      expectNear(curve.ratioAt(row.s), Number(row.L), { rel });
      if (ratio !== 'quadratic') expectNear(curve.wheelTravelAt(row.s), Number(row.w), { rel });
      expectNear(forceN, Number(row.F_N), { rel });
      expectNear(wheelForceN(curve, row.s, forceN), Number(row.Fw_N), { rel });
      expectNear(wheelRateNPerMm(curve, row.s, forceN, rateNPerMm), Number(row.kw_N_per_mm), { rel });
    });
  },
);

describe('progression', () => {
  const made = vectors.progression.filter(({ ratio }) => ratio !== 'quadratic');
  it('is checked for two curves', () => expect(made).toHaveLength(2));
  it.each(made)('of the $ratio ratio', (row) => {
    const curve = curves[row.ratio] ?? linear;
    expectNear(curve.totalTravelMm, row.travel, { rel });
    expectNear(curve.meanRatio, Number(row.mean), { rel });
    expectNear(curve.progressionPercent, 100 * Number(row.progression_ends), { rel });
    expectNear(curve.progressionToLowestPercent, 100 * Number(row.progression_to_min), { rel });
    const s = curve.shockTravelAt(0.3 * curve.totalTravelMm);
    expectNear(s, Number(row.s_at_30pct_travel), { rel });
    expectNear(curve.ratioAt(s), Number(row.L_at_30pct), { rel });
  });
});
