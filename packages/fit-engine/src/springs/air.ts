import type { AirChambers } from '../facts.js';
import type { Curve } from '../kinematics/curve.js';
import { filledState, movedState, stateForceN, stateStiffnessNPerMm } from './air-state.js';
import { equilibrium, type SagState } from './equilibrium.js';

/**
 * Force of a two-chamber air spring, N: p = p0 (V0/V)^n absolute in both chambers, filled alike at full extension.
 * Chambers in mm2 and mm3, pressures in kPa absolute, s in mm; n = 1 slow, 1.35 fast. NaN where no air is left.
 */
export const airForceN = (
  c: AirChambers,
  shockMm: number,
  fillAbsKPa: number,
  patmKPa: number,
  n: number,
  gasN = 0,
): number => stateForceN(movedState(filledState(c, fillAbsKPa), shockMm, n), patmKPa) + gasN;

/** Stiffness dF/ds, N/mm, of the same spring. */
export const airStiffnessNPerMm = (c: AirChambers, shockMm: number, fillAbsKPa: number, n: number): number =>
  stateStiffnessNPerMm(movedState(filledState(c, fillAbsKPa), shockMm, n), n);

/**
 * Fill pressure for a sag, kPa gauge: linear in the pressure, so no search. Null when no positive pressure does it,
 * or the chambers cannot be true.
 */
export function fillForSag(
  c: AirChambers,
  curve: Curve,
  loadN: number,
  sagMm: number,
  patmKPa: number,
  gasN = 0,
): number | null {
  if (!(sagMm >= 0) || sagMm > curve.strokeMm) return null;
  return fillForForce(c, loadN * curve.ratioAt(sagMm) - gasN, sagMm, patmKPa);
}

/** The same for a force on the shaft, N, where the leverage at the sag is known already. */
export function fillForForce(c: AirChambers, forceN: number, sagMm: number, patmKPa: number): number | null {
  // Force per kPa of fill, so that nothing is worked out twice in two ways.
  const perKPa = stateForceN(movedState(filledState(c, 1), sagMm, 1), 0);
  if (!(perKPa > 0)) return null;
  const neededN = forceN + ((c.areaMm2 - c.negativeAreaMm2) * patmKPa) / 1000;
  const gauge = neededN / perKPa - patmKPa;
  return Number.isFinite(gauge) && gauge > 0 ? gauge : null;
}

/** Sag that a fill gives, slow compression (n = 1). */
export const sagForFill = (
  c: AirChambers,
  curve: Curve,
  loadN: number,
  gaugeKPa: number,
  patmKPa: number,
  gasN = 0,
): SagState => equilibrium(curve, loadN, (s) => airForceN(c, s, gaugeKPa + patmKPa, patmKPa, 1, gasN));

/**
 * The least fill that any shock of this outside diameter could need, kPa gauge, when its chambers are not known:
 * piston area at most pi/4 (diameter - 4 mm)^2, chamber ratio at least 1 - 0.75 x sag fraction, no negative chamber,
 * no gas (common practice for the bounds). Null for a diameter that leaves no room for a piston.
 */
export function leastFillKPa(
  diameterMm: number,
  curve: Curve,
  loadN: number,
  softestSagPercent: number,
  patmKPa: number,
): number | null {
  const fraction = softestSagPercent / 100;
  return leastFillForForce(diameterMm, loadN * curve.ratioAt(fraction * curve.strokeMm), fraction, patmKPa);
}

/** The same for a force on the shaft, N, at the softest sag, a fraction of the stroke. */
export function leastFillForForce(
  diameterMm: number,
  forceN: number,
  fraction: number,
  patmKPa: number,
): number | null {
  if (!(diameterMm > 4) || !Number.isFinite(diameterMm)) return null;
  if (!(fraction >= 0 && fraction <= 1)) return null;
  const area = (Math.PI / 4) * (diameterMm - 4) ** 2;
  const gauge = ((1000 * forceN) / area + patmKPa) * (1 - 0.75 * fraction) - patmKPa;
  return Number.isFinite(gauge) ? Math.max(gauge, 0) : null;
}
