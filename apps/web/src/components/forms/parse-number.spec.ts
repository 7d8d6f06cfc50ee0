import { expect, it } from 'vitest';
import { parseNumber } from './parse-number';

it.each([
  ['209.6', 209.6],
  ['209,6', 209.6],
  [' 1 204 ', 1204],
  ['1\u00a0204,5', 1204.5],
  ['.5', 0.5],
  ['8.', 8],
  ['-3', -3],
  ['0', 0],
])('reads %j as %d', (raw, value) => expect(parseNumber(raw)).toBe(value));

it.each(['', '  ', '2.5.1', '1,204.5', 'abc', '12mm', '1e3', '0x10', 'Infinity', '-', '.'])(
  'does not guess at %j',
  (raw) => expect(parseNumber(raw)).toBeNull(),
);
