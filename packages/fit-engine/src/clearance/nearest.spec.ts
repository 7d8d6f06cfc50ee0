import { describe, expect, it } from 'vitest';

import { seeded } from '../../test/judging/seeded.js';
import type { FrameRoom, Point } from '../facts.js';
import { partMover, placed, shockMover, type SweptShock } from './motion.js';
import { polygonDistance } from './polygon-distance.js';
import { sweep } from './sweep.js';

const box = (x0: number, y0: number, x1: number, y1: number): Point[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

/** The same distance by plain looking at 4,000 instants: never below the truth. */
function bySampling(room: FrameRoom, shock: SweptShock): number {
  const mover = shockMover(room, shock);
  let least = Infinity;
  for (let i = 0; i <= 4000; i += 1) {
    const s = (shock.strokeMm * i) / 4000;
    for (const part of room.outlines) {
      const other = partMover(part);
      const seen = polygonDistance(placed(mover, mover.poseAt(s)), placed(other, other.poseAt(s)));
      least = Math.min(least, Math.max(0, seen - part.toleranceMm));
    }
  }
  return least;
}

const body = box(10, -30, 120, 30);
const shock: SweptShock = { body, eyeToEyeMm: 210, strokeMm: 55, wayRound: 'body-to-frame' };

describe('an approach that neither end of a motion shows', () => {
  it('is found where a corner swings past a wall: reach less wall, by hand', () => {
    // The corner (120, 30) has a reach of 123.693 mm; it points straight at the wall x = 127 once, at -14.036 degrees.
    const wall = {
      name: 'wall',
      polygon: box(127, -200, 140, 200),
      toleranceMm: 0,
      poses: null,
      moves: false,
    };
    const room = {
      outlines: [wall],
      swing: [
        [0, 0],
        [55, -28],
      ] as const,
    };
    const { distanceMm, atShockTravelMm } = sweep(room, shock);
    const truth = 127 - Math.hypot(120, 30);
    expect(distanceMm).toBeLessThanOrEqual(truth + 1e-9);
    expect(distanceMm).toBeGreaterThan(truth - 0.02 - truth / 50 - 1e-9);
    expect(atShockTravelMm).toBeCloseTo((14.036 / 28) * 55, -0.5);
  });

  it('is a collision where the corner passes through a post', () => {
    const post = { name: 'post', polygon: box(121, -1, 125, 1), toleranceMm: 0, poses: null, moves: false };
    const room = {
      outlines: [post],
      swing: [
        [0, 25],
        [55, -60],
      ] as const,
    };
    expect(
      polygonDistance(placed(shockMover(room, shock), { x: 0, y: 0, deg: 25 }), post.polygon),
    ).toBeGreaterThan(1);
    expect(
      polygonDistance(placed(shockMover(room, shock), { x: 0, y: 0, deg: -60 }), post.polygon),
    ).toBeGreaterThan(1);
    expect(sweep(room, shock).distanceMm).toBe(0);
  });

  it('is found between the rows of a moving part', () => {
    const link = {
      name: 'link',
      polygon: box(-10, -10, 10, 10),
      toleranceMm: 0.5,
      // Sinks towards the body and rises again, turning: nearest at the row in the middle.
      poses: [
        [0, 60, 80, 0],
        [27.3, 60, 46, 45],
        [55, 60, 80, 90],
      ] as const,
      moves: true,
    };
    const room = {
      outlines: [link],
      swing: [
        [0, 0],
        [55, 0],
      ] as const,
    };
    const truth = 46 - 10 * Math.SQRT2 - 30 - 0.5;
    expect(sweep(room, shock).distanceMm).toBeLessThanOrEqual(truth + 1e-9);
    expect(sweep(room, shock).distanceMm).toBeGreaterThan(truth - 0.06);
  });
});

describe('the distance vouched for', () => {
  it('is never above what looking everywhere finds, and at most 0.02 mm and a fiftieth below', () => {
    const r = seeded(77);
    let clear = 0;
    for (let i = 0; i < 120; i += 1) {
      const [x, y] = [r.between(20, 160), r.between(40, 90) * r.pick([1, -1])];
      const part = {
        name: 'part',
        polygon: box(-r.between(4, 20), -r.between(4, 12), r.between(4, 20), r.between(4, 12)),
        toleranceMm: r.pick([0, 0.5]),
        poses: [0, 13, 31.7, 55].map(
          (s) => [s, x + r.between(-15, 15), y + r.between(-15, 15), r.between(-60, 60)] as const,
        ),
        moves: true,
      };
      const room = {
        outlines: [part],
        swing: [
          [0, 0],
          [r.between(10, 45), r.between(-12, 12)],
          [55, r.between(-12, 12)],
        ] as const,
      };
      const one: SweptShock = { ...shock, wayRound: r.pick(['body-to-frame', 'body-to-link']) };
      const [found, truth] = [sweep(room, one).distanceMm ?? NaN, bySampling(room, one)];
      expect(found).toBeLessThanOrEqual(truth + 1e-9);
      // Looking at instants misses a little itself, so the bound below has that much slack.
      expect(found).toBeGreaterThanOrEqual(truth - 0.03 - truth / 50);
      if (truth > 0) clear += 1;
    }
    expect(clear).toBeGreaterThan(40);
  });
});
