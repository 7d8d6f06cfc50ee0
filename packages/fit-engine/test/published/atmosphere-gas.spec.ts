import { describe, expect, it } from 'vitest';
import { movedState, stateEnergyJ, type AirState } from '../../src/springs/air-state.js';
import { fillAtTemperatureKPa, geopotentialM, patmAtHeightKPa } from '../../src/springs/atmosphere.js';
import { kPaPerPsi } from '../../src/units/factors.js';
import { expectNear } from './near.js';
import vectors from './vectors/atmosphere_gas.json' with { type: 'json' };

// "abs 0.01 Pa against own constants"
const abs = 0.01;
const mPerFt = 0.3048;

describe('standard atmosphere', () => {
  it.each(vectors.geopotential)('at $H_m m', ({ H_m, p_Pa }) => {
    expectNear(1000 * patmAtHeightKPa(H_m), p_Pa, { abs });
  });
  it.each(vectors.geometric)('at $Z_m m on the map', ({ Z_m, H_m, p_Pa }) => {
    expectNear(geopotentialM(Z_m), H_m, { abs: 1e-6 });
    expectNear(1000 * patmAtHeightKPa(geopotentialM(Z_m)), p_Pa, { abs });
  });
  it.each(vectors.published)('$name ($source; $status)', ({ name, published, tol }) => {
    const feet = / at (\d+) ft$/.exec(name)?.[1];
    const mapM = /geometric Z=(\d+) m$/.exec(name)?.[1];
    const heightM = /(?:H=| at )(\d+) m$/.exec(name)?.[1];
    if (feet !== undefined) {
      expectNear(patmAtHeightKPa(geopotentialM(Number(feet) * mPerFt)) / kPaPerPsi, published, { abs: tol });
      return;
    }
    const height = mapM === undefined ? Number(heightM) : geopotentialM(Number(mapM));
    expectNear(1000 * patmAtHeightKPa(height), published, { abs: tol });
  });
});

describe('gas', () => {
  const published = (name: string) => {
    const found = vectors.gas_published.find((one) => one.name === name);
    if (!found) throw new Error(name);
    return found;
  };
  /** A cylinder of 1 m2 with so many m3 in it and nothing on the other side. */
  const cylinder = (kPa: number, m3: number): AirState => ({
    areaMm2: 1e6,
    negativeAreaMm2: 0,
    volumeMm3: m3 * 1e9,
    negativeVolumeMm3: 0,
    positiveKPa: kPa,
    negativeKPa: 0,
  });
  const metres = 1000;

  it.each([
    ['Moran&Shapiro Ex 2.1 n=1.5 work kJ', 1.5],
    ['same n=1 work kJ', 1],
    ['same n=0', 0],
  ])('%s: from 0.1 to 0.2 m3 at 300 kPa', (name, n) => {
    const { published: kJ, computed, tol } = published(name);
    const workJ = -stateEnergyJ(cylinder(300, 0.1), -0.1 * metres, 0, n);
    expectNear(workJ / 1000, kJ, { abs: tol });
    expectNear(workJ / 1000, Number(computed), { rel: 1e-9 });
  });

  it.each([
    ['same, p2 bar', 3, 0.1, 0.2, 1.5],
    ['pV^1.2, p2 bar', 6.9, 0.05, 0.08, 1.2],
    ['pV^1.15, p2 bar', 30, 0.1, 0.85, 1.15],
  ])('%s', (name, bar, from, to, n) => {
    const { published: after, computed, tol } = published(name);
    const state = movedState(cylinder(100 * bar, from), (from - to) * metres, n);
    expectNear(state.positiveKPa / 100, after, { abs: tol });
    expectNear(state.positiveKPa / 100, Number(computed), { rel: 1e-9 });
  });

  it('a tyre warmed from 298 to 323 K at constant volume', () => {
    const { published: rise, computed, tol } = published('tyre gauge 210 kPa, 25->50 C, dp kPa');
    const warmer = fillAtTemperatureKPa(310, 298, 323) - 310;
    expectNear(warmer, rise, { abs: tol });
    expectNear(warmer, Number(computed), { rel: 1e-9 });
  });

  it('uses every published gas value that is kept', () => expect(vectors.gas_published).toHaveLength(7));
});
