import { fromRangeText, toRangeText } from './time-range.js';

const range = { start: new Date('2026-03-29T00:30:00Z'), end: new Date('2026-03-29T02:00:00.500Z') };

describe('time ranges', () => {
  it('are written with the start in and the end out', () => {
    expect(toRangeText(range)).toBe('[2026-03-29T00:30:00.000Z,2026-03-29T02:00:00.500Z)');
  });

  it.each([
    '["2026-03-29 00:30:00+00","2026-03-29 02:00:00.5+00")',
    '["2026-03-29 01:30:00+01","2026-03-29 03:00:00.5+01")',
    '["2026-03-29 06:00:00+05:30","2026-03-29 07:30:00.5+05:30")',
  ])('are read as %s', (text) => expect(fromRangeText(text)).toEqual(range));

  it.each([
    'empty',
    '(,)',
    '["2026-03-29 00:30:00+00",)',
    '["2026-03-29 00:30:00+00","2026-03-29 02:00:00+00"]',
  ])('are not %s', (text) => expect(() => fromRangeText(text)).toThrow('not a bounded time range'));
});
