import type { LeverageTable } from '../facts.js';
import { integralOf, pchipPieces, slopeOf, valueOf, type Piece } from './pchip.js';

/** Leverage ratio over shock travel. All arguments in mm of shock travel, held within 0 and the stroke. */
export interface Curve {
  strokeMm: number;
  ratioAt(shockMm: number): number;
  /** dLR/ds, 1/mm. */
  slopeAt(shockMm: number): number;
  wheelTravelAt(shockMm: number): number;
  totalTravelMm: number;
  meanRatio: number;
  /** (start - end) / start, %; null where only travel and stroke are known. */
  progressionPercent: number | null;
  progressionToLowestPercent: number | null;
  /** Made of travel and stroke alone. */
  constant: boolean;
  /** The table agrees with the published travel within 3 %. */
  usableForAdvice: boolean;
}

export type CurveProblem =
  | 'no-travel'
  | 'bad-stroke'
  | 'too-few-points'
  | 'not-a-number'
  | 'does-not-start-at-zero'
  | 'not-increasing'
  | 'ratio-not-positive'
  | 'does-not-reach-the-stroke';

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
  if (!table) return constantCurve(travelMm, strokeMm);
  const reason = tableProblem(table, strokeMm, travelMm);
  if (reason) return { ok: false, reason };
  const points = table.by === 'shock-travel' ? table.points : toShockTravel(table.points);
  const reached = points.at(-1)?.[0] ?? 0;
  if (Math.abs(reached - strokeMm) > 0.5 + 1e-9 && table.by === 'shock-travel') {
    return { ok: false, reason: 'does-not-reach-the-stroke' };
  }
  return { ok: true, curve: fromPoints(points, strokeMm, travelMm) };
}

function constantCurve(travelMm: number | null, strokeMm: number): CurveResult {
  if (travelMm === null || !(travelMm > 0) || !Number.isFinite(travelMm)) {
    return { ok: false, reason: 'no-travel' };
  }
  const ratio = travelMm / strokeMm;
  return {
    ok: true,
    curve: {
      strokeMm,
      ratioAt: () => ratio,
      slopeAt: () => 0,
      wheelTravelAt: (s) => ratio * within(s, strokeMm),
      totalTravelMm: travelMm,
      meanRatio: ratio,
      progressionPercent: null,
      progressionToLowestPercent: null,
      constant: true,
      usableForAdvice: true,
    },
  };
}

function tableProblem(
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
  if (by === 'wheel-travel' && travelMm !== null && Math.abs(end - travelMm) > 0.01 * travelMm + 1e-9) {
    return 'does-not-reach-the-stroke';
  }
  return by === 'shock-travel' && Math.abs(end - strokeMm) > 0.5 + 1e-9 ? 'does-not-reach-the-stroke' : null;
}

/**
 * Points by wheel travel as points by shock travel: s(w) is the integral of dw/LR, taken piece by piece with
 * five-point Gauss-Legendre over sixteenths of a piece (error far below a micrometre for smooth ratios).
 */
function toShockTravel(points: LeverageTable['points']): [number, number][] {
  const pieces = pchipPieces(
    points.map(([x]) => x),
    points.map(([, y]) => y),
  );
  const found: [number, number][] = [[0, points[0]?.[1] ?? 0]];
  let s = 0;
  for (const piece of pieces) {
    const step = (piece.x1 - piece.x0) / 16;
    for (let k = 0; k < 16; k += 1) {
      const from = piece.x0 + k * step;
      s += gauss((w) => 1 / valueOf(piece, w), from, from + step);
      found.push([s, valueOf(piece, from + step)]);
    }
  }
  return found;
}

/** Abramowitz and Stegun 25.4.30, n = 5. */
const nodes = [
  [0, 0.5688888888888889],
  [0.5384693101056831, 0.47862867049936647],
  [0.906179845938664, 0.23692688505618908],
] as const;

function gauss(f: (x: number) => number, a: number, b: number): number {
  const [mid, half] = [(a + b) / 2, (b - a) / 2];
  let sum = 0;
  for (const [x, w] of nodes) sum += x === 0 ? w * f(mid) : w * (f(mid - half * x) + f(mid + half * x));
  return sum * half;
}

function fromPoints(points: LeverageTable['points'], strokeMm: number, travelMm: number | null): Curve {
  const pieces = pchipPieces(
    points.map(([x]) => x),
    points.map(([, y]) => y),
  );
  const starts: number[] = [];
  let total = 0;
  for (const piece of pieces) {
    starts.push(total);
    total += integralOf(piece, piece.x1);
  }
  const end = pieces.at(-1)?.x1 ?? strokeMm;
  const pieceAt = (s: number): [Piece, number] => {
    let index = pieces.length - 1;
    while (index > 0 && (pieces[index]?.x0 ?? 0) > s) index -= 1;
    return [pieces[index] as Piece, starts[index] ?? 0];
  };
  const ratios = points.map(([, y]) => y);
  const [first, last] = [ratios[0] ?? 1, ratios.at(-1) ?? 1];
  return {
    strokeMm,
    ratioAt: (s) => valueOf(pieceAt(within(s, end))[0], within(s, end)),
    slopeAt: (s) => slopeOf(pieceAt(within(s, end))[0], within(s, end)),
    wheelTravelAt: (s) => {
      const [piece, before] = pieceAt(within(s, end));
      return before + integralOf(piece, within(s, end));
    },
    totalTravelMm: total,
    meanRatio: total / end,
    progressionPercent: (100 * (first - last)) / first,
    // A monotone cubic has its lowest value at one of its points.
    progressionToLowestPercent: (100 * (first - Math.min(...ratios))) / first,
    constant: false,
    usableForAdvice: travelMm === null || Math.abs(total - travelMm) <= 0.03 * travelMm,
  };
}

const within = (s: number, end: number): number => Math.min(Math.max(s, 0), end);
