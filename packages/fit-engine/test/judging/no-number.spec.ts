import { describe, expect, it } from 'vitest';

import type { Judgement } from '../../src/answers.js';
import type { FitQuestion } from '../../src/facts.js';
import { judge } from '../../src/judge.js';
import { resolveSize } from '../../src/sizing/resolve-size.js';
import { aCoilShock, aFrame, anEntry, aPinEnd, aPresentShock, aQuestion, aShock, fact } from './questions.js';
import { spoilt } from './spoilt.js';

const bad = [NaN, Infinity, -Infinity] as const;
const fitting = ['bolts-straight-in', 'fits-with-work'];

/** Numbers that a judgement would put on a screen or a job sheet. */
function numbersOf({ spring, answers }: Judgement): number[] {
  const figures = answers
    .flatMap(({ figures: shown }) => shown)
    .filter(({ source }) => source.kind === 'computed');
  return [...Object.values(spring ?? {}), ...figures.map(({ value }) => value)].filter(
    (n) => typeof n === 'number',
  );
}

const table = {
  by: 'shock-travel',
  points: [
    [0, 3],
    [27, 2.7],
    [55, 2.4],
  ],
} as const;
const square = [
  [60, -45],
  [120, -45],
  [120, 20],
  [60, 20],
] as const;
const base = aQuestion({
  frame: aFrame({
    entries: [
      anEntry({
        curve: table,
        linkEnd: aPinEnd({ mount: { kind: 'hardware', widthMm: 30, boltMm: 8 } }),
      }),
    ],
    riderLimit: fact({ kg: 120, basis: 'with-bike' }),
    sagTargetPercent: fact(28),
    room: {
      outlines: [
        {
          name: 'tube',
          polygon: [
            [0, -90],
            [200, -90],
            [200, -60],
            [0, -60],
          ],
          toleranceMm: 1,
          poses: [
            [0, 0, 0, 0],
            [55, 0, 0, 0],
          ],
          moves: true,
        },
      ],
      swing: [
        [0, 0],
        [55, -1],
      ],
    },
  }),
  shock: aShock({
    reservoir: {
      lengthMm: 90,
      diameterMm: 40,
      positionsDeg: [0],
      outlines: [{ positionDeg: 0, polygon: square }],
    },
  }),
});
const coil = { ...base, shock: { ...aCoilShock(), reservoir: base.shock.reservoir } };

describe('a figure that is no number', () => {
  it.each([
    ['air', base],
    ['coil', coil],
  ] as const)('never comes out as one, whichever figure it stands for (%s)', (_kind, question) => {
    expect(fitting).toContain(judge(question, { full: true }).verdict);
    for (const by of bad) {
      const all: FitQuestion[] = spoilt(
        { frame: question.frame, rider: question.rider, shock: question.shock },
        by,
      ).map((spoiltPart) => ({ ...question, ...spoiltPart }));
      expect(all.length).toBeGreaterThan(60);
      for (const one of all) {
        expect(numbersOf(judge(one, { full: true })).filter((n) => !Number.isFinite(n))).toEqual([]);
      }
    }
  });

  it.each(bad)('%s as a mount, a width, a tunnel or an outline is not known', (by) => {
    const pin = aPinEnd({ mount: { kind: 'pin', diameterMm: by, widthMm: 24 } });
    const asked = (over: Partial<FitQuestion>): string => judge(aQuestion(over), { full: true }).verdict;
    expect(asked({ frame: aFrame({ entries: [anEntry({ frameEnd: pin })] }) })).toBe('needs-an-answer');
    expect(asked({ frame: aFrame({ tunnelWidthMm: fact(by) }) })).toBe('needs-an-answer');
    expect(asked({ shock: aShock({ diameterMm: by }) })).toBe('needs-an-answer');
    expect(asked({ shock: aShock({ bodyEnd: { kind: 'eyelet', boreMm: by } }) })).toBe('needs-an-answer');
    const { room } = base.frame;
    const outlines = (room?.outlines ?? []).map((part) => ({ ...part, toleranceMm: by }));
    const frame = { ...base.frame, room: { swing: room?.swing ?? [], outlines } };
    expect(asked({ frame, shock: base.shock })).toBe('needs-an-answer');
  });

  it.each(bad)('%s as a reading counts as not read', (mm) => {
    const reading = { mm, tool: 'caliper', awkward: false } as const;
    const size = resolveSize(aPresentShock({ eyeToEye: reading, compressed: reading }), null, null);
    expect(size.state).toBe('nothing-yet');
  });
});
