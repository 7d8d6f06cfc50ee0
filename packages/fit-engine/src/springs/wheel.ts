import type { Curve } from '../kinematics/curve.js';

/** Vertical force at the wheel, N, by virtual work without friction. */
export const wheelForceN = (curve: Curve, shockMm: number, shockForceN: number): number =>
  shockForceN / curve.ratioAt(shockMm);

/** Rate at the wheel, N/mm: (F' LR - F LR') / LR^3. */
export function wheelRateNPerMm(
  curve: Curve,
  shockMm: number,
  shockForceN: number,
  shockRateNPerMm: number,
): number {
  const ratio = curve.ratioAt(shockMm);
  return (shockRateNPerMm * ratio - shockForceN * curve.slopeAt(shockMm)) / ratio ** 3;
}

/** Natural frequency at sag, Hz; NaN for a falling rate. @param massKg sprung mass on the wheel, load / g */
export const frequencyHz = (wheelRate: number, massKg: number): number =>
  Number.isFinite(massKg) ? Math.sqrt((1000 * wheelRate) / massKg) / (2 * Math.PI) : NaN;
