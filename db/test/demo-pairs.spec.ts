import { checkIds, judge, type AnswerKind, type CheckId } from '@linkfell/fit-engine';
import { describe, expect, it } from 'vitest';

import { readDemoPairs } from '../src/seed/demo-pairs.js';
import { readScenario } from '../src/seed/scenario.js';

const pairs = readDemoPairs(readScenario());

/** Every answer that each check can give, by the rules of the trade. */
const possible: Record<CheckId, AnswerKind[]> = {
  'eye-to-eye': ['pass', 'work', 'unknown', 'fail'],
  stroke: ['pass', 'work', 'unknown', 'fail'],
  mounts: ['pass', 'work', 'unknown', 'fail'],
  hardware: ['pass', 'work', 'unknown'],
  'spring-type': ['pass', 'unknown', 'fail'],
  'coil-on-yoke': ['pass', 'unknown', 'fail'],
  'spring-rate': ['pass', 'work', 'unknown', 'fail'],
  pressure: ['pass', 'unknown', 'fail'],
  'rider-weight': ['pass', 'unknown', 'fail'],
  reservoir: ['pass', 'unknown', 'fail'],
  diameter: ['pass', 'unknown', 'fail'],
  remote: ['pass', 'work', 'unknown', 'fail'],
  position: ['pass', 'fail'],
  'e-bike': ['pass', 'unknown', 'fail'],
  notices: ['pass', 'fail'],
  'reading-conflict': ['pass', 'unknown'],
};
const rank: Record<AnswerKind, number> = { pass: 0, work: 1, unknown: 2, fail: 3 };
const verdicts = { work: 'fits-with-work', unknown: 'needs-an-answer', fail: 'wont-fit' } as const;

describe('demo pairs', () => {
  it.each(checkIds)('show every answer that "%s" can give', (check) => {
    const shown = pairs.filter((pair) => pair.check === check).map((pair) => pair.answer);
    expect(shown).toEqual(possible[check]);
  });

  it.each(pairs.map((pair) => [pair.check, pair.answer, pair.name, pair] as const))(
    '%s: %s (%s)',
    (check, answer, _name, { code, together, question }) => {
      const { answers, verdict } = judge(question, { full: true });
      const decides = answers.find((given) => given.check === check);
      expect(decides).toMatchObject({ answer, code });
      const asBad = answers.filter((given) => rank[given.answer] >= Math.max(rank[answer], 1));
      if (answer === 'pass') {
        // A pass cannot decide alone: nothing may stand in its way but parts and work.
        expect(asBad.filter((given) => rank[given.answer] > rank.work)).toEqual([]);
        expect(['bolts-straight-in', 'fits-with-work']).toContain(verdict);
      } else {
        expect(asBad.map((given) => given.check).sort()).toEqual([check, ...together].sort());
        expect(verdict).toBe(verdicts[answer]);
      }
    },
  );
});
