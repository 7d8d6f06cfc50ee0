import type { LeverageTable } from '../facts.js';
import { within, type Curve } from './curve.js';
import { shockTravelCurve } from './shock-travel-curve.js';
import { tableProblem, type CurveProblem } from './table-problem.js';
import { wheelTravelCurve } from './wheel-travel-curve.js';

export type CurveResult = { ok: true; curve: Curve } | { ok: false; reason: CurveProblem };

/**
 * The leverage curve of a frame with one stroke.
 * @param table points by shock or wheel travel; null: constant ratio travel / stroke
 * @param travelMm published travel, used for the constant ratio and to check the table
 */
export function makeCurve(
  table: LeverageTable | null,
  travelMm: number | null,
  strokeMm: number,
): CurveResult {
  if (!(strokeMm > 0) || !Number.isFinite(strokeMm)) return { ok: false, reason: 'bad-stroke' };
  const travel = travelMm !== null && Number.isFinite(travelMm) && travelMm > 0 ? travelMm : null;
  if (!table) return constantCurve(travel, strokeMm);
  const reason = tableProblem(table, strokeMm, travel);
  if (reason) return { ok: false, reason };
  const curve =
    table.by === 'shock-travel'
      ? shockTravelCurve(table.points, strokeMm, travel)
      : wheelTravelCurve(table.points, strokeMm);
  return { ok: true, curve };
}

/**
 * The curve that springs are reckoned with: the table where it is sound, else the mean leverage of travel and stroke.
 * A table that contradicts its own frame is worth no more than none.
 */
export function curveForSprings(
  table: LeverageTable | null,
  travelMm: number | null,
  strokeMm: number,
): CurveResult {
  const made = makeCurve(table, travelMm, strokeMm);
  if (made.ok && made.curve.usableForAdvice) return made;
  return table ? makeCurve(null, travelMm, strokeMm) : made;
}

function constantCurve(travelMm: number | null, strokeMm: number): CurveResult {
  if (travelMm === null) return { ok: false, reason: 'no-travel' };
  const ratio = travelMm / strokeMm;
  if (!Number.isFinite(ratio)) return { ok: false, reason: 'bad-stroke' };
  return {
    ok: true,
    curve: {
      strokeMm,
      ratioAt: () => ratio,
      slopeAt: () => 0,
      wheelTravelAt: (s) => ratio * within(s, strokeMm),
      shockTravelAt: (w) => within(w / ratio, strokeMm),
      totalTravelMm: travelMm,
      meanRatio: ratio,
      progressionPercent: null,
      progressionToLowestPercent: null,
      constant: true,
      usableForAdvice: true,
    },
  };
}
