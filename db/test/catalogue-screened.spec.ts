import { isJudged, judge, screenAll, type FitQuestion } from '@linkfell/fit-engine';
import { describe, expect, it } from 'vitest';

import { frameFacts, readDemoPairs, shockFacts } from '../src/seed/demo-pairs.js';
import { readScenario } from '../src/seed/scenario.js';

const scenario = readScenario();
const shocks = scenario.shockSizes.map(({ id }) => shockFacts(scenario, id));
const pairs = readDemoPairs(scenario);

/** How many shocks a bike's screening refuses, each held against the judgement of that shock alone. */
function refusals(base: FitQuestion): number {
  const apart: unknown[] = [];
  let refused = 0;
  screenAll(base, shocks).forEach((one, i) => {
    const shock = shocks[i];
    if (!shock) throw new Error('a shock without a place in the list');
    const alone = judge({ ...base, shock });
    if (isJudged(one)) expect(one).toEqual(alone);
    else {
      refused += 1;
      const first = alone.answers.find(({ answer }) => answer === 'fail');
      const same =
        alone.verdict === one.verdict && alone.entryId === one.entryId && alone.wayRound === one.wayRound;
      if (!same || first?.check !== one.check || first.code !== one.code)
        apart.push({ shock: shock.sizeId, one });
    }
  });
  expect(apart).toEqual([]);
  return refused;
}

describe('the demo catalogue gone through', () => {
  it('refuses for every frame the shocks that judging each by itself refuses, for the same reason', () => {
    const [pair] = pairs;
    if (!pair) throw new Error('the demo data have no pairs');
    const perFrame = scenario.frames.map(({ id }) =>
      refusals({ ...pair.question, frame: frameFacts(scenario, id) }),
    );
    expect(Math.min(...perFrame)).toBeGreaterThan(0);
  }, 120_000);

  it('does so for the rider, bike and present shock of every demo pair', () => {
    const perPair = pairs.map(({ question }) => refusals(question));
    expect(perPair).toHaveLength(pairs.length);
    expect(Math.max(...perPair)).toBeGreaterThan(shocks.length / 2);
  }, 120_000);
});
