import { parseLengthMm, parseMassKg } from '@linkfell/fit-engine';
import type { FieldSpec, Raw } from './spec';

/** mm of a length field; undefined while it cannot be read. */
export const lengthOf = (raw: Raw, name: string): number | undefined =>
  parseLengthMm(raw[name] ?? '', raw[`${name}-unit`] === 'in' ? 'in' : 'mm') ?? undefined;

/** As above where "I don't know that one" is an answer: empty is null. */
export const lengthOrNull = (raw: Raw, name: string): number | null | undefined =>
  (raw[name] ?? '').trim() === '' ? null : lengthOf(raw, name);

export function massOf(raw: Raw, name: string): number | undefined {
  const unit = raw[`${name}-unit`];
  return parseMassKg(raw[name] ?? '', unit === 'lb' || unit === 'st' ? unit : 'kg') ?? undefined;
}

export const typedOf = (raw: Raw, name: string, fallback: 'mm' | 'kg') => ({
  text: raw[name] ?? '',
  unit: raw[`${name}-unit`] ?? fallback,
});

const round = (value: number): string => String(Number(value.toFixed(2)));

/** The form of a reading: as it was typed where we know, in mm otherwise. */
export const rawLength = (name: string, mm: number | null, typed?: { text: string; unit: string }): Raw =>
  typed
    ? { [name]: typed.text, [`${name}-unit`]: typed.unit }
    : { [name]: mm === null ? '' : round(mm), [`${name}-unit`]: 'mm' };

export const tools = [
  { value: 'print', label: 'Printed' },
  { value: 'caliper', label: 'Caliper' },
  { value: 'ruler', label: 'Steel ruler' },
  { value: 'tape', label: 'Tape' },
] as const;

export const toolField: FieldSpec = {
  type: 'choice',
  name: 'tool',
  label: 'Measured with',
  layout: 'row',
  choices: tools,
};

export const awkwardField: FieldSpec = {
  type: 'check',
  name: 'awkward',
  label: 'Measured in the frame, or across eyes turned against each other',
  hint: 'Harder to read exactly, so we count on half a millimetre more.',
};

export const mm = (value: number | null): string => (value === null ? 'not known' : `${round(value)} mm`);
