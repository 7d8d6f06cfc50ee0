import type { Point } from '../facts.js';

const distance = ([ax, ay]: Point, [bx, by]: Point): number => Math.hypot(bx - ax, by - ay);

function onEdge([px, py]: Point, [ax, ay]: Point, [bx, by]: Point): Point {
  const [dx, dy] = [bx - ax, by - ay];
  const length2 = dx * dx + dy * dy;
  const t = length2 === 0 ? 0 : Math.min(1, Math.max(0, ((px - ax) * dx + (py - ay) * dy) / length2));
  return [ax + t * dx, ay + t * dy];
}

/** From every corner of one polygon to every edge of another. */
function fromCorners(corners: readonly Point[], edges: readonly Point[]): [Point, Point] | null {
  let best: [Point, Point] | null = null;
  for (const corner of corners) {
    edges.forEach((to, i) => {
      const found = onEdge(corner, edges.at(i - 1) ?? to, to);
      if (!best || distance(corner, found) < distance(...best)) best = [corner, found];
    });
  }
  return best;
}

/**
 * The pair of points at which two polygons that do not cross come nearest, the first polygon's point first: one of
 * them is a corner. Null for polygons without corners.
 */
export function closestPoints(a: readonly Point[], b: readonly Point[]): [Point, Point] | null {
  const [fromA, fromB] = [fromCorners(a, b), fromCorners(b, a)];
  if (!fromA || !fromB) return null;
  return distance(...fromA) <= distance(...fromB) ? fromA : [fromB[1], fromB[0]];
}
