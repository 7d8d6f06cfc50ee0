import { describe, expect, it } from 'vitest';

import { aFrame, aQuestion, aShock, fact } from '../../test/judging/questions.js';
import type { CheckId } from '../answers.js';
import type { FitQuestion } from '../facts.js';
import { judge } from '../judge.js';
import { presentSize } from '../sizing/present-size.js';
import { contradictsSheet } from './contradicts-sheet.js';

const codeOf = (check: CheckId, over: Partial<FitQuestion>): string | undefined =>
  judge(aQuestion(over), { full: true }).answers.find((given) => given.check === check)?.code;

describe('a reading against the sheet', () => {
  const { frame, rider, present } = aQuestion();
  const [entry] = frame.entries;
  if (!entry) throw new Error('the frame has no entry');
  const other = entry.sizeKey === '210x55' ? '210x50' : '210x55';
  const twoChips = {
    ...frame,
    entries: [
      { ...entry, chip: 'low' },
      { ...entry, id: 'high', sizeKey: other, chip: 'high' },
    ],
  };
  const settled = presentSize(frame, { ...present, printedSizeKey: other });

  it('counts only what the sheet lists for the chip that the rider has', () => {
    expect(settled).toMatchObject({ state: 'settled', sizeKey: other });
    expect(contradictsSheet(twoChips, { ...rider, chip: 'low' }, settled)).toBe(true);
    expect(contradictsSheet(twoChips, { ...rider, chip: 'high' }, settled)).toBe(false);
    expect(contradictsSheet(twoChips, { ...rider, chip: null }, settled)).toBe(false);
  });

  it('never speaks against a frame that the rider has described', () => {
    expect(contradictsSheet({ ...twoChips, origin: 'described' }, { ...rider, chip: 'low' }, settled)).toBe(
      false,
    );
  });
});

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
