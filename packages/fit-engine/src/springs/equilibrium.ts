import type { Curve } from '../kinematics/curve.js';

export type SagState =
  { state: 'ok'; sagMm: number } | { state: 'topped-out' } | { state: 'bottomed' } | { state: 'no-answer' };

/** Width of the interval in which the answer is known to lie, mm. */
const withinMm = 1e-12;

/**
 * Where a spring's force meets the load: force(s) = load x LR(s). Secants between a travel known to be too soft and
 * one too stiff (after the Illinois method), every third step a halving, so that 150 steps end within a picometre
 * whatever the curve; most take a dozen. Never an edge value: topped out and bottomed are said as such.
 */
export function equilibrium(curve: Curve, loadN: number, forceN: (shockMm: number) => number): SagState {
  const surplus = (s: number): number => forceN(s) - loadN * curve.ratioAt(s);
  const [start, end] = [surplus(0), surplus(curve.strokeMm)];
  if (!Number.isFinite(start) || !Number.isFinite(end)) return { state: 'no-answer' };
  if (start >= 0) return { state: 'topped-out' };
  if (end < 0) return { state: 'bottomed' };
  let low = 0;
  let high = curve.strokeMm;
  let [softN, stiffN] = [start, end];
  // What the secant is drawn through: the end that stays counts half, or the secant would never leave it.
  let [lowN, highN] = [start, end];
  for (let i = 0; i < 150 && high - low > withinMm; i += 1) {
    const middle = (low + high) / 2;
    const secant = crossing(low, lowN, high, highN);
    const s = i % 3 !== 2 && secant > low && secant < high ? secant : middle;
    const over = surplus(s);
    if (over < 0) {
      low = s;
      softN = lowN = over;
      if (s !== middle) highN /= 2;
    } else {
      high = s;
      stiffN = highN = over;
      if (s !== middle) lowN /= 2;
    }
  }
  return { state: 'ok', sagMm: crossing(low, softN, high, stiffN) };
}

/** Where the line through two points crosses zero. */
const crossing = (low: number, lowN: number, high: number, highN: number): number =>
  high - (highN * (high - low)) / (highN - lowN);
