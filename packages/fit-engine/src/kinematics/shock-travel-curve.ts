import { inverseOf, within, type Curve } from './curve.js';
import { integralOf, pieceAt, pchipPieces, slopeOf, valueOf } from './pchip.js';

/** The curve of a table by shock travel; wheel travel is the exact integral of the cubic pieces. */
export function shockTravelCurve(
  points: readonly (readonly [number, number])[],
  strokeMm: number,
  travelMm: number | null,
): Curve {
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
  const at = (s: number): number => pieceAt(pieces, s);
  const piece = (index: number) => pieces[index] as (typeof pieces)[number];
  const wheelTravelAt = (s: number): number => {
    const x = within(s, end);
    return (starts[at(x)] ?? 0) + integralOf(piece(at(x)), x);
  };
  const ratios = points.map(([, y]) => y);
  const [first, last] = [ratios[0] ?? 1, ratios.at(-1) ?? 1];
  return {
    strokeMm,
    ratioAt: (s) => valueOf(piece(at(within(s, end))), within(s, end)),
    slopeAt: (s) => slopeOf(piece(at(within(s, end))), within(s, end)),
    wheelTravelAt,
    shockTravelAt: (w) => inverseOf(wheelTravelAt, w, end),
    totalTravelMm: total,
    meanRatio: total / end,
    progressionPercent: (100 * (first - last)) / first,
    // A monotone cubic has its lowest value at one of its points.
    progressionToLowestPercent: (100 * (first - Math.min(...ratios))) / first,
    constant: false,
    usableForAdvice: travelMm === null || Math.abs(total - travelMm) <= 0.03 * travelMm,
  };
}
