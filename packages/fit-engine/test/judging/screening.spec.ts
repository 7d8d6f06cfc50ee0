import { describe, expect, it } from 'vitest';

import { checkIds, type CheckId, type Judgement, type Refusal } from '../../src/answers.js';
import type { FitQuestion, ShockFacts } from '../../src/facts.js';
import { isJudged, judge, judgeAll, screenAll, sift } from '../../src/judge.js';
import { aQuestion } from './questions.js';
import { randomQuestion } from './random-question.js';
import { seeded, type Random } from './seeded.js';

const random = seeded(20261202);
const drawn = Array.from({ length: 500 }, () => randomQuestion(random));
const facts = Object.keys(aQuestion().shock) as (keyof ShockFacts)[];

/** A shock, and the same with each of its facts in turn taken from another: so that nothing is kept by too few facts. */
function variants(r: Random, shock: ShockFacts): ShockFacts[] {
  const others = facts.map((fact) => ({ ...shock, [fact]: r.pick(drawn).shock[fact] }));
  return [shock, ...others, ...Array.from({ length: 4 }, () => r.pick(drawn).shock)];
}

/** What is left of a judgement when a cheap check refuses. */
function refusalOf({ verdict, answers, entryId, wayRound }: Judgement): unknown {
  const { check, code } = answers.find(({ answer }) => answer === 'fail') ?? { check: null, code: null };
  return { verdict, check, code, entryId, wayRound };
}

function compare(base: FitQuestion, shocks: readonly ShockFacts[], seen: Map<string, number>): void {
  const count = (key: string): unknown => seen.set(key, (seen.get(key) ?? 0) + 1);
  const screened = screenAll(base, shocks);
  const judged = judgeAll(base, shocks);
  expect(screened).toHaveLength(shocks.length);
  expect(sift(base, shocks)).toEqual({
    judged: screened.flatMap((one, i) => (isJudged(one) ? [{ shock: shocks[i], judgement: one }] : [])),
    refused: shocks.filter((_, i) => !isJudged(screened[i] as Judgement | Refusal)),
  });
  shocks.forEach((shock, i) => {
    const one = judge({ ...base, shock });
    const quick = screened[i] as Judgement | Refusal;
    expect(judged[i]).toEqual(one);
    expect(quick).toEqual(isJudged(quick) ? one : refusalOf(one));
    count(isJudged(quick) ? quick.verdict : quick.check);
  });
}

describe('a catalogue gone through', () => {
  it('says of 12,000 shocks what judging each by itself says: verdict, entry, way round and what refuses it', () => {
    const seen = new Map<string, number>();
    for (const base of drawn) compare(base, variants(random, base.shock), seen);
    const others: readonly CheckId[] = ['hardware', 'reservoir', 'reading-conflict'];
    const cheap = checkIds.filter((check) => !others.includes(check));
    for (const check of cheap) expect(seen.get(check), check).toBeGreaterThan(20);
    for (const verdict of ['bolts-straight-in', 'fits-with-work', 'needs-an-answer', 'wont-fit']) {
      expect(seen.get(verdict), verdict).toBeGreaterThan(20);
    }
  }, 240_000);

  it('keeps figures that are no number apart from those that are', () => {
    const { shock, ...base } = aQuestion();
    const shocks = [NaN, 55, Infinity, 80, NaN].map((diameterMm) => ({ ...shock, diameterMm }));
    compare({ ...base, shock }, shocks, new Map());
  });

  it('does not mind the order of the shocks, nor a shock that comes twice', () => {
    for (const base of drawn.slice(0, 60)) {
      const shocks = [...variants(random, base.shock), base.shock];
      expect(screenAll(base, shocks.toReversed())).toEqual(screenAll(base, shocks).toReversed());
    }
  });

  it('refuses a frame without entries', () => {
    const question = aQuestion();
    const bare = { ...question, frame: { ...question.frame, entries: [] } };
    expect(() => screenAll(bare, [question.shock])).toThrow(RangeError);
    expect(() => judgeAll(bare, [question.shock])).toThrow(RangeError);
  });
});
