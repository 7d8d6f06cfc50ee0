import { describe, expect, it } from 'vitest';

import { checkIds, type Verdict } from '../../src/answers.js';
import type { FitQuestion } from '../../src/facts.js';
import { judge } from '../../src/judge.js';
import { presentSize } from '../../src/sizing/present-size.js';
import { randomQuestion } from '../judging/random-question.js';
import { seeded, type Random } from '../judging/seeded.js';
import { drawQuestion } from './draw.js';
import { drawReadings } from './draw-readings.js';
import { TooClose, type Kind } from './kinds.js';
import { settled } from './sizes.js';
import { kindsOf, secondOpinion } from './verdict.js';

const verdicts: Record<Kind, Verdict> = {
  pass: 'bolts-straight-in',
  work: 'fits-with-work',
  unknown: 'needs-an-answer',
  fail: 'wont-fit',
};

interface Compared {
  apart: unknown[];
  left: number;
  verdicts: Map<string, number>;
  alone: Map<string, number>;
}
const count = (of: Map<string, number>, key: string): unknown => of.set(key, (of.get(key) ?? 0) + 1);

/** Both opinions on one question; what differs is kept with the number of the draw. */
function compare(question: FitQuestion, draw: number, to: Compared): void {
  const verdict = verdicts[secondOpinion(question)];
  const { verdict: ours, answers, entryId, wayRound } = judge(question, { full: true });
  if (ours !== verdict) to.apart.push({ draw, ours, verdict });
  const entry = question.frame.entries.find(({ id }) => id === entryId);
  if (!entry || !wayRound) throw new Error('the judgement names no entry');
  const kinds = kindsOf(question, entry, wayRound);
  const answered = new Map(answers.map((given) => [given.check, given]));
  for (const check of checkIds) {
    const given = answered.get(check);
    if (given?.answer !== kinds[check])
      to.apart.push({ draw, check, ours: given?.code, theirs: kinds[check] });
  }
  count(to.verdicts, ours);
  const deciding = checkIds.filter((check) => verdicts[kinds[check] ?? 'pass'] === ours);
  if (ours !== 'bolts-straight-in' && deciding.length === 1) count(to.alone, deciding[0] ?? '');
}

function compareMany(draws: number, seed: number, draw: (r: Random) => FitQuestion): Compared {
  const random = seeded(seed);
  const compared: Compared = { apart: [], left: 0, verdicts: new Map(), alone: new Map() };
  for (let i = 0; i < draws; i += 1) {
    const question = draw(random);
    try {
      compare(question, i, compared);
    } catch (error) {
      if (!(error instanceof TooClose)) throw error;
      compared.left += 1;
    }
  }
  return compared;
}

/** Each check has to decide alone often enough to mean something. */
const leastAlone = 40;

describe('a second opinion that shares no code', () => {
  it('agrees on every check of 6,000 questions that one thing at a time disturbs', () => {
    const { apart, left, verdicts: seen, alone } = compareMany(6000, 20261201, drawQuestion);
    expect(apart).toEqual([]);
    expect(left).toBeLessThan(300);
    for (const verdict of Object.values(verdicts)) expect(seen.get(verdict), verdict).toBeGreaterThan(500);
    for (const check of checkIds) expect(alone.get(check), check).toBeGreaterThan(leastAlone);
  }, 120_000);

  it('agrees on every check of 1,500 questions drawn from the whole range', () => {
    const { apart, left } = compareMany(1500, 7, randomQuestion);
    expect(apart).toEqual([]);
    expect(left).toBeLessThan(100);
  }, 120_000);

  it('agrees on the size of 3,000 sets of readings', () => {
    const random = seeded(31);
    let [left, settledOnes] = [0, 0];
    const apart: unknown[] = [];
    for (let i = 0; i < 3000; i += 1) {
      const { frame, present } = drawReadings(random);
      const theirs = settled(frame, present);
      if (theirs === 'close') {
        left += 1;
        continue;
      }
      const ours = presentSize(frame, present);
      if (theirs !== null) settledOnes += 1;
      if (ours.sizeKey !== theirs || (ours.state === 'settled') !== (theirs !== null))
        apart.push({ i, ours, theirs });
    }
    expect(apart).toEqual([]);
    expect(left).toBeLessThan(150);
    expect(settledOnes).toBeGreaterThan(500);
    expect(settledOnes).toBeLessThan(2500);
  }, 120_000);
});
