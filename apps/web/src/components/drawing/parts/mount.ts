import { hatchedRing } from '../hatching';
import { mountRadius } from '../layout';
import { circle, rectangle } from '../primitives';
import { compose, n, point, type Shape } from '../shapes';
import type { MountFigure } from '../shock-figure';

/** An eye cut through: a hatched ring about its empty bore. */
function eyelet(part: string, x: number, boreMm: number, outerR: number): Shape[] {
  return [
    circle(part, x, 0, outerR),
    hatchedRing(part, x, 0, boreMm / 2, outerR),
    circle(`${part}-bore`, x, 0, boreMm / 2),
  ];
}

/** An eye with its own bearing: outer race, balls, inner race, bolt hole. */
function bearingEye(part: string, x: number, boltMm: number, widthMm: number, outerR: number): Shape[] {
  const inner = boltMm / 2 + 2.2;
  const outer = outerR - 2.4;
  const ballR = (outer - inner) / 2.6;
  const track = (outer + inner) / 2;
  // Wide bearings carry two rows of balls: seen from the side, more of them.
  const balls = widthMm > 24 ? 12 : 9;
  const ring = Array.from({ length: balls }, (_, index) => {
    const turn = (2 * Math.PI * index) / balls;
    return circle(`${part}-ball`, x + track * Math.cos(turn), track * Math.sin(turn), ballR, {
      width: 'narrow',
    });
  });
  return [
    circle(part, x, 0, outerR),
    circle(`${part}-race`, x, 0, outer, { width: 'narrow' }),
    ...ring,
    circle(`${part}-race`, x, 0, inner, { width: 'narrow' }),
    circle(`${part}-bore`, x, 0, boltMm / 2),
  ];
}

/** A threaded hole in a block: a wide circle for the core, three quarters of a narrow one for the thread (ISO 6410). */
function trunnion(part: string, x: number, side: 1 | -1): Shape[] {
  const thread = 5;
  const arc = `M${point(x + thread, 0)}A${n(thread)} ${n(thread)} 0 1 1 ${point(x, -thread)}`;
  const box = { x1: x - thread, y1: -thread, x2: x + thread, y2: thread };
  return [
    rectangle(
      part,
      Math.min(x - 11 * side, x + 19 * side),
      -16,
      Math.max(x - 11 * side, x + 19 * side),
      16,
      4,
    ),
    circle(part, x, 0, 9, { width: 'narrow', fill: 'none' }),
    circle(`${part}-bore`, x, 0, 4.2),
    compose(`${part}-thread`, arc, box, { width: 'narrow', fill: 'none' }),
  ];
}

/** One end of a shock, seen along its bolt. `side` is 1 where the shock goes on to the right. */
export function mountShapes(part: string, mount: MountFigure, x: number, side: 1 | -1): Shape[] {
  const outerR = mountRadius(mount);
  if (mount.kind === 'eyelet') return eyelet(part, x, mount.boreMm, outerR);
  if (mount.kind === 'bearing-eye') return bearingEye(part, x, mount.boltMm, mount.widthMm, outerR);
  return trunnion(part, x, side);
}
