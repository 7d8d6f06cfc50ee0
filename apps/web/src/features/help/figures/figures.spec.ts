import { describe, expect, it } from 'vitest';
import { rearEndPose, travelMm } from './rear-end';
import { airForceN, coilForceN, sagMm, samples, strokeMm } from './spring-curves';

describe('the invented single pivot', () => {
  it('has its travel on its stroke, end to end', () => {
    expect(rearEndPose(0)).toMatchObject({ strokeMm: expect.closeTo(0, 9), shockMm: expect.closeTo(210, 9) });
    expect(rearEndPose(travelMm)).toMatchObject({ strokeMm: expect.closeTo(55, 9) });
  });

  it('keeps its bars as long as they are, and never turns back', () => {
    let before = -1;
    for (let wheelMm = 0; wheelMm <= travelMm; wheelMm += 5) {
      const { axle, lever, strokeMm: used } = rearEndPose(wheelMm);
      expect(Math.hypot(axle.x, axle.y)).toBeCloseTo(420, 6);
      expect(Math.hypot(lever.x, lever.y)).toBeCloseTo(Math.hypot(38, 166), 6);
      expect(used).toBeGreaterThan(before);
      before = used;
    }
  });
});

describe('the two springs of the picture', () => {
  it('carry the same load at the sag', () => expect(coilForceN(sagMm)).toBeCloseTo(airForceN(sagMm), 9));

  it('are a curve that steepens and a straight line', () => {
    const slopes = samples(airForceN).map(([mm]) => airForceN(mm + 0.5) - airForceN(mm - 0.5));
    const late = slopes.slice(25);
    expect(late.every((slope, index) => index === 0 || slope > (late[index - 1] ?? 0))).toBe(true);
    expect(coilForceN(50) - coilForceN(40)).toBeCloseTo(coilForceN(20) - coilForceN(10), 9);
    expect(airForceN(strokeMm)).toBeGreaterThan(coilForceN(strokeMm));
  });

  it('are those that the caption names: 203 psi over the air outside, 599 lb/in', () => {
    expect((1500 - 101.325) / 6.894757).toBeCloseTo(203, 0);
    const rateNPerMm = coilForceN(20) - coilForceN(19);
    expect(Math.round((rateNPerMm * 25.4) / (0.45359237 * 9.80665))).toBe(599);
  });
});
