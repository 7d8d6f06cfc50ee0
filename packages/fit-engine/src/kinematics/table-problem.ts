import type { LeverageTable } from '../facts.js';

export type CurveProblem =
  | 'no-travel'
  | 'bad-stroke'
  | 'too-few-points'
  | 'not-a-number'
  | 'does-not-start-at-zero'
  | 'not-increasing'
  | 'ratio-not-positive'
  | 'does-not-reach-the-stroke';

/** Why a leverage table is refused, or null: it must run from 0 to within 0.5 mm of the stroke, or 1 % of the travel. */
export function tableProblem(
  { points, by }: LeverageTable,
  strokeMm: number,
  travelMm: number | null,
): CurveProblem | null {
  if (points.length < 2) return 'too-few-points';
  if (points.some(([x, y]) => !Number.isFinite(x) || !Number.isFinite(y))) return 'not-a-number';
  if (points[0]?.[0] !== 0) return 'does-not-start-at-zero';
  if (points.some(([x], i) => i > 0 && x <= (points[i - 1]?.[0] ?? 0))) return 'not-increasing';
  if (points.some(([, y]) => y <= 0)) return 'ratio-not-positive';
  const end = points.at(-1)?.[0] ?? 0;
  const [target, slack] = by === 'shock-travel' ? [strokeMm, 0.5] : [travelMm, 0.01 * (travelMm ?? 0)];
  return target !== null && Math.abs(end - target) > slack + 1e-9 ? 'does-not-reach-the-stroke' : null;
}
