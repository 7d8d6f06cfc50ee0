import type { Figure } from '../answers.js';
import { kPaPerBar, kPaPerPsi } from '../units/factors.js';
import { valueWords } from './labels.en.js';

/** A figure with its unit and sensible digits. */
export function figureText({ value, unit }: Figure): string {
  if (value === null) return 'not known';
  if (typeof value === 'number' && !Number.isFinite(value)) return 'not known';
  if (typeof value === 'string') return (valueWords[value] ?? value) + (unit ? ` ${unit}` : '');
  switch (unit) {
    case 'kPa':
      return `${(value / kPaPerBar).toFixed(1)} bar (${Math.round(value / kPaPerPsi)} psi)`;
    case '%':
      return `${value.toFixed(1)} %`;
    case 'lb/in':
      return `${Math.round(value)} lb/in`;
    case 'mm':
    case 'kg':
      return `${Number(value.toFixed(1))} ${unit}`;
    case 'N/mm':
      return `${Number(value.toFixed(1))} N/mm`;
    case 'psi':
    case 'm':
    case 'deg':
    case 'g':
    case 'h':
      return `${Math.round(value)} ${unit}`;
    case null:
      return String(Number(value.toFixed(2)));
  }
}
