import type { Point } from '../facts.js';

const sub = (a: Point, b: Point): Point => [a[0] - b[0], a[1] - b[1]];
const cross = (a: Point, b: Point): number => a[0] * b[1] - a[1] * b[0];

function pointToSegment(p: Point, a: Point, b: Point): number {
  const d = sub(b, a);
  const length2 = d[0] ** 2 + d[1] ** 2;
  const along = length2 === 0 ? 0 : ((p[0] - a[0]) * d[0] + (p[1] - a[1]) * d[1]) / length2;
  const t = Math.min(1, Math.max(0, along));
  return Math.hypot(p[0] - a[0] - t * d[0], p[1] - a[1] - t * d[1]);
}

function segmentsCross(a: Point, b: Point, c: Point, d: Point): boolean {
  const [ab, cd] = [sub(b, a), sub(d, c)];
  const [c1, c2] = [cross(ab, sub(c, a)), cross(ab, sub(d, a))];
  const [c3, c4] = [cross(cd, sub(a, c)), cross(cd, sub(b, c))];
  return c1 * c2 < 0 && c3 * c4 < 0;
}

function segmentDistance(a: Point, b: Point, c: Point, d: Point): number {
  if (segmentsCross(a, b, c, d)) return 0;
  return Math.min(
    pointToSegment(a, c, d),
    pointToSegment(b, c, d),
    pointToSegment(c, a, b),
    pointToSegment(d, a, b),
  );
}

/** Whether a point lies inside (even-odd rule). */
function inside(p: Point, polygon: readonly Point[]): boolean {
  let within = false;
  polygon.forEach((a, i) => {
    const b = polygon[(i + 1) % polygon.length] as Point;
    if (a[1] > p[1] !== b[1] > p[1] && p[0] < ((b[0] - a[0]) * (p[1] - a[1])) / (b[1] - a[1]) + a[0]) {
      within = !within;
    }
  });
  return within;
}

/** Least distance between two filled polygons; 0 where they touch, overlap or one lies in the other. */
export function polygonDistance(a: readonly Point[], b: readonly Point[]): number {
  const [firstA, firstB] = [a[0], b[0]];
  if (!firstA || !firstB) return NaN;
  if (inside(firstA, b) || inside(firstB, a)) return 0;
  let least = Infinity;
  a.forEach((p, i) => {
    const q = a[(i + 1) % a.length] as Point;
    b.forEach((r, j) => {
      const s = b[(j + 1) % b.length] as Point;
      const distance = segmentDistance(p, q, r, s);
      if (distance < least) least = distance;
    });
  });
  return least;
}
