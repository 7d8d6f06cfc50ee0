import type { Curve } from '../kinematics/curve.js';

export type SagState =
  { state: 'ok'; sagMm: number } | { state: 'topped-out' } | { state: 'bottomed' } | { state: 'no-answer' };

/**
 * Where a spring's force meets the load: force(s) = load x LR(s). Bisection, 60 halvings of the stroke, so the
 * answer is within stroke / 2^60 of a root; never an edge value: topped out and bottomed are said as such.
 */
export function equilibrium(curve: Curve, loadN: number, forceN: (shockMm: number) => number): SagState {
  const surplus = (s: number): number => forceN(s) - loadN * curve.ratioAt(s);
  const [start, end] = [surplus(0), surplus(curve.strokeMm)];
  if (!Number.isFinite(start) || !Number.isFinite(end)) return { state: 'no-answer' };
  if (start >= 0) return { state: 'topped-out' };
  if (end < 0) return { state: 'bottomed' };
  let [low, high] = [0, curve.strokeMm];
  for (let i = 0; i < 60; i += 1) {
    const mid = (low + high) / 2;
    if (surplus(mid) < 0) low = mid;
    else high = mid;
  }
  return { state: 'ok', sagMm: (low + high) / 2 };
}
