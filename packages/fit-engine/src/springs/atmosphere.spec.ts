import { expect, it } from 'vitest';
import { fillAtTemperatureKPa, patmAtHeightKPa } from './atmosphere.js';

it('is one atmosphere at the sea and falls with height', () => {
  expect(patmAtHeightKPa(0)).toBe(101.325);
  const heights = Array.from({ length: 33 }, (_, i) => patmAtHeightKPa(-5000 + 500 * i));
  heights.slice(1).forEach((p, i) => expect(p).toBeLessThan(heights[i] ?? NaN));
});

it.each([NaN, Infinity, -Infinity, 11000.1, -5000.1])('says nothing at %s m', (height) => {
  expect(patmAtHeightKPa(height)).toBeNaN();
});

it('warms in proportion to kelvin, and not from below nothing', () => {
  expect(fillAtTemperatureKPa(1000, 293.15, 293.15)).toBeCloseTo(1000, 9);
  expect(fillAtTemperatureKPa(1000, 300, 330)).toBeCloseTo(1100, 9);
  expect(fillAtTemperatureKPa(1000, 0, 300)).toBeNaN();
  expect(fillAtTemperatureKPa(1000, 300, -1)).toBeNaN();
});
