import { describe, it } from 'vitest';
import { g0, kgPerLb, kPaPerBar, kPaPerPsi, mmPerIn, nPerMmPerLbPerIn } from '../../src/units/factors.js';
import { parseLengthMm, parseMassKg, parsePressureKPa } from '../../src/units/parse.js';
import { expectNear } from './near.js';
import vectors from './vectors/units.json' with { type: 'json' };

const rel = vectors.tolerance_rel;

describe('factors', () => {
  it.each([
    ['mm_per_in', mmPerIn],
    ['in_per_mm', 1 / mmPerIn],
    ['kg_per_lb', kgPerLb],
    ['lb_per_kg', 1 / kgPerLb],
    ['N_per_lbf', kgPerLb * g0],
    ['N_per_kgf', g0],
    ['kPa_per_psi', kPaPerPsi],
    ['psi_per_kPa', 1 / kPaPerPsi],
    ['kPa_per_bar', kPaPerBar],
    ['psi_per_bar', kPaPerBar / kPaPerPsi],
    ['N_per_mm_per_lbf_per_in', nPerMmPerLbPerIn],
    ['lbf_per_in_per_N_per_mm', 1 / nPerMmPerLbPerIn],
  ] as const)('%s', (name, ours) => {
    const { num, den, double } = vectors.factors[name];
    expectNear(ours, double, { rel });
    expectNear(ours, Number(num) / Number(den), { rel });
  });
});

describe('worked conversions', () => {
  it.each([
    ['in', 'mm', (value: number) => parseLengthMm(`${value} in`)],
    ['mm', 'in', (value: number) => value / mmPerIn],
    ['psi', 'kPa', (value: number) => parsePressureKPa(`${value} psi`)],
    ['bar', 'psi', (value: number) => (parsePressureKPa(`${value} bar`) ?? NaN) / kPaPerPsi],
    ['lbf/in', 'N/mm', (value: number) => value * nPerMmPerLbPerIn],
    ['lb', 'kg', (value: number) => parseMassKg(`${value} lb`)],
  ] as const)('%s to %s', (from, to, convert) => {
    const given = vectors.cases.find((one) => one.from === from && one.to === to);
    expectNear(convert(given?.value ?? NaN), given?.expected ?? NaN, { rel });
  });
});
