import { describe, expect, it } from 'vitest';

import { polygonDistance } from '../../src/clearance/polygon-distance.js';
import { sweep } from '../../src/clearance/sweep.js';
import type { FrameOutline, FrameRoom, Point } from '../../src/facts.js';
import { seeded, type Random } from '../judging/seeded.js';
import { jstsDistance, jstsMeet } from './jsts-distance.js';
import { drawOutline, turned } from './outlines.js';

describe('distance of polygons, against jsts', () => {
  it('is the same for 5,000 pairs, and 0 exactly where they meet', () => {
    const r = seeded(20261201);
    let meeting = 0;
    for (let i = 0; i < 5000; i += 1) {
      const a = drawOutline(r, 40);
      const b = drawOutline(r, r.pick([5, 40]), [r.between(-60, 60), r.between(-60, 60)]);
      const [ours, theirs] = [polygonDistance(a, b), jstsDistance(a, b)];
      expect(Math.abs(ours - theirs), `pair ${i}`).toBeLessThan(1e-9);
      expect(ours === 0, `pair ${i}`).toBe(jstsMeet(a, b));
      if (ours === 0) meeting += 1;
    }
    // Neither kind is a rarity.
    expect(meeting).toBeGreaterThan(1000);
    expect(meeting).toBeLessThan(4000);
  });
});

interface Scene {
  room: FrameRoom;
  body: Point[];
  atLink: boolean;
}
const [eyeToEyeMm, strokeMm] = [210, 55];
const fullPose = (r: Random) =>
  [strokeMm, r.between(-10, 10), r.between(-25, 25), r.between(-15, 15)] as const;

/** A body with a reservoir above or below and two parts of the frame, one of which moves. */
function drawScene(r: Random): Scene {
  const body = drawOutline(r, 55, [65, r.between(-15, 15)]);
  const part = (name: string, moves: boolean): FrameOutline => ({
    name,
    polygon: drawOutline(r, 30, [r.between(0, 210), r.pick([-1, 1]) * r.between(40, 100)]),
    toleranceMm: r.pick([0, 0.5, 1]),
    poses: moves ? [[0, 0, 0, 0], fullPose(r)] : null,
    moves,
  });
  const swing = [
    [0, 0],
    [strokeMm, r.between(-12, 12)],
  ] as const;
  return {
    room: { outlines: [part('tube', false), part('link', true)], swing },
    body,
    atLink: r.chance(0.5),
  };
}

/** Least distance less tolerance by jsts, every tenth of a millimetre of the stroke, all motions straight. */
function leastByJsts({ room, body, atLink }: Scene): number {
  let least = Infinity;
  for (let i = 0; i <= 10 * strokeMm; i += 1) {
    const s = i / 10;
    const share = s / strokeMm;
    const inShock = atLink ? turned(body, 180, eyeToEyeMm - s, 0) : body;
    const placed = turned(inShock, share * (room.swing[1]?.[1] ?? NaN), 0, 0);
    for (const { polygon, poses, toleranceMm } of room.outlines) {
      const [, x, y, deg] = poses?.[1] ?? [0, 0, 0, 0];
      const there = turned(polygon, share * deg, share * x, share * y);
      least = Math.min(least, jstsDistance(placed, there) - toleranceMm);
    }
  }
  return Math.max(0, least);
}

describe('the sweep of a shock through its stroke, against jsts at every tenth of a millimetre', () => {
  it('never vouches for more room than there is in 150 scenes, and gives little away', () => {
    const r = seeded(7);
    let free = 0;
    for (let i = 0; i < 150; i += 1) {
      const scene = drawScene(r);
      const { room, body, atLink } = scene;
      const wayRound = atLink ? 'body-to-link' : 'body-to-frame';
      const { distanceMm, incomplete } = sweep(room, { body, eyeToEyeMm, strokeMm, wayRound });
      expect(incomplete, `scene ${i}`).toBeNull();
      const theirs = leastByJsts(scene);
      expect(distanceMm ?? NaN, `scene ${i}`).toBeLessThanOrEqual(theirs + 1e-9);
      // What it gives away by its own word, and what lies between the tenths.
      expect(distanceMm ?? NaN, `scene ${i}`).toBeGreaterThanOrEqual(theirs - 0.02 - theirs / 50 - 0.06);
      if (theirs > 0) free += 1;
    }
    expect(free).toBeGreaterThan(40);
    expect(free).toBeLessThan(140);
  });
});
