/** One cubic piece in t = x - x0: y = a + b t + c t2 + d t3. */
export interface Piece {
  x0: number;
  x1: number;
  a: number;
  b: number;
  c: number;
  d: number;
}

/**
 * Slopes of the monotone cubic (Fritsch and Butland's weighted harmonic mean; one-sided three-point ends,
 * limited), as SciPy's PchipInterpolator has them.
 */
export function pchipSlopes(x: readonly number[], y: readonly number[]): number[] {
  const n = x.length;
  const h = Array.from({ length: n - 1 }, (_, i) => at(x, i + 1) - at(x, i));
  const m = h.map((step, i) => (at(y, i + 1) - at(y, i)) / step);
  if (n === 2) return [at(m, 0), at(m, 0)];
  const inner = Array.from({ length: n - 2 }, (_, k) => {
    const [before, after] = [at(m, k), at(m, k + 1)];
    if (before * after <= 0) return 0;
    const w1 = 2 * at(h, k + 1) + at(h, k);
    const w2 = at(h, k + 1) + 2 * at(h, k);
    return (w1 + w2) / (w1 / before + w2 / after);
  });
  const last = n - 2;
  return [
    endSlope(at(h, 0), at(h, 1), at(m, 0), at(m, 1)),
    ...inner,
    endSlope(at(h, last), at(h, last - 1), at(m, last), at(m, last - 1)),
  ];
}

function endSlope(h0: number, h1: number, m0: number, m1: number): number {
  const slope = ((2 * h0 + h1) * m0 - h0 * m1) / (h0 + h1);
  if (Math.sign(slope) !== Math.sign(m0)) return 0;
  if (Math.sign(m0) !== Math.sign(m1) && Math.abs(slope) > 3 * Math.abs(m0)) return 3 * m0;
  return slope;
}

/** The cubic pieces through the points; x strictly increasing, at least two. */
export function pchipPieces(x: readonly number[], y: readonly number[]): Piece[] {
  const slopes = pchipSlopes(x, y);
  return Array.from({ length: x.length - 1 }, (_, i) => {
    const h = at(x, i + 1) - at(x, i);
    const m = (at(y, i + 1) - at(y, i)) / h;
    const [s0, s1] = [at(slopes, i), at(slopes, i + 1)];
    return {
      x0: at(x, i),
      x1: at(x, i + 1),
      a: at(y, i),
      b: s0,
      c: (3 * m - 2 * s0 - s1) / h,
      d: (s0 + s1 - 2 * m) / (h * h),
    };
  });
}

/** Index of the piece that holds x; the ends hold what lies outside. */
export function pieceAt(pieces: readonly Piece[], x: number): number {
  let index = pieces.length - 1;
  while (index > 0 && (pieces[index]?.x0 ?? 0) > x) index -= 1;
  return index;
}

export const valueOf = (p: Piece, x: number): number => {
  const t = x - p.x0;
  return p.a + t * (p.b + t * (p.c + t * p.d));
};
export const slopeOf = (p: Piece, x: number): number => {
  const t = x - p.x0;
  return p.b + t * (2 * p.c + t * 3 * p.d);
};
/** Integral from the start of the piece to x, exact. */
export const integralOf = (p: Piece, x: number): number => {
  const t = x - p.x0;
  return t * (p.a + t * (p.b / 2 + t * (p.c / 3 + (t * p.d) / 4)));
};

function at(list: readonly number[], index: number): number {
  const value = list[index];
  if (value === undefined) throw new RangeError('at least two points are needed');
  return value;
}
