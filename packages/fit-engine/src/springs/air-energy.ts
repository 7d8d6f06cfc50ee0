import type { AirChambers } from '../facts.js';
import { filledState, movedState, stateEnergyJ, stateForceN } from './air-state.js';

/** Exponent of quick movements, between slow (1) and without heat exchange (1.4); common practice. */
export const quickExponent = 1.35;

/**
 * Work put in from full extension to a shock travel, J: landing from the air.
 * @param fillAbsKPa fill at full extension, kPa absolute
 */
export const airEnergyJ = (
  c: AirChambers,
  shockMm: number,
  fillAbsKPa: number,
  patmKPa: number,
  n = quickExponent,
): number => stateEnergyJ(filledState(c, fillAbsKPa), shockMm, patmKPa, n);

export interface FromSag {
  /** Force at the end, N. */
  forceN: number;
  /** Work put in between sag and the end, J. */
  energyJ: number;
}

/**
 * From sag to a greater travel: the rider has settled slowly (n = 1), what comes then is quick.
 * @param gasN push of the damper's gas on the shaft, constant over the travel
 */
export function airFromSag(
  c: AirChambers,
  { sagMm, endMm }: { sagMm: number; endMm: number },
  fillAbsKPa: number,
  patmKPa: number,
  gasN = 0,
  n = quickExponent,
): FromSag {
  const atSag = movedState(filledState(c, fillAbsKPa), sagMm, 1);
  const way = endMm - sagMm;
  return {
    forceN: stateForceN(movedState(atSag, way, n), patmKPa) + gasN,
    energyJ: stateEnergyJ(atSag, way, patmKPa, n) + (gasN * way) / 1000,
  };
}
