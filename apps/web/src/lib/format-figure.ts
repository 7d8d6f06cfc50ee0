/** "52.5" from 52.5, "55" from 55.00, "1,204" from 1204: at most `decimals` places, no trailing noughts. */
export const formatFigure = (value: number, decimals = 2): string =>
  new Intl.NumberFormat('en-GB', { maximumFractionDigits: decimals }).format(value).replace(/^-/, '−');

const units = {
  mm: 'mm',
  in: 'in',
  kg: 'kg',
  lb: 'lb',
  g: 'g',
  psi: 'psi',
  bar: 'bar',
  km: 'km',
  min: 'min',
  percent: '%',
  'lb/in': 'lb/in',
  'N/mm': 'N/mm',
} as const;
export type FigureUnit = keyof typeof units;

/** A figure with its unit, joined by a space that does not break: "52.5 mm". */
export const formatWithUnit = (value: number, unit: FigureUnit, decimals = 2): string =>
  `${formatFigure(value, decimals)}\u00a0${units[unit]}`;

/** A size as it is written in the trade, "230 × 60", with its half millimetres. */
export const formatSize = (eyeToEyeMm: number, strokeMm: number | null): string =>
  `${formatFigure(eyeToEyeMm)} × ${strokeMm === null ? '?' : formatFigure(strokeMm)}`;
