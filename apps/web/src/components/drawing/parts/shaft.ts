import type { ShockLayout } from '../layout';
import { line, rectangle, turned } from '../primitives';
import type { Shape } from '../shapes';

/** The free shaft between the body and the head, shortened by what is compressed. */
export function shaft({ bodyEnd, headStart, shaftR }: ShockLayout, compressedMm: number): Shape[] {
  const tip = headStart - compressedMm + 1;
  return tip - bodyEnd < 0.5 ? [] : [rectangle('shaft', bodyEnd - 1, -shaftR, tip, shaftR, 0)];
}

/** The rubber ring that the can pushes along: it stays where the last ride left it. */
export function travelRing(layout: ShockLayout, usedMm: number, compressedMm: number): Shape[] {
  const x = layout.bodyEnd + Math.max(0, Math.min(usedMm, layout.strokeMm) - compressedMm);
  return [rectangle('ring', x, -layout.shaftR - 1.6, x + 2.4, layout.shaftR + 1.6, 1, { fill: 'metal' })];
}

/** Bumper and head: what the eye is screwed to. `x` is where the head begins now. */
export function shaftHead(layout: ShockLayout, x: number, eyeX: number): Shape[] {
  const end = eyeX - layout.shaftEyeR * 0.72;
  return [
    turned('bumper', [
      [x - 4, 8],
      [x, 9.5],
    ]),
    turned('head', [
      [x, 11.5],
      [end - 2, 11.5],
      [end, 9],
    ]),
    line('head', x, -4.5, end, -4.5),
    line('head', x, 4.5, end, 4.5),
  ];
}
