import type { Point } from '../facts.js';

/** Corners of a polygon as x, y, x, y and so on: one buffer serves an outline in all its poses. */
export type Corners = Float64Array;

export const cornersOf = (polygon: readonly Point[]): Corners => {
  const corners = new Float64Array(2 * polygon.length);
  polygon.forEach(([x, y], i) => {
    corners[2 * i] = x;
    corners[2 * i + 1] = y;
  });
  return corners;
};

/** The pair of edges that came nearest last time, by the index of their last corner: a good first guess. */
export interface NearestEdges {
  a: number;
  b: number;
}

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

/** On which side of the line from p to q a point lies. */
const side = (px: number, py: number, qx: number, qy: number, x: number, y: number): number =>
  (qx - px) * (y - py) - (qy - py) * (x - px);

/** Square of the distance of two edges, each by the index of its last corner; 0 where they cross. */
function edges2(a: Corners, i: number, b: Corners, j: number): number {
  const [i0, j0] = [before(a, i), before(b, j)];
  const px = a[i0] as number;
  const py = a[i0 + 1] as number;
  const qx = a[i] as number;
  const qy = a[i + 1] as number;
  const rx = b[j0] as number;
  const ry = b[j0 + 1] as number;
  const sx = b[j] as number;
  const sy = b[j + 1] as number;
  // Touching is left to the distances, which are 0 then.
  if (
    side(px, py, qx, qy, rx, ry) * side(px, py, qx, qy, sx, sy) < 0 &&
    side(rx, ry, sx, sy, px, py) * side(rx, ry, sx, sy, qx, qy) < 0
  ) {
    return 0;
  }
  const toB = Math.min(pointToSegment2(px, py, rx, ry, sx, sy), pointToSegment2(qx, qy, rx, ry, sx, sy));
  const toA = Math.min(pointToSegment2(rx, ry, px, py, qx, qy), pointToSegment2(sx, sy, px, py, qx, qy));
  return Math.min(toB, toA);
}

/** Index of the corner before, around the polygon. */
const before = (of: Corners, i: number): number => (i === 0 ? of.length : i) - 2;

/** Whether a point lies inside (even-odd rule). */
function inside(x: number, y: number, of: Corners): boolean {
  let within = false;
  let ax = of[of.length - 2] as number;
  let ay = of[of.length - 1] as number;
  for (let i = 0; i < of.length; i += 2) {
    const bx = of[i] as number;
    const by = of[i + 1] as number;
    if (ay > y !== by > y && x < ((bx - ax) * (y - ay)) / (by - ay) + ax) within = !within;
    ax = bx;
    ay = by;
  }
  return within;
}

/** How far two intervals lie apart; 0 or less where they meet. */
const gap = (p: number, q: number, r: number, s: number): number =>
  (p < q ? p : q) > (r > s ? r : s) ? (p < q ? p : q) - (r > s ? r : s) : (r < s ? r : s) - (p > q ? p : q);

/**
 * Least distance between two filled polygons, in their own unit; 0 where they touch, overlap or one lies in the
 * other (as in the simple-features standard). NaN for an empty one.
 * @param guess where the nearest pair may be; written over with where it is
 */
export function cornersDistance(a: Corners, b: Corners, guess: NearestEdges): number {
  if (a.length === 0 || b.length === 0) return NaN;
  if (inside(a[0] as number, a[1] as number, b) || inside(b[0] as number, b[1] as number, a)) return 0;
  let least = edges2(a, guess.a, b, guess.b);
  const [left, right] = [leastOf(b, 0), greatestOf(b, 0)];
  const [bottom, top] = [leastOf(b, 1), greatestOf(b, 1)];
  let px = a[a.length - 2] as number;
  let py = a[a.length - 1] as number;
  for (let i = 0; i < a.length; i += 2) {
    const qx = a[i] as number;
    const qy = a[i + 1] as number;
    // Boxes further apart than the least so far cannot hold a nearer pair: first against the whole, then edge by edge.
    if (!(gaps2(gap(px, qx, left, right), gap(py, qy, bottom, top)) > least)) {
      let rx = b[b.length - 2] as number;
      let ry = b[b.length - 1] as number;
      for (let j = 0; j < b.length; j += 2) {
        const sx = b[j] as number;
        const sy = b[j + 1] as number;
        if (!(gaps2(gap(px, qx, rx, sx), gap(py, qy, ry, sy)) > least)) {
          const found = edges2(a, i, b, j);
          if (!(found >= least)) {
            least = found;
            guess.a = i;
            guess.b = j;
          }
        }
        rx = sx;
        ry = sy;
      }
    }
    px = qx;
    py = qy;
  }
  return Math.sqrt(least);
}

const gaps2 = (x: number, y: number): number => (x > 0 ? x * x : 0) + (y > 0 ? y * y : 0);

function leastOf(of: Corners, axis: 0 | 1): number {
  let least = Infinity;
  for (let i = axis; i < of.length; i += 2) if ((of[i] as number) < least) least = of[i] as number;
  return least;
}

function greatestOf(of: Corners, axis: 0 | 1): number {
  let greatest = -Infinity;
  for (let i = axis; i < of.length; i += 2) if ((of[i] as number) > greatest) greatest = of[i] as number;
  return greatest;
}

/** The same for polygons as lists of points; NaN where a corner is no number. */
export function polygonDistance(a: readonly Point[], b: readonly Point[]): number {
  const corners = [cornersOf(a), cornersOf(b)] as const;
  const sound = corners.every((of) => of.every((value) => Number.isFinite(value)));
  return sound ? cornersDistance(...corners, { a: 0, b: 0 }) : NaN;
}
