import { compose, point, type Shape } from './shapes';

const step = 2.6;
const root = Math.SQRT1_2;

/** From and to along a line at 45 degrees, in its own coordinate. */
type Span = readonly [number, number];

function strokes(part: string, d: string, x1: number, y1: number, x2: number, y2: number): Shape {
  return compose(part, d, { x1, y1, x2, y2 }, { width: 'narrow', fill: 'none' });
}

/** Cut metal between two circles: lines at 45 degrees (ISO 128-50), clipped to the ring. */
export function hatchedRing(part: string, cx: number, cy: number, inner: number, outer: number): Shape {
  let d = '';
  for (let offset = -outer + step / 2; offset < outer; offset += step) {
    const far = Math.sqrt(Math.max(0, outer * outer - offset * offset));
    const near = Math.sqrt(Math.max(0, inner * inner - offset * offset));
    const spans: Span[] =
      near > 0
        ? [
            [-far, -near],
            [near, far],
          ]
        : [[-far, far]];
    for (const [from, to] of spans) {
      if (to - from < 0.4) continue;
      const place = (along: number) => point(cx + root * (along + offset), cy - root * (along - offset));
      d += `M${place(from)}L${place(to)}`;
    }
  }
  return strokes(part, d, cx - outer, cy - outer, cx + outer, cy + outer);
}

/** Cut metal in a rectangle; neighbours lean the other way (`lean` -1) so that two parts are told apart. */
export function hatchedRectangle(
  part: string,
  [x1, y1, x2, y2]: readonly [number, number, number, number],
  lean: 1 | -1 = 1,
  spacing = step,
): Shape {
  let d = '';
  const height = y2 - y1;
  for (let foot = x1 - height + spacing / 2; foot < x2; foot += spacing) {
    // The line rises from (foot, y2) to (foot + height, y1); leaning -1 mirrors it.
    const from = Math.max(0, x1 - foot);
    const to = Math.min(height, x2 - foot);
    if (to - from < 0.4) continue;
    const place = (along: number) => {
      const x = foot + along;
      return point(lean === 1 ? x : x1 + x2 - x, y2 - along);
    };
    d += `M${place(from)}L${place(to)}`;
  }
  return strokes(part, d, x1, y1, x2, y2);
}
