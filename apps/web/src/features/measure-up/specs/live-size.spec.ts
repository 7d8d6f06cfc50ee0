import type { MeasureUpView } from '@linkfell/contracts';
import { expect, it } from 'vitest';
import { liveSize } from './live-size';

const view = (answers: object, family: 'eyelet' | 'trunnion' | null, listed: string[]) =>
  ({
    answers,
    size: { family },
    sheet: { entries: listed.map((sizeKey) => ({ sizeKey })) },
  }) as unknown as MeasureUpView;
const known = (value: object) => ({ state: 'known', value });
const eye = (mm: number, tool = 'caliper') => known({ mm, tool, awkward: false });

it('says nothing before a figure can be read', () => {
  const asked = view({}, null, ['210x55']);
  expect(liveSize(asked, 'eye-to-eye', { length: '' })).toBeNull();
  expect(liveSize(asked, 'eye-to-eye', { length: 'two hundred' })).toBeNull();
});

it('settles, asks again or finds no size, as the reading and its tool deserve', () => {
  const by = (tool: string, stroke: string) =>
    liveSize(view({ 'eye-to-eye': eye(185, tool) }, 'trunnion', []), 'stroke', {
      ...{ method: 'compressed', stroke, tool },
    })?.say;
  // The trade's own example: 185 mm long, 131.5 mm pushed together.
  expect(by('caliper', '131.5')).toBe('Settled: your shock is a 185x55.');
  expect(by('tape', '131.5')).not.toMatch(/Settled/);
  expect(by('caliper', '90')).toMatch(/No shock size has these figures/);
});

it('reads inches, and what the shaft shows', () => {
  const asked = view({ 'eye-to-eye': eye(210) }, 'eyelet', ['210x55']);
  const say = (raw: Record<string, string>) => liveSize(asked, 'stroke', { tool: 'caliper', ...raw })?.say;
  expect(say({ method: 'shaft', stroke: '54.6' })).toBe('Settled: your shock is a 210x55.');
  expect(say({ method: 'shaft', stroke: '2.15', 'stroke-unit': 'in' })).toBe(
    'Settled: your shock is a 210x55.',
  );
});

it('says where a reading contradicts what the maker lists', () => {
  const asked = view({}, null, ['210x50', '210x55']);
  const against = liveSize(asked, 'eye-to-eye', { length: '230.1', tool: 'caliper' });
  expect(against?.conflicts).toEqual(['The frame’s maker lists 210x50 and 210x55; you read 230.1 mm.']);
  expect(liveSize(asked, 'eye-to-eye', { length: '210.2', tool: 'caliper' })?.conflicts).toEqual([]);
});
