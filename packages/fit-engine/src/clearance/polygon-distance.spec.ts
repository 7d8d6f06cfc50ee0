import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Point } from '../facts.js';
import { polygonDistance } from './polygon-distance.js';

const square: Point[] = [
  [0, 0],
  [10, 0],
  [10, 10],
  [0, 10],
];
const moved = (outline: readonly Point[], dx: number, dy: number): Point[] =>
  outline.map(([x, y]): Point => [x + dx, y + dy]);

describe('is 0', () => {
  it.each<[string, Point[]]>([
    ['on an edge in common', moved(square, 10, 0)],
    ['on a corner in common', moved(square, 10, 10)],
    ['on an overlap', moved(square, 7, 3)],
    [
      'on a cross without a corner inside',
      [
        [-5, 4],
        [15, 4],
        [15, 6],
        [-5, 6],
      ],
    ],
    [
      'on one inside the other',
      [
        [4, 4],
        [5, 4],
        [5, 5],
      ],
    ],
    [
      'on one around the other',
      [
        [-5, -5],
        [20, -5],
        [20, 20],
        [-5, 20],
      ],
    ],
    ['on the same outline', square],
  ])('%s', (_, other) => {
    expect(polygonDistance(square, other)).toBe(0);
    expect(polygonDistance(other, square)).toBe(0);
  });
});

it('is the gap along an axis, across a corner, and inside a pocket', () => {
  expect(polygonDistance(square, moved(square, 13, 0))).toBe(3);
  expect(polygonDistance(square, moved(square, 13, 14))).toBe(5);
  const pocket: Point[] = [
    [0, 0],
    [30, 0],
    [30, 30],
    [20, 30],
    [20, 10],
    [10, 10],
    [10, 30],
    [0, 30],
  ];
  expect(
    polygonDistance(pocket, [
      [14, 16],
      [16, 16],
      [16, 40],
      [14, 40],
    ]),
  ).toBe(4);
});

it('of no outline is no number', () => expect(polygonDistance([], square)).toBeNaN());

/** Star-shaped around its centre, so that it never crosses itself. */
const outlines = fc
  .record({
    radii: fc.array(fc.double({ min: 2, max: 40, noNaN: true }), { minLength: 3, maxLength: 9 }),
    x: fc.double({ min: -60, max: 60, noNaN: true }),
    y: fc.double({ min: -60, max: 60, noNaN: true }),
  })
  .map(({ radii, x, y }) =>
    radii.map((r, i): Point => {
      const angle = (2 * Math.PI * i) / radii.length;
      return [x + r * Math.cos(angle), y + r * Math.sin(angle)];
    }),
  );

/** Points along the edges, near enough to show a distance that is too great. */
const along = (outline: readonly Point[]): Point[] =>
  outline.flatMap((a, i) => {
    const b = outline[(i + 1) % outline.length] ?? a;
    return Array.from({ length: 20 }, (_, k): Point => {
      const t = k / 20;
      return [a[0] + t * (b[0] - a[0]), a[1] + t * (b[1] - a[1])];
    });
  });

it('any two outlines: the same from either side, never more than between any two of their points', () => {
  fc.assert(
    fc.property(outlines, outlines, (a, b) => {
      const distance = polygonDistance(a, b);
      expect(polygonDistance(b, a)).toBeCloseTo(distance, 12);
      let least = Infinity;
      for (const [px, py] of along(a)) {
        for (const [qx, qy] of along(b)) least = Math.min(least, Math.hypot(px - qx, py - qy));
      }
      expect(distance).toBeLessThanOrEqual(least + 1e-9);
      // Sampled every twentieth of an edge, the least gap is not much above the true one, unless they overlap.
      if (distance > 0) expect(distance).toBeGreaterThan(least - 8);
    }),
    { numRuns: 150, seed: 18 },
  );
});

it('moving one away along a line that parts them adds just that', () => {
  fc.assert(
    fc.property(fc.double({ min: 0, max: 50, noNaN: true }), (gap) => {
      expect(polygonDistance(square, moved(square, 10 + gap, 3))).toBeCloseTo(gap, 9);
    }),
    { numRuns: 50, seed: 19 },
  );
});
