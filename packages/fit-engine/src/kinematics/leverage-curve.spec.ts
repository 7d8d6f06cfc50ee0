import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LeverageTable } from '../facts.js';
import type { Curve } from './curve.js';
import { curveForSprings, makeCurve } from './leverage-curve.js';

type Points = LeverageTable['points'];

function curveOf(by: LeverageTable['by'], points: Points, travelMm: number | null, strokeMm: number): Curve {
  const made = makeCurve({ by, points }, travelMm, strokeMm);
  if (!made.ok) throw new Error(made.reason);
  return made.curve;
}
const reason = (points: Points, strokeMm = 60): string | null => {
  const made = makeCurve({ by: 'shock-travel', points }, 150, strokeMm);
  return made.ok ? null : made.reason;
};

describe('travel and stroke alone', () => {
  it('give a constant ratio and no progression', () => {
    const made = makeCurve(null, 150, 60);
    if (!made.ok) throw new Error(made.reason);
    expect(made.curve).toMatchObject({
      constant: true,
      meanRatio: 2.5,
      totalTravelMm: 150,
      progressionPercent: null,
      progressionToLowestPercent: null,
    });
    expect([made.curve.ratioAt(17), made.curve.slopeAt(17), made.curve.wheelTravelAt(20)]).toEqual([
      2.5, 0, 50,
    ]);
    expect(made.curve.shockTravelAt(50)).toBe(20);
  });
  it.each([
    [null, 60, 'no-travel'],
    [NaN, 60, 'no-travel'],
    [Infinity, 60, 'no-travel'],
    [0, 60, 'no-travel'],
    [150, 0, 'bad-stroke'],
    [150, NaN, 'bad-stroke'],
    [150, Infinity, 'bad-stroke'],
    [1e300, 1e-300, 'bad-stroke'],
  ])('travel %s on stroke %s is refused: %s', (travelMm, strokeMm, code) => {
    expect(makeCurve(null, travelMm, strokeMm)).toEqual({ ok: false, reason: code });
  });
});

describe('a table is refused', () => {
  it.each<[string, Points]>([
    ['too-few-points', [[0, 3]]],
    [
      'not-a-number',
      [
        [0, 3],
        [60, NaN],
      ],
    ],
    [
      'not-a-number',
      [
        [0, 3],
        [Infinity, 2],
      ],
    ],
    [
      'does-not-start-at-zero',
      [
        [1, 3],
        [60, 2],
      ],
    ],
    [
      'not-increasing',
      [
        [0, 3],
        [30, 2.8],
        [30, 2.7],
        [60, 2],
      ],
    ],
    [
      'ratio-not-positive',
      [
        [0, 3],
        [60, 0],
      ],
    ],
    [
      'does-not-reach-the-stroke',
      [
        [0, 3],
        [59.4, 2],
      ],
    ],
    [
      'does-not-reach-the-stroke',
      [
        [0, 3],
        [60.6, 2],
      ],
    ],
  ])('%s', (code, points) => expect(reason(points)).toBe(code));

  it('but half a millimetre either way is taken', () => {
    expect(
      reason([
        [0, 3],
        [59.5, 2],
      ]),
    ).toBeNull();
    expect(
      reason([
        [0, 3],
        [60.5, 2],
      ]),
    ).toBeNull();
  });

  it('by wheel travel it must end within 1 % of the travel', () => {
    const ends = (end: number) =>
      makeCurve(
        {
          by: 'wheel-travel',
          points: [
            [0, 2.5],
            [end, 2.5],
          ],
        },
        150,
        60,
      ).ok;
    expect([ends(148.5), ends(148.4), ends(151.5), ends(151.6)]).toEqual([true, false, true, false]);
  });
});

describe('a table that contradicts the frame', () => {
  it('is drawn but not used for advice beyond 3 % of the travel', () => {
    const flat = (ratio: number) =>
      curveOf(
        'shock-travel',
        [
          [0, ratio],
          [60, ratio],
        ],
        150,
        60,
      );
    expect(flat(2.57).usableForAdvice).toBe(true);
    expect(flat(2.58).usableForAdvice).toBe(false);
    expect(flat(2.42).usableForAdvice).toBe(false);
  });
  it('gives way to the mean leverage where springs are reckoned', () => {
    const table: LeverageTable = {
      by: 'shock-travel',
      points: [
        [0, 2.9],
        [60, 2.9],
      ],
    };
    const made = curveForSprings(table, 150, 60);
    expect(made.ok && made.curve).toMatchObject({ constant: true, meanRatio: 2.5 });
  });
  it('by wheel travel, its stroke is what is compared', () => {
    expect(
      curveOf(
        'wheel-travel',
        [
          [0, 2.5],
          [150, 2.5],
        ],
        150,
        60,
      ).usableForAdvice,
    ).toBe(true);
    expect(
      curveOf(
        'wheel-travel',
        [
          [0, 2.5],
          [150, 2.5],
        ],
        150,
        65,
      ).usableForAdvice,
    ).toBe(false);
  });
});

describe('progression', () => {
  it('to the end and to the lowest point of a curve with a hump', () => {
    const curve = curveOf(
      'shock-travel',
      [
        [0, 2.5],
        [15, 2.8],
        [45, 2.0],
        [60, 2.2],
      ],
      null,
      60,
    );
    expect(curve.progressionPercent).toBeCloseTo(12, 12);
    expect(curve.progressionToLowestPercent).toBeCloseTo(20, 12);
  });
  it('is negative where the ratio rises', () => {
    expect(
      curveOf(
        'shock-travel',
        [
          [0, 2],
          [60, 2.5],
        ],
        null,
        60,
      ).progressionPercent,
    ).toBeCloseTo(-25, 12);
  });
});

describe('a table by wheel travel', () => {
  it('with LR = L0 + b w has s = ln(LR / L0) / b and dLR/ds = b LR', () => {
    const [start, end, travel] = [3, 2.4, 150];
    const b = (end - start) / travel;
    const stroke = Math.log(end / start) / b;
    const curve = curveOf(
      'wheel-travel',
      [
        [0, start],
        [travel, end],
      ],
      travel,
      stroke,
    );
    for (const s of [0, 1, 13.7, 28, 45.5, stroke]) {
      const ratio = start * Math.exp(b * s);
      expect(curve.ratioAt(s)).toBeCloseTo(ratio, 8);
      expect(curve.slopeAt(s)).toBeCloseTo(b * ratio, 8);
      expect(curve.wheelTravelAt(s)).toBeCloseTo((ratio - start) / b, 8);
    }
    expect(curve.meanRatio).toBeCloseTo(travel / stroke, 10);
  });
});

/** Curves as frames have them, and some that are wilder. */
const tables = fc
  .record({
    by: fc.constantFrom<LeverageTable['by']>('shock-travel', 'wheel-travel'),
    steps: fc.array(fc.double({ min: 1, max: 20, noNaN: true }), { minLength: 1, maxLength: 12 }),
    ratios: fc.array(fc.double({ min: 1.2, max: 4, noNaN: true }), { minLength: 13, maxLength: 13 }),
  })
  .map(({ by, steps, ratios }) => {
    let x = 0;
    const rest = steps.map((step, i) => [(x += step), ratios[i + 1] ?? 2] as const);
    return { by, points: [[0, ratios[0] ?? 2] as const, ...rest], end: x };
  });

describe('any sound table', () => {
  it('has a rising wheel travel whose slope is the ratio, and an inverse', () => {
    fc.assert(
      fc.property(tables, fc.double({ min: 0.01, max: 0.99, noNaN: true }), ({ by, points, end }, share) => {
        const curve = curveOf(by, points, null, by === 'shock-travel' ? end : 1000);
        const whole = curve.totalTravelMm / curve.meanRatio;
        const [s, h] = [share * whole, 1e-4 * whole * Math.min(share, 1 - share)];
        const slope = (curve.wheelTravelAt(s + h) - curve.wheelTravelAt(s - h)) / (2 * h);
        expect(Math.abs(slope - curve.ratioAt(s))).toBeLessThan(2e-3);
        expect(Math.abs(curve.shockTravelAt(curve.wheelTravelAt(s)) - s)).toBeLessThan(1e-8);
        const ratios = points.map(([, y]) => y);
        expect(curve.ratioAt(s)).toBeGreaterThanOrEqual(Math.min(...ratios) - 1e-9);
        expect(curve.ratioAt(s)).toBeLessThanOrEqual(Math.max(...ratios) + 1e-9);
      }),
      { numRuns: 150, seed: 11 },
    );
  });
  it('never makes a number of what is none', () => {
    for (const by of ['shock-travel', 'wheel-travel'] as const) {
      const curve = curveOf(
        by,
        [
          [0, 2.5],
          [70, 2.4],
          [150, 2.3],
        ],
        null,
        150,
      );
      expect([curve.ratioAt(NaN), curve.wheelTravelAt(NaN), curve.shockTravelAt(NaN)]).toEqual([
        NaN,
        NaN,
        NaN,
      ]);
    }
  });
});
