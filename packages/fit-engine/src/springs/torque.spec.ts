import { expect, it } from 'vitest';
import { torqueSlipRange } from './torque.js';

it('M8: 0.2 x 0.75 x 580 x 36.6 x 8 mm', () => {
  expect(torqueSlipRange('M8')?.highNm).toBeCloseTo(25.4736, 10);
  expect(torqueSlipRange('M8')?.lowNm).toBeCloseTo(1.27368, 10);
});

it.each([null, '', 'M7', 'm8', 'M8x1', '8', 'constructor'])('nothing is said for %s', (thread) => {
  expect(torqueSlipRange(thread)).toBeNull();
});
