import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import type { FitQuestion } from '../../src/facts.js';
import { judge } from '../../src/judge.js';
import { hardFigures } from './hard-figures.js';
import { randomQuestion } from './random-question.js';
import { seeded } from './seeded.js';

const fits = (question: FitQuestion): boolean =>
  ['bolts-straight-in', 'fits-with-work'].includes(judge(question, { full: true }).verdict);

describe('a shock that fits, with one hard figure set to another nominal value', () => {
  it.each(Object.entries(hardFigures))('never fits any more: %s', (_name, change) => {
    let changed = 0;
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2 ** 31 - 1 }), (seed) => {
        const random = seeded(seed);
        const question = randomQuestion(random);
        // Another entry of the sheet may take what this one refuses: one entry, so that one figure decides.
        const single = {
          ...question,
          frame: { ...question.frame, entries: question.frame.entries.slice(0, 1) },
        };
        const after = fits(single) ? change(single, random) : null;
        if (!after) return;
        changed += 1;
        expect(fits(after)).toBe(false);
      }),
      { numRuns: 1500, seed: 3 },
    );
    expect(changed).toBeGreaterThan(100);
  });
});

const shuffled = <T>(list: readonly T[], seed: number): T[] => {
  const random = seeded(seed);
  return list
    .map((value) => ({ value, at: random.next() }))
    .sort((a, b) => a.at - b.at)
    .map(({ value }) => value);
};

describe('the order of what is told', () => {
  it('never matters, in any list of bike, shock and shelf', () => {
    const numbers = fc.integer({ min: 0, max: 2 ** 31 - 1 });
    let drawn = 0;
    fc.assert(
      fc.property(numbers, numbers, (seed, order) => {
        const question = randomQuestion(seeded(seed));
        const mix = <T>(list: readonly T[]): T[] => shuffled(list, order);
        const { frame, shock, sale } = question;
        const room = frame.room && { ...frame.room, outlines: mix(frame.room.outlines) };
        const refused = frame.refusedPositions && {
          ...frame.refusedPositions,
          value: mix(frame.refusedPositions.value),
        };
        const entries = mix(frame.entries).map((entry) => ({
          ...entry,
          frameSizes: entry.frameSizes && mix(entry.frameSizes),
        }));
        const reservoir = shock.reservoir && {
          ...shock.reservoir,
          positionsDeg: mix(shock.reservoir.positionsDeg),
          outlines: mix(shock.reservoir.outlines),
        };
        const other: FitQuestion = {
          ...question,
          frame: { ...frame, room, refusedPositions: refused, entries, notices: mix(frame.notices) },
          shock: { ...shock, reservoir, spacedToKeys: mix(shock.spacedToKeys), notices: mix(shock.notices) },
          sale: {
            kits: mix(sale.kits),
            coils: mix(sale.coils),
            remotes: mix(sale.remotes),
            otherPartIds: mix(sale.otherPartIds),
          },
        };
        if (room && reservoir) drawn += 1;
        const [a, b] = [judge(question, { full: true }), judge(other, { full: true })];
        expect([b.verdict, b.entryId, b.wayRound, b.spring, b.parts]).toEqual([
          a.verdict,
          a.entryId,
          a.wayRound,
          a.spring,
          a.parts,
        ]);
        expect(b.answers.map(({ code }) => code)).toEqual(a.answers.map(({ code }) => code));
      }),
      { numRuns: 2000, seed: 5 },
    );
    expect(drawn).toBeGreaterThan(100);
  });
});
