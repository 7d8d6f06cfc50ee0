import type { AirChambers } from '../facts.js';

/** Two chambers as they stand: areas in mm2, volumes in mm3, pressures in kPa absolute. */
export interface AirState extends AirChambers {
  positiveKPa: number;
  negativeKPa: number;
}

/** Filled at full extension: the same pressure on both sides. */
export const filledState = (c: AirChambers, fillAbsKPa: number): AirState => ({
  areaMm2: c.areaMm2,
  negativeAreaMm2: c.negativeAreaMm2,
  volumeMm3: c.volumeMm3,
  negativeVolumeMm3: c.negativeVolumeMm3,
  positiveKPa: fillAbsKPa,
  negativeKPa: fillAbsKPa,
});

/**
 * The state after the shock has shortened by so much, p V^n constant in each chamber (n = 1 slow, 1.35 fast). All
 * NaN where the positive chamber would have no volume left; a spring without a negative chamber has area 0 there.
 */
export function movedState(state: AirState, byMm: number, n: number): AirState {
  const [growth, shrink] = volumeRatios(state, byMm);
  return {
    areaMm2: state.areaMm2,
    negativeAreaMm2: state.negativeAreaMm2,
    volumeMm3: state.volumeMm3 / shrink,
    negativeVolumeMm3: state.negativeVolumeMm3 * growth,
    positiveKPa: state.positiveKPa * shrink ** n,
    negativeKPa: state.negativeKPa * growth ** -n,
  };
}

/** Negative volume after over before, and positive volume before over after: both above 1 in compression. */
function volumeRatios(state: AirState, byMm: number): [growth: number, shrink: number] {
  const volume = state.volumeMm3 - state.areaMm2 * byMm;
  const growth =
    state.negativeAreaMm2 === 0 ? 1 : 1 + (state.negativeAreaMm2 * byMm) / state.negativeVolumeMm3;
  const sound = volume > 0 && growth > 0 && Number.isFinite(state.negativeVolumeMm3);
  return sound ? [growth, state.volumeMm3 / volume] : [NaN, NaN];
}

/** Force on the shaft, N, without the damper's gas. */
export const stateForceN = (state: AirState, patmKPa: number): number =>
  (state.areaMm2 * (state.positiveKPa - patmKPa) - state.negativeAreaMm2 * (state.negativeKPa - patmKPa)) /
  1000;

/** Stiffness dF/ds, N/mm. */
export function stateStiffnessNPerMm(state: AirState, n: number): number {
  const positive = state.areaMm2 ** 2 * (state.positiveKPa / state.volumeMm3);
  const negative =
    state.negativeAreaMm2 === 0
      ? 0
      : state.negativeAreaMm2 ** 2 * (state.negativeKPa / state.negativeVolumeMm3);
  return (n * (positive + negative)) / 1000;
}

/** Work put into the spring while the shock shortens by so much, J: the exact integral of the force. */
export function stateEnergyJ(state: AirState, byMm: number, patmKPa: number, n: number): number {
  const [growth, shrink] = volumeRatios(state, byMm);
  // Integral of (V0/V)^n dV / V0, over ln(V0/V); at n = 1 it is the logarithm itself.
  const over = (log: number): number => (n === 1 ? log : Math.expm1((n - 1) * log) / (n - 1));
  const positive = state.positiveKPa * state.volumeMm3 * over(Math.log(shrink));
  const negative =
    state.negativeAreaMm2 === 0 ? 0 : state.negativeKPa * state.negativeVolumeMm3 * over(-Math.log(growth));
  const outside = patmKPa * (state.areaMm2 - state.negativeAreaMm2) * byMm;
  // 1 kPa mm3 is 0.001 N mm, and 1 N mm is 0.001 J.
  return (positive + negative - outside) * 1e-6;
}
