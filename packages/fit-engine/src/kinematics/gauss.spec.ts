import { expect, it } from 'vitest';
import { gauss5 } from './gauss.js';

it('is exact for a polynomial of degree 9, and not for degree 10', () => {
  expect(gauss5((x) => 10 * x ** 9, 0, 2)).toBeCloseTo(1024, 9);
  expect(Math.abs(gauss5((x) => 11 * x ** 10, 0, 2) - 2048)).toBeGreaterThan(1e-3);
});

it('turns its sign with the direction', () => {
  expect(gauss5(Math.exp, 1, 0)).toBeCloseTo(1 - Math.E, 10);
});
