import { kgPerLb, kgPerStone, kPaPerBar, kPaPerPsi, mmPerIn } from './factors.js';

/** A plain number with a dot or a decimal comma, a fraction ("7/8") or a mixed number ("7 7/8"); null for anything else. */
export function parseNumber(text: string): number | null {
  const clean = text.trim().replace(',', '.');
  const mixed = /^(?:(\d+)[\s-]+)?(\d+)\/(\d+)$/.exec(clean);
  if (mixed) {
    const denominator = Number(mixed[3]);
    return denominator === 0 ? null : Number(mixed[1] ?? 0) + Number(mixed[2]) / denominator;
  }
  return /^\d+(\.\d+)?$|^\.\d+$/.test(clean) ? Number(clean) : null;
}

type Units = Readonly<Record<string, number>>;

function parseWithUnit(text: string, units: Units, fallback: string): number | null {
  const match = /^(.*?\d)\s*([a-z"”″′']*)$/i.exec(text.trim());
  const factor = units[(match?.[2] || fallback).toLowerCase()];
  const value = match?.[1] === undefined ? null : parseNumber(match[1]);
  return value === null || factor === undefined ? null : value * factor;
}

/** mm from "209.6", "7.875 in", `7 7/8"`, "20,5 cm". @param unit what a bare number means */
export const parseLengthMm = (text: string, unit: 'mm' | 'in' = 'mm'): number | null =>
  parseWithUnit(
    text,
    { mm: 1, cm: 10, in: mmPerIn, inch: mmPerIn, '"': mmPerIn, '”': mmPerIn, '″': mmPerIn },
    unit,
  );

/** kg from "80", "176 lb", "12 st", "11 st 6", "11st 6lb". @param unit what a bare number means */
export function parseMassKg(text: string, unit: 'kg' | 'lb' | 'st' = 'kg'): number | null {
  const stones = /^(\d+)\s*st(?:one)?\s*(\d+(?:[.,]\d+)?)\s*(?:lbs?)?$/i.exec(text.trim());
  if (stones) return Number(stones[1]) * kgPerStone + Number(stones[2]?.replace(',', '.')) * kgPerLb;
  return parseWithUnit(text, { kg: 1, lb: kgPerLb, lbs: kgPerLb, st: kgPerStone, stone: kgPerStone }, unit);
}

/** kPa from "12.1 bar", "220psi", "830 kPa". @param unit what a bare number means */
export const parsePressureKPa = (text: string, unit: 'psi' | 'bar' = 'psi'): number | null =>
  parseWithUnit(text, { psi: kPaPerPsi, bar: kPaPerBar, kpa: 1 }, unit);
