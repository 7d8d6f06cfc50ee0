import { hatchedRectangle } from '../hatching';
import { line, rectangle } from '../primitives';
import type { Shape } from '../shapes';

/** Cut metal between two x and two distances from the bolt's axis, drawn above and below it. */
export function cutSleeve(
  part: string,
  x1: number,
  x2: number,
  inner: number,
  outer: number,
  lean: 1 | -1,
): Shape[] {
  if (x2 - x1 < 0.2 || outer - inner < 0.2) return [];
  const spacing = outer - inner < 4 ? 1.7 : 2.4;
  return [
    // The edges that are seen through the hole.
    rectangle(part, x1, -inner, x2, inner, 0),
    rectangle(part, x1, -outer, x2, -inner, 0.3),
    hatchedRectangle(part, [x1, -outer, x2, -inner], lean, spacing),
    rectangle(part, x1, inner, x2, outer, 0.3),
    hatchedRectangle(part, [x1, inner, x2, outer], lean, spacing),
  ];
}

const threadLines = (part: string, x1: number, x2: number, r: number): Shape[] => [
  line(part, x1, -r * 0.82, x2, -r * 0.82),
  line(part, x1, r * 0.82, x2, r * 0.82),
];

/** A hexagon head seen from the side: its middle face between two edges. */
export function hexagon(part: string, x1: number, x2: number, r: number): Shape[] {
  return [
    rectangle(part, x1, -r, x2, r, 1),
    line(part, x1, -r * 0.5, x2, -r * 0.5),
    line(part, x1, r * 0.5, x2, r * 0.5),
  ];
}

/** A bolt with its head to the left, never hatched (ISO 128-50), threaded at its far end. */
export function bolt(part: string, headX: number, tipX: number, r: number): Shape[] {
  const head = Math.max(4, r * 1.1);
  return [
    ...hexagon(part, headX - head, headX, r * 1.75),
    rectangle(part, headX, -r, tipX, r, 0.8),
    ...threadLines(part, tipX - Math.max(7, r * 2), tipX, r),
  ];
}

export { threadLines };
