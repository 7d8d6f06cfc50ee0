import { describe, expect, it } from 'vitest';

import { aFrame, aQuestion, aShock, fact } from '../../test/judging/questions.js';
import type { CheckId } from '../answers.js';
import type { FitQuestion } from '../facts.js';
import { judge } from '../judge.js';

const codeOf = (check: CheckId, over: Partial<FitQuestion>): string | undefined =>
  judge(aQuestion(over), { full: true }).answers.find((given) => given.check === check)?.code;

describe('e-bikes and notices', () => {
  it.each([
    [false, null, 'e-bike-not-one'],
    [true, true, 'e-bike-approved'],
    [true, false, 'e-bike-refused'],
    [true, null, 'e-bike-no-word'],
    [null, true, 'e-bike-approved'],
    [null, false, 'e-bike-not-told'],
    [null, null, 'e-bike-not-told'],
  ] as const)('bike %s, shock %s: %s', (bike, word, code) => {
    const frame = aFrame({ eBike: bike === null ? null : fact(bike) });
    const shock = aShock({ eBikeApproved: word === null ? null : fact(word) });
    expect(codeOf('e-bike', { frame, shock })).toBe(code);
  });

  it('a recall on either stops the sale and is the one that is named', () => {
    const { source } = fact(0);
    const remark = { id: 'a', title: 'Read the note', effect: 'remark', source } as const;
    const recall = { id: 'b', title: 'Recall of the eye', effect: 'stop', source } as const;
    const { verdict, answers } = judge(
      aQuestion({ frame: aFrame({ notices: [remark] }), shock: aShock({ notices: [recall] }) }),
    );
    expect(verdict).toBe('wont-fit');
    expect(answers.find(({ check }) => check === 'notices')?.figures[0]?.value).toBe('Recall of the eye');
    expect(codeOf('notices', { frame: aFrame({ notices: [remark] }) })).toBe('notices-remark');
  });
});
