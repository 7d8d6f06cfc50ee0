import { expect, it } from 'vitest';
import { makeCurve } from '../kinematics/leverage-curve.js';
import { frequencyHz, wheelForceN, wheelRateNPerMm } from './wheel.js';

it('the wheel rate is the slope of the wheel force over wheel travel', () => {
  const made = makeCurve(
    {
      by: 'shock-travel',
      points: [
        [0, 2.9],
        [20, 2.6],
        [40, 2.5],
        [60, 2.1],
      ],
    },
    null,
    60,
  );
  if (!made.ok) throw new Error(made.reason);
  const { curve } = made;
  const force = (s: number): number => 90 * (s + 2);
  for (const s of [5, 18, 33, 52]) {
    const h = 1e-4;
    const rise = wheelForceN(curve, s + h, force(s + h)) - wheelForceN(curve, s - h, force(s - h));
    const run = curve.wheelTravelAt(s + h) - curve.wheelTravelAt(s - h);
    expect(wheelRateNPerMm(curve, s, force(s), 90)).toBeCloseTo(rise / run, 5);
  }
});

it('100 kg on 39.478 N/mm swings at about 3.16 Hz; a falling rate has no frequency', () => {
  expect(frequencyHz((4 * Math.PI ** 2 * 100) / 1000, 100)).toBeCloseTo(1, 12);
  expect(frequencyHz(39.4784176, 100)).toBeCloseTo(Math.sqrt(10), 6);
  expect(frequencyHz(-5, 100)).toBeNaN();
});
