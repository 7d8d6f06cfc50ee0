import { describe, it } from 'vitest';
import { polygonDistance } from '../../src/clearance/polygon-distance.js';
import type { Point } from '../../src/facts.js';
import { makeCurve } from '../../src/kinematics/leverage-curve.js';
import { equilibrium } from '../../src/springs/equilibrium.js';
import { g0, kgPerLb, kPaPerBar, kPaPerPsi, mmPerIn, nPerMmPerLbPerIn } from '../../src/units/factors.js';
import { expectNear } from './near.js';
import vectors from './vectors/published_generic.json' with { type: 'json' };

function published(name: string) {
  const found = vectors.checks.find((one) => one.name === name);
  if (!found) throw new Error(name);
  return found;
}

describe('printed factors', () => {
  it.each([
    ['in -> m', mmPerIn / 1000],
    ['lb -> kg', kgPerLb],
    ['lbf -> N', kgPerLb * g0],
    ['psi -> Pa', kPaPerPsi * 1000],
    ['lbf/in -> N/m', nPerMmPerLbPerIn * 1000],
    ['bar -> Pa', kPaPerBar * 1000],
    ['kgf -> N', g0],
    ['1 bar in psi', kPaPerBar / kPaPerPsi],
  ])('%s', (name, ours) => {
    // A factor that is exact in print may still differ in the last binary digit.
    expectNear(ours, published(name).expected, { abs: published(name).tol_abs, rel: 1e-15 });
  });
});

describe('known roots, by the solver that finds the sag', () => {
  const made = makeCurve(
    {
      by: 'shock-travel',
      points: [
        [0, 1],
        [2, 1],
      ],
    },
    null,
    2,
  );
  if (!made.ok) throw new Error(made.reason);
  const { curve } = made;
  // Where force(s) = load x ratio(s).
  it.each([
    ['x^3+4x^2-10 in [1,2]', curve, 10, (x: number) => x ** 3 + 4 * x ** 2],
    ['cos x = x', { ...curve, ratioAt: Math.cos }, 1, (x: number) => x],
    ['x^3-x-2', { ...curve, ratioAt: (x: number) => x + 2 }, 1, (x: number) => x ** 3],
  ])('%s', (name, ratio, load, force) => {
    const found = equilibrium(ratio, load, force);
    const { expected, tol_abs } = published(name);
    expectNear(found.state === 'ok' ? found.sagMm : null, expected, { abs: tol_abs });
  });
});

describe('polygons of the GEOS test suite', () => {
  it.each(vectors.checks.filter(({ area }) => area === 'polygon'))(
    '$name',
    ({ inputs, expected, tol_abs }) => {
      const outline = (rows: readonly number[][] | undefined): Point[] =>
        (rows ?? []).map(([x = NaN, y = NaN]) => [x, y]);
      expectNear(polygonDistance(outline(inputs.a), outline(inputs.b)), expected, { abs: tol_abs });
    },
  );
});
