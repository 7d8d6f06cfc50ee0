import { boltOf, eyeRadius, eyeWidth, widthOf, type FrameMountFigure } from './mount-figure';
import { lugMm, lugs } from './parts/lugs';
import { bolt, cutSleeve, hexagon, threadLines } from './parts/section';
import { circle, line, rectangle } from './primitives';
import { compose, point, type Shape } from './shapes';

/** The plain bush that most kits use has this bore. */
const bushBoreMm = 12.7;

/** The shock's neck going down out of the picture. */
function neck(halfWidth: number, from: number): Shape[] {
  const [half, end] = [halfWidth * 0.8, from + 12];
  const d = `M${point(-half - 1, end)}Q${point(-half / 2, end - 3)} ${point(0, end)}T${point(half + 1, end)}`;
  return [
    rectangle('neck', -half, from - 1, half, end, 0),
    compose('neck', d, { x1: -half, y1: end - 2, x2: half, y2: end + 2 }, { width: 'narrow', fill: 'none' }),
  ];
}

/** Bush in the eye, sleeve through it, a spacer to each cheek. */
export function hardwareParts(widthMm: number, boltMm: number, boreMm: number, eyeHalf: number): Shape[] {
  const half = widthMm / 2;
  const bushR = Math.min(bushBoreMm / 2, boreMm / 2 - 0.8);
  const boltR = boltMm / 2;
  const sleeveR = Math.max(boltR + 0.8, bushR);
  return [
    ...cutSleeve('bush', -eyeHalf, eyeHalf, bushR, boreMm / 2, -1),
    ...cutSleeve('sleeve', -half, half, boltR, sleeveR, 1),
    ...cutSleeve('spacer', -half, -eyeHalf - 0.4, sleeveR, boreMm / 2 + 2, -1),
    ...cutSleeve('spacer', eyeHalf + 0.4, half, sleeveR, boreMm / 2 + 2, -1),
  ];
}

function bearing(figure: Extract<FrameMountFigure, { kind: 'bearing-bolt' }>, eyeHalf: number): Shape[] {
  const boltR = figure.boltMm / 2;
  const [inner, outer] = [boltR + 2.6, eyeRadius(figure) - 2.6];
  const ball = (outer - inner) / 2;
  const mid = (outer + inner) / 2;
  return [
    ...cutSleeve('race', -eyeHalf, eyeHalf, outer - 0.8, outer + 1.4, -1),
    ...cutSleeve('race', -figure.widthMm / 2, figure.widthMm / 2, boltR, inner, -1),
    ...[-1, 1].flatMap((side) => [-0.45, 0.45].map((at) => circle('ball', eyeHalf * at, side * mid, ball))),
  ];
}

/** Everything between the cheeks, and what holds it there. */
function held(figure: FrameMountFigure): Shape[] {
  const half = widthOf(figure) / 2;
  const r = boltOf(figure) / 2;
  const eyeHalf = eyeWidth(figure) / 2;
  const eye = (bore: number): Shape[] => [
    ...neck(eyeHalf, eyeRadius(figure)),
    ...cutSleeve('eye', -eyeHalf, eyeHalf, bore, eyeRadius(figure), 1),
  ];
  const through = [
    ...bolt('bolt', -half - lugMm, half + lugMm + 8, r),
    ...hexagon('nut', half + lugMm, half + lugMm + 5.5, r * 1.75),
  ];
  switch (figure.kind) {
    case 'hardware': {
      const bore = figure.boreMm ?? 15;
      return [...eye(bore / 2), ...hardwareParts(figure.widthMm, figure.boltMm, bore, eyeHalf), ...through];
    }
    case 'bearing-bolt':
      return [...eye(eyeRadius(figure) - 1.2), ...bearing(figure, eyeHalf), ...through];
    case 'pin':
      return [
        ...eye(r),
        rectangle('pin', -half, -r, half, r, 1),
        ...[-1, 1].flatMap((side) =>
          hexagon('pin-bolt', side * (half + lugMm), side * (half + lugMm + 4), r * 0.9),
        ),
        line('pin', -half + 6, -r * 0.4, -half, -r * 0.4, { line: 'hidden' }),
        line('pin', half - 6, -r * 0.4, half, -r * 0.4, { line: 'hidden' }),
      ];
    case 'trunnion':
      return [
        ...neck(half - 8, 15),
        rectangle('block', -half + 0.6, -15, half - 0.6, 15, 3),
        ...[-1, 1].flatMap((side) => [
          rectangle('bolt', side * (half - 15), -r, side * (half + lugMm), r, 0.6),
          ...hexagon('bolt', side * (half + lugMm), side * (half + lugMm + 5), r * 1.7),
          ...threadLines('bolt', side * (half - 15), side * (half - 2), r),
        ]),
      ];
  }
}

/** A frame-side mount with the shock's eye in it, cut along the bolt: the bolt lies, the frame is above. */
export function mountSectionShapes(figure: FrameMountFigure): Shape[] {
  const half = widthOf(figure) / 2;
  const reach = half + lugMm + 16;
  return [
    ...lugs(half, eyeRadius(figure) - 1, figure.yoke ?? false),
    ...held(figure),
    line('centre', -reach, 0, reach, 0, { line: 'chain' }),
    line('centre', 0, -eyeRadius(figure) - 6, 0, eyeRadius(figure) + 16, { line: 'chain' }),
  ];
}
