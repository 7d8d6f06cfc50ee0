import { inverseBySlope, within, type Curve } from './curve.js';
import { gauss5 } from './gauss.js';
import { pieceAt, pchipPieces, slopeOf, valueOf, type Piece } from './pchip.js';

/**
 * The curve of a table by wheel travel: s(w) is the integral of dw/LR (five-point Gauss-Legendre over sixteenths of
 * each piece, error far below a micrometre for smooth ratios), its inverse by bounded Newton steps, and dLR/ds = LR dLR/dw.
 */
export function wheelTravelCurve(points: readonly (readonly [number, number])[], strokeMm: number): Curve {
  const pieces = pchipPieces(
    points.map(([x]) => x),
    points.map(([, y]) => y),
  );
  const total = pieces.at(-1)?.x1 ?? 0;
  const pieceOf = (w: number): Piece => pieces[pieceAt(pieces, w)] as Piece;
  const knotsW: number[] = [0];
  const knotsS: number[] = [0];
  for (const piece of pieces) {
    for (let k = 1; k <= 16; k += 1) {
      const [from, to] = [knotsW.at(-1) ?? 0, piece.x0 + (k * (piece.x1 - piece.x0)) / 16];
      knotsS.push((knotsS.at(-1) ?? 0) + gauss5((w) => 1 / valueOf(piece, w), from, to));
      knotsW.push(to);
    }
  }
  const ends = knotsS.at(-1) ?? 0;
  const wheelTravelAt = (s: number): number => {
    const held = within(s, ends);
    const i = knotBefore(knotsS, held);
    const [w0, w1, s0] = [knotsW[i] ?? 0, knotsW[i + 1] ?? 0, knotsS[i] ?? 0];
    const piece = pieceOf((w0 + w1) / 2);
    const perWheel = (w: number): number => 1 / valueOf(piece, w);
    return (
      w0 +
      inverseBySlope(
        (d) => gauss5(perWheel, w0, w0 + d),
        (d) => perWheel(w0 + d),
        held - s0,
        w1 - w0,
      )
    );
  };
  const shockTravelAt = (wheelMm: number): number => {
    const held = within(wheelMm, total);
    const i = knotBefore(knotsW, held);
    const from = knotsW[i] ?? 0;
    const piece = pieceOf((from + (knotsW[i + 1] ?? 0)) / 2);
    return (knotsS[i] ?? 0) + gauss5((w) => 1 / valueOf(piece, w), from, held);
  };
  const ratios = points.map(([, y]) => y);
  const [first, last] = [ratios[0] ?? 1, ratios.at(-1) ?? 1];
  const ratioAtWheel = (w: number): number => valueOf(pieceOf(w), w);
  return {
    strokeMm,
    ratioAt: (s) => ratioAtWheel(wheelTravelAt(s)),
    slopeAt: (s) => {
      const w = wheelTravelAt(s);
      return ratioAtWheel(w) * slopeOf(pieceOf(w), w);
    },
    wheelTravelAt,
    shockTravelAt,
    totalTravelMm: total,
    meanRatio: total / ends,
    progressionPercent: (100 * (first - last)) / first,
    progressionToLowestPercent: (100 * (first - Math.min(...ratios))) / first,
    constant: false,
    // The table's end is the travel already; what may be wrong is the shock travel it adds up to.
    usableForAdvice: Math.abs(ends - strokeMm) <= 0.03 * strokeMm,
  };
}

/** Index of the last knot at or before a value, the last knot of all left out; the first where the value lies before. */
function knotBefore(knots: readonly number[], value: number): number {
  let low = 0;
  let high = knots.length - 1;
  while (high - low > 1) {
    const mid = (low + high) >> 1;
    if ((knots[mid] ?? 0) > value) high = mid;
    else low = mid;
  }
  return low;
}
