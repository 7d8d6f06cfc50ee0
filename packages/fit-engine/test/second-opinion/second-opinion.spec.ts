import { describe, expect, it } from 'vitest';

import { checkIds, type Verdict } from '../../src/answers.js';
import type { FitQuestion } from '../../src/facts.js';
import { judge } from '../../src/judge.js';
import { presentSize } from '../../src/sizing/present-size.js';
import { randomQuestion } from '../judging/random-question.js';
import { seeded, type Random } from '../judging/seeded.js';
import { drawBroken, drawQuestion } from './draw.js';
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
  /** Questions that both have judged; those too near an edge for rounding are left out. */
  compared: number;
  verdicts: Map<string, number>;
  alone: Map<string, number>;
}
const count = (of: Map<string, number>, key: string): unknown => of.set(key, (of.get(key) ?? 0) + 1);

/** Both opinions on one question; what differs is kept with the number of the draw. */
function compare(question: FitQuestion, draw: string, to: Compared): void {
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
  to.compared += 1;
  count(to.verdicts, ours);
  const deciding = checkIds.filter((check) => verdicts[kinds[check] ?? 'pass'] === ours);
  if (ours !== 'bolts-straight-in' && deciding.length === 1) count(to.alone, deciding[0] ?? '');
}

const nothingYet = (): Compared => ({ apart: [], compared: 0, verdicts: new Map(), alone: new Map() });

/** Draws from a seed of their own, so that each part of the campaign can be run again by itself. */
function compareMany(draws: number, seed: number, draw: (r: Random) => FitQuestion, to: Compared): void {
  const random = seeded(seed);
  for (let i = 0; i < draws; i += 1) {
    const question = draw(random);
    try {
      compare(question, `${seed}/${i}`, to);
    } catch (error) {
      if (!(error instanceof TooClose)) throw error;
    }
  }
}

const table = (of: Map<string, number>, keys: readonly string[]): string =>
  keys.map((key) => `${key} ${of.get(key) ?? 0}`).join(', ');

describe('a second opinion that shares no code', () => {
  it('agrees on every check of more than 20,000 questions, each verdict and each check often enough', () => {
    const all = nothingYet();
    // From the whole range; near a match with some things changed; a match with one check disturbed.
    compareMany(3000, 7, randomQuestion, all);
    compareMany(8000, 20261201, drawQuestion, all);
    checkIds.forEach((check, i) => compareMany(650, 100 + i, drawBroken(check), all));
    const names = Object.values(verdicts);
    process.stdout.write(
      `${all.compared} questions compared: ${table(all.verdicts, names)}\n` +
        `decided by one check alone: ${table(all.alone, checkIds)}\n`,
    );
    expect(all.apart).toEqual([]);
    expect(all.compared).toBeGreaterThanOrEqual(20_000);
    for (const name of names) expect(all.verdicts.get(name), name).toBeGreaterThanOrEqual(2000);
    for (const check of checkIds) expect(all.alone.get(check), check).toBeGreaterThanOrEqual(200);
  }, 240_000);

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
