import type { ShockLayout } from '../layout';
import { line, turned } from '../primitives';
import type { Shape } from '../shapes';

const narrowAcross = (part: string, x: number, r: number): Shape => line(part, x, -r, x, r);

/** The neck between the eye and the body; a trunnion needs none, its block is the neck. */
function neck({ bodyEyeR, bodyStart, bodyR }: ShockLayout, trunnion: boolean): Shape[] {
  if (trunnion) return [];
  const waist = Math.min(9, bodyR * 0.5);
  return [
    turned('neck', [
      [bodyEyeR * 0.72, waist],
      [bodyStart - 5, waist],
      [bodyStart, bodyR * 0.62],
      [bodyStart + 2, bodyR * 0.62],
    ]),
  ];
}

/** Cap, sleeve and seal head of an air can. */
export function airBody(layout: ShockLayout, trunnion: boolean): Shape[] {
  const { bodyStart: start, bodyEnd: end, bodyR: r } = layout;
  const cap = Math.min(15, (end - start) * 0.2);
  const seal = Math.min(13, (end - start) * 0.2);
  return [
    ...neck(layout, trunnion),
    turned('can', [
      [start, r * 0.62],
      [start + 5, r * 0.92],
      [start + cap, r * 0.92],
      [start + cap, r],
      [end - seal, r],
      [end - seal, r * 0.88],
      [end - 3, r * 0.88],
      [end, r * 0.66],
    ]),
    narrowAcross('can', start + 5, r * 0.92),
    line('can', start + cap, -r, start + cap, r, { width: 'wide' }),
    narrowAcross('can', start + cap + 4, r),
    narrowAcross('can', end - seal - 4, r),
    line('can', end - seal, -r * 0.94, end - seal, r * 0.94, { width: 'wide' }),
    narrowAcross('can', end - 3, r * 0.88),
  ];
}

/** The damper of a coil shock: a thinner body, threaded where the collar sits. */
export function coilBody(layout: ShockLayout, trunnion: boolean): Shape[] {
  const { bodyStart: start, bodyEnd: end, bodyR: r, coil } = layout;
  const threadEnd = Math.min(end - 8, (coil?.collarX ?? start) + 18);
  const threads: Shape[] = [];
  for (let x = start + 8; x < threadEnd; x += 2.4) threads.push(line('thread', x, -r, x + 1, r));
  return [
    ...neck(layout, trunnion),
    turned('damper', [
      [start, r * 0.7],
      [start + 4, r],
      [end - 3, r],
      [end, r * 0.72],
    ]),
    ...threads,
    narrowAcross('damper', end - 9, r),
  ];
}
