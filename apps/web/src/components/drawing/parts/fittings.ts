import type { ShockLayout } from '../layout';
import { capsule, circle, line, rectangle } from '../primitives';
import { compose, point, type Shape } from '../shapes';

/** The air valve with its cap, on the can's own cap; it looks away from the reservoir. */
export function valve({ bodyStart, bodyR }: ShockLayout, side: 1 | -1): Shape[] {
  const x = bodyStart + 9;
  const y = (mm: number): number => side * (bodyR * 0.92 + mm);
  const bar = (half: number, from: number, to: number, radius: number): Shape =>
    rectangle('valve', x - half, Math.min(y(from), y(to)), x + half, Math.max(y(from), y(to)), radius);
  return [
    bar(3.2, -1, 7, 0.4),
    bar(5, -1, 2.4, 0.6),
    bar(4, 5, 13, 1.6),
    ...[-1.8, 0, 1.8].map((at) => line('valve', x + at, y(6.4), x + at, y(11.6))),
  ];
}

/** Firms the shock by hand: a short lever on its boss. */
function handLever(x: number, y: number): Shape[] {
  return [
    capsule('lever', [x, y], [x + 15, y + 3.5], 5.5),
    circle('lever', x, y, 4.6),
    circle('lever', x, y, 1.7),
  ];
}

/** Firms the shock from the bar: a drum with its cable and the cable's stop. */
function cableDrum(x: number, y: number): Shape[] {
  const cable = (offset: number): Shape => {
    const d = `M${point(x - 8, y + 5 + offset)}C${point(x - 22, y + 8 + offset)} ${point(x - 30, y + 14 + offset)} ${point(x - 44, y + 13 + offset)}`;
    return compose('cable', d, { x1: x - 44, y1: y, x2: x, y2: y + 15 }, { width: 'narrow', fill: 'none' });
  };
  return [
    cable(-1.1),
    cable(1.1),
    rectangle('drum', x - 14, y + 2.4, x - 6, y + 8.4, 1),
    circle('drum', x, y, 8),
    circle('drum', x, y, 5.6, { width: 'narrow' }),
    circle('drum', x, y, 1.7),
  ];
}

export function lockout({ bodyStart, bodyR }: ShockLayout, remote: boolean): Shape[] {
  const [x, y] = [bodyStart + 11, bodyR * 0.4];
  return remote ? cableDrum(x, y) : handLever(x, y);
}
