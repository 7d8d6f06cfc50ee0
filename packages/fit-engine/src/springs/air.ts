import type { AirChambers } from '../facts.js';
import type { Curve } from '../kinematics/curve.js';
import { equilibrium, type SagState } from './equilibrium.js';

/**
 * Force of a two-chamber air spring, N: p = p0 (V0/V)^n absolute in both chambers, filled alike at full extension.
 * Chambers in mm2 and mm3, pressures in kPa absolute, s in mm; n = 1 slow, 1.35 fast.
 */
export function airForceN(
  c: AirChambers,
  shockMm: number,
  fillAbsKPa: number,
  patmKPa: number,
  n: number,
  gasN = 0,
): number {
  const positive = fillAbsKPa * (c.volumeMm3 / (c.volumeMm3 - c.areaMm2 * shockMm)) ** n;
  const negative =
    fillAbsKPa * (c.negativeVolumeMm3 / (c.negativeVolumeMm3 + c.negativeAreaMm2 * shockMm)) ** n;
  return (c.areaMm2 * (positive - patmKPa) - c.negativeAreaMm2 * (negative - patmKPa)) / 1000 + gasN;
}

/** Stiffness dF/ds, N/mm, of the same spring. */
export function airStiffnessNPerMm(c: AirChambers, shockMm: number, fillAbsKPa: number, n: number): number {
  const vp = c.volumeMm3 - c.areaMm2 * shockMm;
  const vn = c.negativeVolumeMm3 + c.negativeAreaMm2 * shockMm;
  const pp = fillAbsKPa * (c.volumeMm3 / vp) ** n;
  const pn = fillAbsKPa * (c.negativeVolumeMm3 / vn) ** n;
  return (n * (c.areaMm2 ** 2 * (pp / vp) + c.negativeAreaMm2 ** 2 * (pn / vn))) / 1000;
}

/** Fill pressure for a sag, kPa gauge: linear in the pressure, so no search. Null when no positive pressure does it. */
export function fillForSag(
  c: AirChambers,
  curve: Curve,
  loadN: number,
  sagMm: number,
  patmKPa: number,
  gasN = 0,
): number | null {
  const vp = c.volumeMm3 - c.areaMm2 * sagMm;
  const vn = c.negativeVolumeMm3 + c.negativeAreaMm2 * sagMm;
  if (!(vp > 0) || !(sagMm >= 0) || sagMm > curve.strokeMm) return null;
  const absolute =
    (1000 * (loadN * curve.ratioAt(sagMm) - gasN) + (c.areaMm2 - c.negativeAreaMm2) * patmKPa) /
    ((c.areaMm2 * c.volumeMm3) / vp - (c.negativeAreaMm2 * c.negativeVolumeMm3) / vn);
  const gauge = absolute - patmKPa;
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
 * no gas (common practice for the bounds).
 */
export function leastFillKPa(
  diameterMm: number,
  curve: Curve,
  loadN: number,
  softestSagPercent: number,
  patmKPa: number,
): number | null {
  const area = (Math.PI / 4) * (diameterMm - 4) ** 2;
  const fraction = softestSagPercent / 100;
  const force = loadN * curve.ratioAt(fraction * curve.strokeMm);
  const gauge = ((1000 * force) / area + patmKPa) * (1 - 0.75 * fraction) - patmKPa;
  return Number.isFinite(gauge) ? Math.max(gauge, 0) : null;
}
