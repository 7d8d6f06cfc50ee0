import { evaluate, unit } from 'mathjs';
import { describe, expect, it } from 'vitest';

import { airEnergyJ } from '../../src/springs/air-energy.js';
import { airForceN } from '../../src/springs/air.js';
import { helicalRateNPerMm, helicalStressNPerMm2, springMassKg } from '../../src/springs/helical.js';
import { frequencyHz } from '../../src/springs/wheel.js';
import { formatMass, formatPressure } from '../../src/units/format.js';
import {
  g0,
  kgPerLb,
  kgPerStone,
  kPaPerBar,
  kPaPerPsi,
  mmPerIn,
  nPerMmPerLbPerIn,
} from '../../src/units/factors.js';
import { parseLengthMm, parseMassKg, parsePressureKPa } from '../../src/units/parse.js';
import { seeded } from '../judging/seeded.js';
import { expectNear } from '../published/near.js';

/** mathjs has some of its factors to ten digits only. */
const rel = 1e-9;

describe('units, against mathjs', () => {
  it.each([
    ['inch in mm', mmPerIn, unit(1, 'in').toNumber('mm')],
    ['pound in kg', kgPerLb, unit(1, 'lbm').toNumber('kg')],
    ['stone in kg', kgPerStone, unit(1, 'stone').toNumber('kg')],
    ['bar in kPa', kPaPerBar, unit(1, 'bar').toNumber('kPa')],
    ['psi in kPa', kPaPerPsi, unit(1, 'psi').toNumber('kPa')],
    ['lbf/in in N/mm', nPerMmPerLbPerIn, unit(1, 'lbf/in').toNumber('N/mm')],
    ['weight of a pound in N', kgPerLb * g0, unit(1, 'lbf').toNumber('N')],
  ])('%s', (_what, ours, theirs) => expectNear(ours, theirs, { rel }));

  it('reads 2,000 figures as mathjs does', () => {
    const r = seeded(5);
    for (let i = 0; i < 500; i += 1) {
      const value = Number(r.between(0.1, 400).toFixed(r.pick([0, 1, 3])));
      expectNear(parseLengthMm(`${value} in`), unit(value, 'in').toNumber('mm'), { rel });
      expectNear(parseMassKg(`${value} lb`), unit(value, 'lbm').toNumber('kg'), { rel });
      expectNear(parsePressureKPa(`${value}psi`), unit(value, 'psi').toNumber('kPa'), { rel });
      expectNear(parsePressureKPa(`${value} bar`), unit(value, 'bar').toNumber('kPa'), { rel });
    }
  });

  it('writes whole pounds and psi as mathjs rounds them', () => {
    for (const kg of [52, 61.5, 80, 97.3, 120]) {
      expect(formatMass(kg, 'lb')).toBe(`${Math.round(unit(kg, 'kg').toNumber('lbm'))} lb`);
    }
    for (const kPa of [410, 830, 1210, 1723.7, 2400]) {
      expect(formatPressure(kPa)).toBe(`${Math.round(unit(kPa, 'kPa').toNumber('psi'))} psi`);
    }
  });
});

describe('formulas with their units carried along by mathjs', () => {
  const worked = (formula: string, to: string): number => Number(evaluate(`number(${formula}, ${to})`));

  it('rate of a wound spring', () => {
    const formula = '78500 N/mm^2 * (12 mm)^4 / (8 * (52 mm)^3 * 5.5)';
    const ours = helicalRateNPerMm(12, 52, 5.5, 78500);
    expectNear(ours, worked(formula, 'N/mm'), { rel });
    expectNear(ours / nPerMmPerLbPerIn, worked(formula, 'lbf/in'), { rel });
  });

  it('corrected stress in its wire', () => {
    const formula = '(52/12 + 0.5) / (52/12 - 0.75) * 8 * 3 kN * 52 mm / (pi * (12 mm)^3)';
    expectNear(helicalStressNPerMm2(12, 52, 3000), worked(formula, 'MPa'), { rel });
  });

  it('mass of its wire, of steel', () => {
    const formula = '7850 kg/m^3 * pi / 4 * (12 mm)^2 * pi * 52 mm * 7.5';
    expectNear(springMassKg(12, 52, 7.5, 7.85e-6), worked(formula, 'kg'), { rel });
  });

  it('force and work of an air spring', () => {
    const chambers = { areaMm2: 1100, negativeAreaMm2: 0, volumeMm3: 1e5, negativeVolumeMm3: 1 };
    const fill = 200 * kPaPerPsi + 101.325;
    expectNear(airForceN(chambers, 0, fill, 101.325, 1), worked('11 cm^2 * 200 psi', 'N'), { rel });
    // Slow: p1 V1 ln(V1/V2), less what the air outside does.
    const work = '(200 psi + 1 atm) * 100 cm^3 * log(100 / 45) - 1 atm * 55 cm^3';
    expectNear(airEnergyJ(chambers, 50, fill, 101.325, 1), worked(work, 'J'), { rel });
  });

  it('frequency of a mass on a wheel rate', () => {
    expectNear(frequencyHz(12.5, 58), worked('sqrt(12.5 N/mm / (58 kg)) / (2 * pi)', 'Hz'), { rel });
  });
});
