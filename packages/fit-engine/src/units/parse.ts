import { parseNumber } from './parse-number.js';
import { kgPerLb, kgPerStone, kPaPerBar, kPaPerPsi, mmPerIn } from './factors.js';

export { parseNumber };

type Units = Readonly<Record<string, number>>;

function parseWithUnit(text: string, units: Units, fallback: string): number | null {
  const match = /^(.*?[\d¼½¾⅛⅜⅝⅞])\s*([a-z"”″]*)\.?$/i.exec(text.trim());
  const name = (match?.[2] || fallback).toLowerCase();
  const factor = Object.hasOwn(units, name) ? units[name] : undefined;
  const value = match?.[1] === undefined ? null : parseNumber(match[1]);
  return value === null || factor === undefined || !Number.isFinite(value * factor) ? null : value * factor;
}

/** mm from "209.6", "7.875 in", `7 7/8"`, "20,5 cm". @param unit what a bare number means */
export const parseLengthMm = (text: string, unit: 'mm' | 'in' = 'mm'): number | null =>
  parseWithUnit(
    text,
    { mm: 1, cm: 10, in: mmPerIn, inch: mmPerIn, inches: mmPerIn, '"': mmPerIn, '”': mmPerIn, '″': mmPerIn },
    unit,
  );

/** kg from "80", "176 lb", "12 st", "11 st 6", "11st 6lb". @param unit what a bare number means */
export function parseMassKg(text: string, unit: 'kg' | 'lb' | 'st' = 'kg'): number | null {
  const stones = /^(\d{1,3})\s*st(?:ones?)?\.?[\s,]*(\d{1,2}(?:[.,]\d{1,6})?)\s*(?:lbs?)?\.?$/i.exec(
    text.trim(),
  );
  if (stones) {
    const pounds = Number(stones[2]?.replace(',', '.'));
    // Fourteen pounds are a stone: "11 st 16" is a slip, not twelve stone two.
    return pounds < 14 ? Number(stones[1]) * kgPerStone + pounds * kgPerLb : null;
  }
  return parseWithUnit(
    text,
    {
      kg: 1,
      kgs: 1,
      g: 0.001,
      lb: kgPerLb,
      lbs: kgPerLb,
      st: kgPerStone,
      stone: kgPerStone,
      stones: kgPerStone,
    },
    unit,
  );
}

/** kPa from "12.1 bar", "220psi", "830 kPa". @param unit what a bare number means */
export const parsePressureKPa = (text: string, unit: 'psi' | 'bar' = 'psi'): number | null =>
  parseWithUnit(text, { psi: kPaPerPsi, bar: kPaPerBar, kpa: 1 }, unit);
