import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FrameOutline, FrameRoom, Point } from '../facts.js';
import { polygonDistance } from './polygon-distance.js';
import { sweep, type SweptShock } from './sweep.js';

const body: Point[] = [
  [-12, -14],
  [110, -14],
  [110, 14],
  [60, 14],
  [60, 40],
  [10, 40],
  [10, 14],
  [-12, 14],
];
const shock: SweptShock = { body, eyeToEyeMm: 210, strokeMm: 55, wayRound: 'body-to-frame' };
const box = (x: number, y: number, w = 20, h = 10): Point[] => [
  [x, y],
  [x + w, y],
  [x + w, y + h],
  [x, y + h],
];
const fixed = (polygon: Point[], toleranceMm = 0): FrameOutline => ({
  name: 'tube',
  polygon,
  toleranceMm,
  poses: null,
  moves: false,
});
const still = [
  [0, 0],
  [55, 0],
] as const;
const roomOf = (outlines: FrameOutline[], swing: FrameRoom['swing'] = still): FrameRoom => ({
  outlines,
  swing,
});

describe('a shock that does not swing', () => {
  it('body at the frame stays where it is', () => {
    const result = sweep(roomOf([fixed(box(20, 50))]), shock);
    expect(result).toMatchObject({ distanceMm: 10, part: 'tube', incomplete: null });
  });
  it('less the tolerance, and never below 0', () => {
    expect(sweep(roomOf([fixed(box(20, 50), 1.5)]), shock).distanceMm).toBe(8.5);
    expect(sweep(roomOf([fixed(box(20, 50), 12)]), shock).distanceMm).toBe(0);
  });
  it('body at the link comes nearer to the frame by the stroke', () => {
    // Extended it reaches from 210 - 110 = 100; compressed from 45. The tube ends at 30.
    const result = sweep(roomOf([fixed(box(10, -5))]), { ...shock, wayRound: 'body-to-link' });
    expect(result.distanceMm).toBeCloseTo(15, 1);
    expect(result.distanceMm).toBeLessThanOrEqual(15);
    expect(result.atShockTravelMm).toBeCloseTo(55, 1);
  });
  it('names the nearest part', () => {
    const far = { ...fixed(box(20, 70)), name: 'far' };
    expect(sweep(roomOf([far, fixed(box(20, 50))]), shock).part).toBe('tube');
    expect(sweep(roomOf([fixed(box(20, 50)), far]), shock).part).toBe('tube');
  });
});

describe('what is not drawn is not known', () => {
  const link: FrameOutline = { ...fixed(box(20, 60)), name: 'link', moves: true };
  it('a moving part without poses', () => {
    expect(sweep(roomOf([link]), shock)).toMatchObject({ distanceMm: null, incomplete: 'link' });
    expect(sweep(roomOf([fixed(box(20, 50)), link]), shock).incomplete).toBe('link');
  });
  it('poses that stop before the stroke', () => {
    const short: FrameOutline = {
      ...link,
      poses: [
        [0, 0, 0, 0],
        [54, 0, 0, 0],
      ],
    };
    expect(sweep(roomOf([short]), shock).incomplete).toBe('link');
  });
  it.each<[string, FrameRoom['swing']]>([
    ['none', []],
    [
      'not a number',
      [
        [0, 0],
        [55, NaN],
      ],
    ],
    [
      'out of order',
      [
        [0, 0],
        [30, 1],
        [20, 2],
        [55, 3],
      ],
    ],
    [
      'too short',
      [
        [0, 0],
        [54, 3],
      ],
    ],
  ])('a swing table that is %s', (_, swing) => {
    expect(sweep(roomOf([fixed(box(20, 50))], swing), shock)).toMatchObject({
      distanceMm: null,
      incomplete: 'swing',
    });
  });
  it.each([
    ['no body', { body: [] }],
    [
      'a body with a hole in its figures',
      {
        body: [
          [0, 0],
          [NaN, 1],
          [2, 2],
        ] as Point[],
      },
    ],
    ['a stroke of nothing', { strokeMm: 0 }],
    ['a stroke beyond the length', { strokeMm: 300 }],
    ['a length that is no number', { eyeToEyeMm: NaN }],
  ])('%s', (_, change) => {
    expect(sweep(roomOf([fixed(box(20, 50))]), { ...shock, ...change })).toMatchObject({
      distanceMm: null,
      incomplete: 'shock',
    });
  });
  it('a tolerance below 0 or an outline with two corners', () => {
    expect(sweep(roomOf([fixed(box(20, 50), -1)]), shock).incomplete).toBe('tube');
    expect(
      sweep(
        roomOf([
          fixed([
            [0, 50],
            [9, 50],
          ]),
        ]),
        shock,
      ).incomplete,
    ).toBe('tube');
  });
});

/** The same motion written a second time, plainly: turn, then shift. */
function turned(outline: readonly Point[], deg: number, dx = 0, dy = 0): Point[] {
  const rad = (deg * Math.PI) / 180;
  return outline.map(([x, y]): Point => [
    x * Math.cos(rad) - y * Math.sin(rad) + dx,
    x * Math.sin(rad) + y * Math.cos(rad) + dy,
  ]);
}
function readAt(rows: readonly (readonly number[])[], s: number, column: number): number {
  const above = rows.findIndex((row) => (row[0] ?? NaN) >= s);
  const [low, high] = [rows[Math.max(above - 1, 0)] ?? [], rows[above] ?? []];
  const [s0 = 0, s1 = 0] = [low[0], high[0]];
  const share = s1 > s0 ? (s - s0) / (s1 - s0) : 0;
  return (low[column] ?? NaN) + share * ((high[column] ?? NaN) - (low[column] ?? NaN));
}

describe('any motion', () => {
  const of = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  const motion = fc.record({
    way: fc.constantFrom<SweptShock['wayRound']>('body-to-frame', 'body-to-link'),
    swing: fc.tuple(of(-10, 10), of(-15, 15), of(-20, 20)),
    poses: fc.tuple(...Array.from({ length: 3 }, () => fc.tuple(of(-40, 120), of(40, 120), of(-40, 40)))),
    at: of(5, 50),
  });

  it('never vouches for more than is seen every hundredth of a millimetre, nor for much less', () => {
    fc.assert(
      fc.property(motion, ({ way, swing, poses, at }) => {
        const travels = [0, at, 55];
        const swings = travels.map((s, i) => [s, swing[i] ?? 0] as const);
        const rows = travels.map(
          (s, i) => [s, ...(poses[i] ?? [0, 0, 0])] as [number, number, number, number],
        );
        const part: FrameOutline = { ...fixed(box(-10, -5)), poses: rows, moves: true };
        const { distanceMm } = sweep(roomOf([part], swings), { ...shock, wayRound: way });
        let seen = Infinity;
        for (let i = 0; i <= 5500; i += 1) {
          const s = Math.min(i / 100, 55);
          const own = way === 'body-to-frame' ? body : body.map(([x, y]): Point => [210 - s - x, -y]);
          const placed = turned(own, readAt(swings, s, 1));
          const link = turned(part.polygon, readAt(rows, s, 3), readAt(rows, s, 1), readAt(rows, s, 2));
          seen = Math.min(seen, polygonDistance(placed, link));
        }
        expect(distanceMm).toBeLessThanOrEqual(seen + 1e-9);
        // A fiftieth and 0.02 mm may be given away to safety; the finest step hides a few hundredths besides.
        expect(distanceMm).toBeGreaterThanOrEqual(seen - seen / 50 - 0.15);
      }),
      { numRuns: 40, seed: 20 },
    );
  });
});
