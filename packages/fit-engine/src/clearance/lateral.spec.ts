import { expect, it } from 'vitest';
import { lateralOk } from './lateral.js';

it.each([
  [56, 60, true],
  [56.1, 60, false],
  // 0.1 + 0.2 is more than 0.3 in binary; on the tape it is not.
  [56.3, 60.3, true],
  [0.1 + 0.2 + 56, 60.3, true],
  [62.7, 66.7, true],
  [62.71, 66.7, false],
])('a can of %s mm in a tunnel of %s mm: %s', (diameter, tunnel, ok) => {
  expect(lateralOk(diameter, tunnel)).toBe(ok);
});

it('another margin', () => {
  expect([lateralOk(56, 62, 3), lateralOk(56, 61.9, 3)]).toEqual([true, false]);
});

it.each([NaN, Infinity])('%s passes nothing', (bad) => {
  expect([lateralOk(bad, 60), lateralOk(56, bad)]).toEqual([false, false]);
});
