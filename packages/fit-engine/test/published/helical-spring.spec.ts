import { describe, it } from 'vitest';
import {
  activeCoils,
  curvatureFactor,
  helicalRateNPerMm,
  helicalStressNPerMm2,
  solidLengthMm,
  springMassKg,
  type SpringEnds,
} from '../../src/springs/helical.js';
import { kPaPerPsi, mmPerIn, nPerMmPerLbPerIn } from '../../src/units/factors.js';
import { expectNear } from './near.js';
import vectors from './vectors/helical_spring.json' with { type: 'json' };

const rel = vectors.tolerance_rel;
/** Figures given as text have ten digits. */
const tenDigits = 5e-10;

const endsOf: Readonly<Record<string, SpringEnds>> = {
  squared_ground: 'squared-ground',
  squared: 'squared',
  plain_ground: 'plain-ground',
  plain: 'plain',
};

describe('round-wire compression spring', () => {
  it.each(vectors.vectors)('$name: wire $d_mm, $ends', (row) => {
    const ends = endsOf[row.ends];
    if (!ends) throw new Error(row.ends);
    const active = activeCoils(row.Nt, ends);
    expectNear(active, row.Na, { rel });
    const rate = helicalRateNPerMm(row.d_mm, row.D_mm, active, row.G_MPa);
    expectNear(rate, row.k_N_per_mm, { rel });
    expectNear(rate / nPerMmPerLbPerIn, row.k_lbf_per_in, { rel });
    expectNear(solidLengthMm(row.d_mm, row.Nt, ends), row.solid_mm, { rel });
    const stress = helicalStressNPerMm2(row.d_mm, row.D_mm, row.F_N);
    expectNear(stress, Number(row.tau_bergstraesser_MPa), { rel: tenDigits });
    const uncorrected = stress / curvatureFactor(row.d_mm, row.D_mm);
    expectNear(uncorrected, Number(row.tau_uncorrected_MPa), { rel: tenDigits });
    const mass = springMassKg(row.d_mm, row.D_mm, row.Nt, row.rho_kg_mm3);
    expectNear(mass, Number(row.mass_kg), { rel: tenDigits });
  });

  it('Shigley, 10th edition, problem 10-3 (seen)', () => {
    const given = vectors.published.find(({ name }) => name === 'Shigley 10e Prob. 10-3');
    const { inputs, expected } = given ?? {};
    const { d_mm = NaN, OD_mm = NaN, Nt = NaN, G_MPa = NaN } = inputs ?? {};
    const mean = OD_mm - d_mm;
    const active = activeCoils(Nt, 'plain-ground');
    const near = (value: number, want: { published: number; tol: number } | undefined): void =>
      expectNear(value, want?.published ?? NaN, { abs: want?.tol ?? NaN });
    near(active, expected?.Na);
    near(helicalRateNPerMm(d_mm, mean, active, G_MPa), expected?.k_N_per_mm);
    near(curvatureFactor(d_mm, mean), expected?.KB);
    near(solidLengthMm(d_mm, Nt, 'plain-ground'), expected?.Ls_mm);
    // The force that closes it brings the wire to its yield stress in shear.
    near(helicalStressNPerMm2(d_mm, mean, expected?.Fs_N?.published ?? NaN), expected?.Ssy_MPa);
  });

  it('Shigley, example 10-1 (from memory), with the mean diameter as the book rounds it', () => {
    const given = vectors.published.find(({ name }) => name === 'Shigley Ex. 10-1');
    const { inputs, expected } = given ?? {};
    const wireMm = (inputs?.d_in ?? NaN) * mmPerIn;
    const meanMm = 0.4 * mmPerIn;
    const shearModulus = ((inputs?.G_psi ?? NaN) * kPaPerPsi) / 1000;
    const turns = inputs?.Nt ?? NaN;
    const rate = helicalRateNPerMm(wireMm, meanMm, activeCoils(turns, 'squared'), shearModulus);
    const want = expected?.k_lbf_per_in;
    expectNear(rate / nPerMmPerLbPerIn, want?.published ?? NaN, { abs: want?.tol ?? NaN });
    const solidIn = solidLengthMm(wireMm, turns, 'squared') / mmPerIn;
    expectNear(solidIn, expected?.Ls_in?.published ?? NaN, { abs: expected?.Ls_in?.tol ?? NaN });
    const factor = curvatureFactor(wireMm, meanMm);
    expectNear(factor, expected?.KB?.published ?? NaN, { abs: expected?.KB?.tol ?? NaN });
  });
});
