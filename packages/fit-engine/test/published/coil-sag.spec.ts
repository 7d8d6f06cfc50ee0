import { describe, expect, it } from 'vitest';
import { rateForSag, sagForRate } from '../../src/springs/coil.js';
import { nPerMmPerLbPerIn } from '../../src/units/factors.js';
import { linearCurve } from './linear-curve.js';
import { expectNear } from './near.js';
import vectors from './vectors/coil_sag.json' with { type: 'json' };

// "abs 1e-9 mm, rel 1e-10 on rate"
const [abs, rel] = [1e-9, 1e-10];

function curveOf(name: string) {
  const given = Object.entries(vectors.curves).find(([key]) => key === name)?.[1];
  if (!given) throw new Error(name);
  return linearCurve(given.x_mm, given.ratio, given.x_mm.at(-1) ?? NaN);
}

describe('rate for a sag', () => {
  it.each(vectors.rate_for_sag)('$curve, $wheel_load_N N', (row) => {
    const curve = curveOf(row.curve);
    const sagMm = curve.shockTravelAt(row.target_wheel_sag_fraction * row.total_travel_mm);
    expectNear(sagMm, row.shock_sag_mm, { abs });
    const rate = rateForSag(curve, row.wheel_load_N, row.shock_sag_mm, row.preload_mm);
    expectNear(rate, row.rate_N_per_mm, { rel });
    expectNear((rate ?? NaN) / nPerMmPerLbPerIn, row.rate_lbf_per_in, { rel });
  });
});

describe('sag for a rate', () => {
  it.each(vectors.sag_for_rate)('$curve, $rate_N_per_mm N/mm: $state', (row) => {
    const curve = curveOf(row.curve);
    const result = sagForRate(curve, row.wheel_load_N, row.rate_N_per_mm, row.preload_mm);
    if (row.state !== 'in_range') {
      expect(result).toEqual({ state: row.state.replace('_', '-') });
      return;
    }
    if (result.state !== 'ok') throw new Error(result.state);
    expectNear(result.sagMm, row.shock_sag_mm, { abs });
    // Wheel travel moves with the leverage, nearly 3, for each millimetre at the shock.
    expectNear(curve.wheelTravelAt(result.sagMm), row.wheel_sag_mm, { abs: 3 * abs });
  });
});
