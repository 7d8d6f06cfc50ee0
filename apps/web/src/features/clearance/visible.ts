import type { Box } from '../../components/drawing/shapes';

type Point = readonly [number, number];

/** Cuts a polygon at one side of a box (Sutherland and Hodgman). @param over how far a point lies inside */
function cut(polygon: readonly Point[], over: (point: Point) => number): Point[] {
  return polygon.flatMap((to, i) => {
    const from = polygon.at(i - 1) ?? to;
    const [a, b] = [over(from), over(to)];
    const t = a / (a - b);
    const edge: Point[] =
      a >= 0 === b >= 0 ? [] : [[from[0] + t * (to[0] - from[0]), from[1] + t * (to[1] - from[1])]];
    return b >= 0 ? [...edge, to] : edge;
  });
}

/** The part of a polygon that is seen in a box; empty where none is. */
export const seenIn = (polygon: readonly Point[], { x1, y1, x2, y2 }: Box): Point[] =>
  [([x]: Point) => x - x1, ([x]: Point) => x2 - x, ([, y]: Point) => y - y1, ([, y]: Point) => y2 - y].reduce<
    Point[]
  >((left, over) => cut(left, over), [...polygon]);

/** The middle of a polygon's extent. */
export function middleOf(polygon: readonly Point[]): Point {
  const [xs, ys] = [polygon.map(([x]) => x), polygon.map(([, y]) => y)];
  return [(Math.min(...xs) + Math.max(...xs)) / 2, (Math.min(...ys) + Math.max(...ys)) / 2];
}
