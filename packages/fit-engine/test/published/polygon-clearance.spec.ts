import { describe, expect, it } from 'vitest';
import { polygonDistance } from '../../src/clearance/polygon-distance.js';
import { sweep } from '../../src/clearance/sweep.js';
import type { FrameOutline, Point } from '../../src/facts.js';
import { expectNear } from './near.js';
import vectors from './vectors/polygon_clearance.json' with { type: 'json' };

const abs = vectors.tolerance_abs;
const points = (rows: readonly number[][]): Point[] => rows.map(([x = NaN, y = NaN]) => [x, y]);

describe('distance of two outlines', () => {
  it.each(vectors.static)('$name', ({ a, b, distance }) => {
    expectNear(polygonDistance(points(a), points(b)), distance, { abs });
    expectNear(polygonDistance(points(b), points(a)), distance, { abs });
  });
});

function turned(outline: readonly Point[], deg: number, tx: number, ty: number): Point[] {
  const [c, s] = [Math.cos((deg * Math.PI) / 180), Math.sin((deg * Math.PI) / 180)];
  return outline.map(([x, y]): Point => [c * x - s * y + tx, s * x + c * y + ty]);
}

describe.each(Object.entries(vectors.sweeps))('sweep %s', (_, { fixed, moving, rows, min_distance }) => {
  const distances = rows.map(({ theta_deg, tx, ty }) =>
    polygonDistance(points(fixed), turned(points(moving), theta_deg, tx, ty)),
  );
  it.each(rows.map((row, i) => ({ ...row, i })))('pose $i, $theta_deg degrees', ({ distance, i }) => {
    expectNear(distances[i] ?? NaN, distance, { abs });
  });
  it('least of all poses', () => expectNear(Math.min(...distances), min_distance, { abs }));
});

describe('the same rotation as a swinging shock', () => {
  const { fixed, moving, min_distance } = vectors.sweeps.pure_rotation_square;
  // The shock turns about the origin, so the fixed square moves there.
  const square: FrameOutline = {
    name: 'square',
    polygon: points(fixed).map(([x, y]): Point => [x - 80, y - 25]),
    toleranceMm: 0,
    poses: null,
    moves: false,
  };
  const swept = (swing: readonly (readonly [number, number])[], toleranceMm = 0) =>
    sweep(
      { outlines: [{ ...square, toleranceMm }], swing },
      { body: points(moving), eyeToEyeMm: 200, strokeMm: 50, wayRound: 'body-to-frame' },
    );

  it('vouches for no more than the closed form, and little less', () => {
    const { distanceMm, atShockTravelMm } = swept([
      [0, 0],
      [50, 90],
    ]);
    expect(distanceMm).toBeLessThanOrEqual(min_distance + abs);
    expect(distanceMm).toBeGreaterThan(min_distance - 0.25);
    expectNear(atShockTravelMm, 25, { abs: 1.5 });
  });
  it('takes the outline tolerance off', () => {
    const { distanceMm } = swept(
      [
        [0, 0],
        [50, 90],
      ],
      2,
    );
    expect(distanceMm).toBeLessThanOrEqual(min_distance - 2 + abs);
    expect(distanceMm).toBeGreaterThan(min_distance - 2 - 0.25);
  });
  it('finds the corner that passes quickly between two steps', () => {
    // Ninety degrees within 0.4 mm of travel: steps of 0.5 mm alone would see 15 mm at both ends. Even the finest
    // step, 1/128 mm, hides half the way of the corner within it.
    const hiddenMm = ((Math.PI / 2) * Math.hypot(15, 15)) / 0.4 / 128 / 2;
    const { distanceMm } = swept([
      [0, 0],
      [20.05, 0],
      [20.45, 90],
      [50, 90],
    ]);
    expect(distanceMm).toBeLessThanOrEqual(min_distance + abs);
    expect(distanceMm).toBeGreaterThan(min_distance - hiddenMm - 0.01);
  });
});
