import { bolt, cutSleeve, hexagon } from './parts/section';
import { line } from './primitives';
import type { Shape } from './shapes';

/** A kit as it is sold, mm: `width × bolt`, for an eye of the given bore. */
export interface HardwareFigure {
  widthMm: number;
  boltMm: number;
  boreMm: number;
}

const bushBoreMm = 12.7;
const gapMm = 7;
const eyeWidthMm = 14;

/** A kit taken apart along its bolt, every part cut, in the order in which it goes together. */
export function hardwareShapes({ widthMm, boltMm, boreMm }: HardwareFigure): Shape[] {
  const [boltR, boreR] = [boltMm / 2, boreMm / 2];
  const bushR = Math.min(bushBoreMm / 2, boreR - 0.8);
  const sleeveR = Math.max(boltR + 0.8, bushR);
  const spacer = Math.max(2, (widthMm - eyeWidthMm) / 2);
  const shapes: Shape[] = [];
  let x = 0;
  const place = (length: number, draw: (from: number, to: number) => Shape[]) => {
    shapes.push(...draw(x, x + length));
    x += length + gapMm;
  };
  place(widthMm + 14, (from, to) => bolt('bolt', from, to, boltR));
  place(spacer, (from, to) => cutSleeve('spacer', from, to, sleeveR, boreR + 2, -1));
  place(eyeWidthMm, (from, to) => cutSleeve('bush', from, to, bushR, boreR, -1));
  place(eyeWidthMm, (from, to) => cutSleeve('eye', from, to, boreR, boreR + 5.5, 1));
  place(widthMm, (from, to) => cutSleeve('sleeve', from, to, boltR, sleeveR, 1));
  place(spacer, (from, to) => cutSleeve('spacer', from, to, sleeveR, boreR + 2, -1));
  place(5.5, (from, to) => hexagon('nut', from, to, boltR * 1.75));
  return [...shapes, line('centre', -12, 0, x + 2, 0, { line: 'chain' })];
}
