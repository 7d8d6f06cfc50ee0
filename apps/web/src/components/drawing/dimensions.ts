import { formatFigure } from '../../lib/format-figure';
import { layoutShock } from './layout';
import { placeReservoir } from './parts/reservoir';
import { boxAround, type Box } from './shapes';
import { shockShapes } from './shock-shapes';
import type { ShockFigure } from './shock-figure';

export const dimensionKeys = [
  'eye-to-eye',
  'stroke',
  'diameter',
  'body-bore',
  'shaft-bore',
  'reservoir-length',
  'reservoir-diameter',
] as const;
export type DimensionKey = (typeof dimensionKeys)[number];

/** A dimension line with all that ISO 129 draws around it, mm. Its ends lie exactly its datum apart. */
export interface Dimension<K extends string = string> {
  key: K;
  mm: number;
  text: string;
  x1: number;
  y1: number;
  x2: number;
  y2: number;
  /** Extension lines. */
  extensions: readonly Box[];
  /** Where the figure stands, upright: its middle and foot, or its left edge for lines that stand. */
  textX: number;
  textY: number;
  anchor: 'start' | 'middle' | 'end';
}

/** Between outline and dimension line: room for the figure above it on the smallest screen, where 1 mm is 1 px. */
export const laneMm = 24;
const beyond = 3;
const gap = 1.5;

/** A lying dimension at height `y`, its extension lines from `from1` and `from2`. */
export function lying<K extends string>(
  key: K,
  x1: number,
  x2: number,
  y: number,
  from: readonly [number, number],
  text: string,
): Dimension<K> {
  const away = (start: number): Box => {
    const direction = Math.sign(y - start) || 1;
    return { x1: 0, x2: 0, y1: start + direction * gap, y2: y + direction * beyond };
  };
  const [one, other] = [away(from[0]), away(from[1])];
  return {
    key,
    mm: x2 - x1,
    text,
    x1,
    x2,
    y1: y,
    y2: y,
    extensions: [
      { ...one, x1, x2: x1 },
      { ...other, x1: x2, x2 },
    ],
    textX: (x1 + x2) / 2,
    textY: y - 2.5,
    anchor: 'middle',
  };
}

/** A standing dimension at `x` with its figure upright to the right of it. */
export function standing<K extends string>(
  key: K,
  x: number,
  y1: number,
  y2: number,
  text: string,
): Dimension<K> {
  return {
    key,
    mm: y2 - y1,
    text,
    x1: x,
    x2: x,
    y1,
    y2,
    extensions: [],
    textX: x + 3,
    textY: (y1 + y2) / 2 - 4,
    anchor: 'start',
  };
}

/** Across a bore, its figure beside the eye, away from the shock. */
function bore<K extends string>(key: K, x: number, mm: number, eyeR: number, side: 1 | -1): Dimension<K> {
  return {
    ...lying(key, x - mm / 2, x + mm / 2, 0, [0, 0], `⌀ ${formatFigure(mm)}`),
    extensions: [],
    textX: x + side * (eyeR + 3),
    textY: -5,
    anchor: side === 1 ? 'start' : 'end',
  };
}

const boreOf = (mount: ShockFigure['bodyEnd']): number | null =>
  mount.kind === 'eyelet' ? mount.boreMm : mount.kind === 'bearing-eye' ? mount.boltMm : null;

/**
 * The dimensions asked for, those of them that are known, each at its own place beside the shock.
 * With `compressedMm` the distance of the eyes is the present one.
 */
export function shockDimensions(
  figure: ShockFigure,
  keys: readonly DimensionKey[],
  compressedMm = 0,
): Dimension<DimensionKey>[] {
  const layout = layoutShock(figure);
  const box = boxAround(shockShapes(figure).map((shape) => shape.box));
  const end = figure.eyeToEyeMm - compressedMm;
  const make: Record<DimensionKey, () => Dimension<DimensionKey> | null> = {
    'eye-to-eye': () =>
      lying('eye-to-eye', 0, end, box.y2 + laneMm, [layout.bodyEyeR, layout.shaftEyeR], formatFigure(end, 1)),
    stroke: () => {
      if (figure.strokeMm === null) return null;
      const top = Math.max(layout.shaftEyeR, layout.coil ? layout.coil.outerR + 1 : 12);
      const at = figure.eyeToEyeMm;
      const y = -top - 12;
      return lying(
        'stroke',
        at - figure.strokeMm,
        at,
        y,
        [-12, -layout.shaftEyeR],
        formatFigure(figure.strokeMm),
      );
    },
    diameter: () => {
      if (figure.diameterMm === null) return null;
      const r = figure.diameterMm / 2;
      const x = layout.coil ? layout.bodyEnd : layout.bodyStart + (layout.bodyEnd - layout.bodyStart) * 0.42;
      return standing('diameter', x, -r, r, `⌀ ${formatFigure(figure.diameterMm)}`);
    },
    'body-bore': () => {
      const mm = boreOf(figure.bodyEnd);
      return mm === null ? null : bore('body-bore', 0, mm, layout.bodyEyeR, -1);
    },
    'shaft-bore': () => {
      const mm = boreOf(figure.shaftEnd);
      return mm === null ? null : bore('shaft-bore', end, mm, layout.shaftEyeR, 1);
    },
    'reservoir-length': () => {
      if (!figure.reservoir) return null;
      const { x1, x2, cy, r } = placeReservoir(layout, figure.reservoir);
      return lying('reservoir-length', x1, x2, cy - r - 12, [cy - r, cy - r], formatFigure(x2 - x1));
    },
    'reservoir-diameter': () => {
      if (!figure.reservoir) return null;
      const { x1, cy, r } = placeReservoir(layout, figure.reservoir);
      return standing('reservoir-diameter', x1 + 16, cy - r, cy + r, `⌀ ${formatFigure(2 * r)}`);
    },
  };
  return keys.flatMap((key) => make[key]() ?? []);
}
