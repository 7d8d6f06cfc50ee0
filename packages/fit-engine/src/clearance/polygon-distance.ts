import type { Point } from '../facts.js';

function pointToSegment2(px: number, py: number, ax: number, ay: number, bx: number, by: number): number {
  const dx = bx - ax;
  const dy = by - ay;
  const length2 = dx * dx + dy * dy;
  const along = length2 === 0 ? 0 : ((px - ax) * dx + (py - ay) * dy) / length2;
  const t = along < 0 ? 0 : along > 1 ? 1 : along;
  const x = px - ax - t * dx;
  const y = py - ay - t * dy;
  return x * x + y * y;
}

/** Whether two segments cross properly; touching is left to the distance, which is 0 then. */
function cross(a: Point, b: Point, c: Point, d: Point): boolean {
  const side = (p: Point, q: Point, r: Point): number =>
    (q[0] - p[0]) * (r[1] - p[1]) - (q[1] - p[1]) * (r[0] - p[0]);
  return side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0;
}

/** Whether a point lies inside (even-odd rule). */
function inside(p: Point, polygon: readonly Point[]): boolean {
  let within = false;
  let a = polygon[polygon.length - 1];
  for (const b of polygon) {
    if (a && a[1] > p[1] !== b[1] > p[1] && p[0] < ((b[0] - a[0]) * (p[1] - a[1])) / (b[1] - a[1]) + a[0]) {
      within = !within;
    }
    a = b;
  }
  return within;
}

/**
 * Least distance between two filled polygons, in their own unit; 0 where they touch, overlap or one lies in the
 * other (as in the simple-features standard). NaN for an empty one.
 */
export function polygonDistance(a: readonly Point[], b: readonly Point[]): number {
  const [firstA, firstB] = [a[0], b[0]];
  if (!firstA || !firstB) return NaN;
  if (inside(firstA, b) || inside(firstB, a)) return 0;
  let least = Infinity;
  let p = a[a.length - 1] as Point;
  for (const q of a) {
    let r = b[b.length - 1] as Point;
    for (const s of b) {
      // Boxes further apart than the least so far cannot hold a nearer pair.
      const gapX = Math.max(
        Math.min(p[0], q[0]) - Math.max(r[0], s[0]),
        Math.min(r[0], s[0]) - Math.max(p[0], q[0]),
      );
      const gapY = Math.max(
        Math.min(p[1], q[1]) - Math.max(r[1], s[1]),
        Math.min(r[1], s[1]) - Math.max(p[1], q[1]),
      );
      const gap2 = (gapX > 0 ? gapX * gapX : 0) + (gapY > 0 ? gapY * gapY : 0);
      if (!(gap2 > least)) {
        if (gap2 === 0 && cross(p, q, r, s)) return 0;
        const found = Math.min(
          pointToSegment2(p[0], p[1], r[0], r[1], s[0], s[1]),
          pointToSegment2(q[0], q[1], r[0], r[1], s[0], s[1]),
          pointToSegment2(r[0], r[1], p[0], p[1], q[0], q[1]),
          pointToSegment2(s[0], s[1], p[0], p[1], q[0], q[1]),
        );
        if (!(found >= least)) least = found;
      }
      r = s;
    }
    p = q;
  }
  return Math.sqrt(least);
}
