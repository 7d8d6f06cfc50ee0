import { describe, expect, it } from 'vitest';
import { airEnergyJ } from '../../src/springs/air-energy.js';
import { filledState, movedState } from '../../src/springs/air-state.js';
import { airForceN, airStiffnessNPerMm, fillForSag, sagForFill } from '../../src/springs/air.js';
import { fillAtTemperatureKPa } from '../../src/springs/atmosphere.js';
import { kPaPerPsi } from '../../src/units/factors.js';
import { linearCurve } from './linear-curve.js';
import { expectNear } from './near.js';
import vectors from './vectors/air_spring.json' with { type: 'json' };

// "rel 1e-9 on F, abs 1e-8 mm on sag"
const [rel, sagAbs] = [1e-9, 1e-8];
const kPaPerMPa = 1000;

function setOf(name: string) {
  const found = Object.entries(vectors.sets).find(([key]) => key === name)?.[1].params;
  if (!found) throw new Error(name);
  const { A, An, V0p, V0n, S, pg, patm } = found;
  return {
    chambers: { areaMm2: A, negativeAreaMm2: An, volumeMm3: V0p, negativeVolumeMm3: V0n },
    gaugeKPa: kPaPerMPa * pg,
    patmKPa: kPaPerMPa * patm,
    strokeMm: S,
    curve: linearCurve(vectors.ratio_curve.x_mm, vectors.ratio_curve.ratio, S),
  };
}

const tables = Object.entries(vectors.sets).flatMap(([name, { tables }]) =>
  Object.entries(tables).map(([key, rows]) => ({ name, n: Number(key.replace('n=', '')), rows })),
);

describe.each(tables)('air spring $name, n = $n', ({ name, n, rows }) => {
  const { chambers, gaugeKPa, patmKPa } = setOf(name);
  const fill = gaugeKPa + patmKPa;
  it.each(rows)('at $x_mm mm', (row) => {
    const state = movedState(filledState(chambers, fill), row.x_mm, n);
    expectNear(state.positiveKPa - patmKPa, kPaPerMPa * Number(row.pp_gauge_MPa), { rel });
    expectNear(state.negativeKPa - patmKPa, kPaPerMPa * Number(row.pn_gauge_MPa), { rel, abs: 1e-6 });
    expectNear(airForceN(chambers, row.x_mm, fill, patmKPa, n), row.F_full, { rel });
    expectNear(airStiffnessNPerMm(chambers, row.x_mm, fill, n), row.dFdx_full, { rel });
    expectNear(airEnergyJ(chambers, row.x_mm, fill, patmKPa, n), Number(row.energy_J), { rel });
  });
});

describe('sag that a fill gives', () => {
  it.each(vectors.sag_roots_n1)('$set, $wheel_load_N N: $state', (row) => {
    const { chambers, curve, gaugeKPa, patmKPa } = setOf(row.set);
    const result = sagForFill(chambers, curve, row.wheel_load_N, gaugeKPa, patmKPa);
    if (row.state === 'bottomed') {
      expect(result).toEqual({ state: 'bottomed' });
      return;
    }
    if (result.state !== 'ok') throw new Error(result.state);
    expectNear(result.sagMm, row.shock_sag_mm, { abs: sagAbs });
    expectNear(curve.wheelTravelAt(result.sagMm), row.wheel_sag_mm, { abs: 3 * sagAbs });
  });
});

describe('fill for a sag', () => {
  it.each(vectors.pressure_for_sag_n1)('$set, $wheel_load_N N', (row) => {
    const { chambers, curve, patmKPa } = setOf(row.set);
    const gauge = fillForSag(chambers, curve, row.wheel_load_N, row.shock_sag_mm, patmKPa);
    expectNear(gauge, kPaPerMPa * row.fill_gauge_MPa, { rel });
    expectNear((gauge ?? NaN) / kPaPerPsi, row.fill_gauge_psi, { rel });
  });
});

describe('a sealed fill elsewhere', () => {
  const kelvin = (celsius: number): number => celsius + 273.15;
  it.each(vectors.temperature_altitude)('$set at $use_temp_C degC and $use_patm_MPa MPa', (row) => {
    const { chambers, curve, gaugeKPa, strokeMm } = setOf(row.set);
    const filled = gaugeKPa + kPaPerMPa * row.fill_patm_MPa;
    const patm = kPaPerMPa * row.use_patm_MPa;
    const fill = fillAtTemperatureKPa(filled, kelvin(row.fill_temp_C), kelvin(row.use_temp_C));
    expectNear(fill - patm, kPaPerMPa * row.gauge_in_use_MPa, { rel });
    const after = sagForFill(chambers, curve, row.wheel_load_N, fill - patm, patm);
    expectNear(after.state === 'ok' ? after.sagMm : null, row.sag_after_mm, { abs: sagAbs });
    expectNear(airForceN(chambers, strokeMm, fill, patm, 1), row.F_end_n1_N, { rel });
    expectNear(airForceN(chambers, strokeMm, fill, patm, 1.4), row['F_end_n1.4_N'], { rel });
  });
});
