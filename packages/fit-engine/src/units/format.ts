import { kgPerLb, kPaPerBar, kPaPerPsi, mmPerIn } from './factors.js';

/** A number with at most so many decimals, without trailing zeros; "not known" for what is no number. */
export const plainNumber = (value: number, decimals: number): string =>
  Number.isFinite(value) ? String(Number(value.toFixed(decimals))) : 'not known';

const withUnit = (value: number, decimals: number, unit: string): string =>
  Number.isFinite(value) ? `${plainNumber(value, decimals)} ${unit}` : 'not known';

/** Tenths of a millimetre, or thousandths of an inch: what a caliper shows. */
export const formatLength = (mm: number, unit: 'mm' | 'in' = 'mm'): string =>
  unit === 'mm' ? withUnit(mm, 1, 'mm') : withUnit(mm / mmPerIn, 3, 'in');

/** "80 kg", "176 lb", "11 st 6 lb". */
export function formatMass(kg: number, unit: 'kg' | 'lb' | 'st' = 'kg'): string {
  if (unit === 'kg') return withUnit(kg, 1, 'kg');
  if (unit === 'lb' || !Number.isFinite(kg)) return withUnit(kg / kgPerLb, 0, 'lb');
  const pounds = Math.round(kg / kgPerLb);
  return `${Math.floor(pounds / 14)} st ${pounds % 14} lb`;
}

/** Tenths of a bar or whole psi: what a shock pump shows. */
export const formatPressure = (kPa: number, unit: 'bar' | 'psi' = 'psi'): string =>
  unit === 'bar' ? withUnit(kPa / kPaPerBar, 1, 'bar') : withUnit(kPa / kPaPerPsi, 0, 'psi');
