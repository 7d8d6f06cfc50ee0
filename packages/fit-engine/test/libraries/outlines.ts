import type { Point } from '../../src/facts.js';
import type { Random } from '../judging/seeded.js';

/** A simple polygon, often with deep notches: corners around a centre by angle, at very different distances. */
export function drawOutline(r: Random, size: number, centre: Point = [0, 0]): Point[] {
  const corners = 3 + Math.floor(r.between(0, 9));
  // Even sectors with a corner somewhere in the first four fifths of each: no gap of half a turn, no crossing.
  return Array.from({ length: corners }, (_, i): Point => {
    const angle = (2 * Math.PI * (i + r.between(0, 0.45))) / corners;
    const reach = size * r.between(0.15, 1);
    return [centre[0] + reach * Math.cos(angle), centre[1] + reach * Math.sin(angle)];
  });
}

/** Turned about the origin, then shifted. */
export const turned = (outline: readonly Point[], deg: number, x: number, y: number): Point[] => {
  const [c, s] = [Math.cos((deg * Math.PI) / 180), Math.sin((deg * Math.PI) / 180)];
  return outline.map(([px, py]): Point => [x + c * px - s * py, y + s * px + c * py]);
};
