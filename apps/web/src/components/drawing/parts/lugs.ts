import { hatchedRectangle } from '../hatching';
import { line, outline, rectangle } from '../primitives';
import { compose, point, type Shape } from '../shapes';

export const lugMm = 6.5;
const topY = -42;

/** A free-hand end: the frame goes on, the drawing does not. */
function breakLine(x1: number, x2: number, y: number): Shape {
  const third = (x2 - x1) / 3;
  const d = `M${point(x1, y)}Q${point(x1 + third / 2, y - 2.4)} ${point(x1 + third, y)}T${point(x1 + 2 * third, y)}T${point(x2, y)}`;
  return compose('lug', d, { x1, y1: y - 2, x2, y2: y + 2 }, { width: 'narrow', fill: 'none' });
}

function lug(x1: number, x2: number, foot: number, top: number): Shape[] {
  return [
    rectangle('lug', x1, top, x2, foot, 1.2),
    hatchedRectangle('lug', [x1, top + 0.5, x2, foot - 0.5], 1, 3.2),
  ];
}

/** The frame's two cheeks either side of the eye, cut; straight from the frame, or as the fork of a yoke. */
export function lugs(halfWidth: number, foot: number, yoke: boolean): Shape[] {
  const outer = halfWidth + lugMm;
  if (!yoke) {
    return [
      ...lug(-outer, -halfWidth, foot, topY),
      ...lug(halfWidth, outer, foot, topY),
      breakLine(-outer - 1.5, -halfWidth + 1.5, topY),
      breakLine(halfWidth - 1.5, outer + 1.5, topY),
    ];
  }
  const bridgeY = topY + 12;
  return [
    ...lug(-outer, -halfWidth, foot, bridgeY),
    ...lug(halfWidth, outer, foot, bridgeY),
    outline(
      'yoke',
      [
        [-outer, bridgeY],
        [-outer, bridgeY - 4],
        [-9, topY],
        [-7, topY - 16],
        [7, topY - 16],
        [9, topY],
        [outer, bridgeY - 4],
        [outer, bridgeY],
      ],
      3,
    ),
    line('yoke', -7.5, topY - 9, 7.5, topY - 9),
    breakLine(-9, 9, topY - 16),
  ];
}
