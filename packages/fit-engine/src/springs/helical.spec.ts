import { expect, it } from 'vitest';
import { helicalRateNPerMm, helicalStressNPerMm2, solidLengthMm, springMassKg } from './helical.js';

it('a thicker wire is stiffer by the fourth power, a wider coil softer by the third', () => {
  const rate = helicalRateNPerMm(8, 50, 6, 78500);
  expect(helicalRateNPerMm(16, 50, 6, 78500)).toBeCloseTo(16 * rate, 9);
  expect(helicalRateNPerMm(8, 100, 6, 78500)).toBeCloseTo(rate / 8, 9);
});

it.each([0, -1, NaN, Infinity])('a wire of %s mm makes no spring', (wire) => {
  expect(helicalRateNPerMm(wire, 50, 6, 78500)).toBeNaN();
  expect(helicalStressNPerMm2(wire, 50, 1000)).toBeNaN();
  expect(solidLengthMm(wire, 8, 'squared')).toBeNaN();
  expect(springMassKg(wire, 50, 8, 7.85e-6)).toBeNaN();
});

it('a coil no wider than its wire is none', () => {
  expect(helicalRateNPerMm(8, 8, 6, 78500)).toBeNaN();
  expect(helicalStressNPerMm2(8, 8, 1000)).toBeNaN();
});
