/**
 * What a drawing is made of. Everything is in millimetres, x to the right along the shock's axis from the body-side
 * bolt, y downwards. Lines follow ISO 128: wide for outlines that are seen, narrow for all else.
 */
export type LineWidth = 'wide' | 'narrow';
/** Full; chain (long dash, dot) for centres; hidden (dashes); phantom (long dash, two dots) for another position. */
export type LineKind = 'full' | 'chain' | 'hidden' | 'phantom';
export type Fill = 'none' | 'paper' | 'metal' | 'shade';

export interface Box {
  x1: number;
  y1: number;
  x2: number;
  y2: number;
}

export interface Shape {
  /** Which part of the thing it belongs to, for the reader of the SVG and for tests. */
  part: string;
  /** SVG path data. */
  d: string;
  width: LineWidth;
  line: LineKind;
  fill: Fill;
  box: Box;
}

/** A figure for path data: a hundredth of a millimetre is finer than any screen. */
export const n = (value: number): string => String(Math.round(value * 100) / 100);

export const point = (x: number, y: number): string => `${n(x)} ${n(y)}`;

export const boxAround = (boxes: readonly Box[]): Box => ({
  x1: Math.min(...boxes.map((box) => box.x1)),
  y1: Math.min(...boxes.map((box) => box.y1)),
  x2: Math.max(...boxes.map((box) => box.x2)),
  y2: Math.max(...boxes.map((box) => box.y2)),
});

/** A shape in our usual style, a wide full line filled with paper, but for what is said otherwise. */
export const compose = (
  part: string,
  d: string,
  box: Box,
  style: Partial<Pick<Shape, 'width' | 'line' | 'fill'>> = {},
): Shape => ({ part, d, box, width: 'wide', line: 'full', fill: 'paper', ...style });
