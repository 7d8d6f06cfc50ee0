import type { Curve } from '../kinematics/curve.js';
import { equilibrium, type SagState } from './equilibrium.js';

/**
 * Spring rate that gives a sag, N/mm; null when no positive rate does.
 * @param preloadMm compression of the coil at full extension
 * @param gasN push of the damper's gas on the shaft
 */
export function rateForSag(
  curve: Curve,
  loadN: number,
  sagMm: number,
  preloadMm: number,
  gasN = 0,
): number | null {
  const rate = (loadN * curve.ratioAt(sagMm) - gasN) / (sagMm + preloadMm);
  return Number.isFinite(rate) && rate > 0 && sagMm >= 0 && sagMm <= curve.strokeMm ? rate : null;
}

/** Sag that a rate gives. */
export const sagForRate = (
  curve: Curve,
  loadN: number,
  rateNPerMm: number,
  preloadMm: number,
  gasN = 0,
): SagState => equilibrium(curve, loadN, (s) => rateNPerMm * (s + preloadMm) + gasN);
