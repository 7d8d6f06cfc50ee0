import { expect, it } from 'vitest';
import type { FrameRoom, Point } from '../facts.js';
import { sweep } from '../clearance/sweep.js';
import { clearanceScene } from './clearance-scene.js';
import { closestPoints } from './closest-points.js';

const box = (x1: number, y1: number, x2: number, y2: number): Point[] => [
  [x1, y1],
  [x2, y1],
  [x2, y2],
  [x1, y2],
];
const room: FrameRoom = {
  swing: [
    [0, 0],
    [55, 6],
  ],
  outlines: [{ name: 'top tube', polygon: box(-20, 50, 220, 70), toleranceMm: 1, poses: null, moves: false }],
};
const reservoir = {
  lengthMm: 90,
  diameterMm: 40,
  positionsDeg: [0, 180],
  outlines: [
    { positionDeg: 0, polygon: box(0, -20, 120, 25) },
    { positionDeg: 180, polygon: box(0, -25, 120, 20) },
  ],
};
const shock = { eyeToEyeMm: 210, strokeMm: 55, wayRound: 'body-to-frame' as const };

it('is the sweep of the check, drawn where it is tightest', () => {
  const scene = clearanceScene(room, reservoir, shock);
  expect(scene.positions.map(({ deg }) => deg)).toEqual([0, 180]);
  for (const [i, { polygon: body }] of reservoir.outlines.entries()) {
    const position = scene.positions[i];
    const result = sweep(room, { ...shock, body });
    expect(position).toMatchObject({ distanceMm: result.distanceMm, atShockMm: result.atShockTravelMm });
    const { shock: from, part } = position?.tight ?? { shock: [0, 0], part: [0, 0] };
    // What is drawn is further apart than what is vouched for, by the tolerance and what a step may hide.
    const drawn = Math.hypot(part[0] - from[0], part[1] - from[1]) - 1;
    expect(drawn).toBeGreaterThanOrEqual((result.distanceMm ?? 0) - 1e-9);
    expect(drawn - (result.distanceMm ?? 0)).toBeLessThan(0.6);
  }
  const [, , , , last] = scene.positions[0]?.instants ?? [];
  expect(last?.shockMm).toBe(55);
  expect(Math.hypot(...(last?.linkEye ?? [0, 0]))).toBeCloseTo(155, 9);
});

it('finds the nearest points of two polygons, whichever has the corner', () => {
  const square = box(0, 0, 10, 10);
  expect(
    closestPoints(square, [
      [15, 5],
      [30, 0],
      [30, 10],
    ]),
  ).toEqual([
    [10, 5],
    [15, 5],
  ]);
  expect(
    closestPoints(
      [
        [15, 5],
        [30, 0],
        [30, 10],
      ],
      square,
    ),
  ).toEqual([
    [15, 5],
    [10, 5],
  ]);
  expect(closestPoints(square, [])).toBeNull();
});
