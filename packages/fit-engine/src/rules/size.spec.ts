import { describe, expect, it } from 'vitest';

import { aFrame, anEntry, aPresentShock, aQuestion, aRider, aShock } from '../../test/judging/questions.js';
import type { FitQuestion } from '../facts.js';
import { judge } from '../judge.js';

const codes = (over: Partial<FitQuestion>): [string, string, string] => {
  const { answers, verdict } = judge(aQuestion(over), { full: true });
  const code = (check: string): string => answers.find((given) => given.check === check)?.code ?? 'missing';
  return [code('eye-to-eye'), code('stroke'), verdict];
};
const unsettled = 'size-of-yours-not-settled';

describe('sheet sizes', () => {
  const both = aFrame({
    entries: [anEntry({ id: 'a', sizeKey: '210x52.5', chip: null }), anEntry({ id: 'b' })],
  });

  it('a maker that lists 52.5 and 55 takes both, one that lists only 52.5 refuses 55 (common practice)', () => {
    expect(codes({ frame: both })[2]).toBe('bolts-straight-in');
    expect(codes({ frame: both, shock: aShock({ sizeKey: '210x52.5' }) })[2]).toBe('bolts-straight-in');
    const one = aFrame({ entries: [anEntry({ sizeKey: '210x52.5' })] });
    expect(codes({ frame: one })).toEqual(['eye-to-eye-agrees', 'stroke-longer', 'wont-fit']);
  });

  it('190x50 is one size under both its labels, and no metric size (common practice)', () => {
    const frame = aFrame({ entries: [anEntry({ sizeKey: '190x50' })] });
    expect(codes({ frame, shock: aShock({ sizeKey: '190x51' }) })[2]).toBe('bolts-straight-in');
    expect(codes({ frame, shock: aShock({ sizeKey: '190x45' }) })[2]).toBe('wont-fit');
  });

  it('a refused stroke shows the travel it would give', () => {
    const { answers } = judge(aQuestion({ shock: aShock({ sizeKey: '210x50' }) }));
    const stroke = answers.find(({ check }) => check === 'stroke');
    expect(stroke?.figures.find(({ key }) => key === 'computed.travel')?.value).toBeCloseTo(
      (145 * 50) / 55,
      9,
    );
  });

  it('travel spacers are workshop work', () => {
    const { verdict, selfFitAllowed, work } = judge(
      aQuestion({
        frame: aFrame({ entries: [anEntry({ sizeKey: '210x52.5' })] }),
        shock: aShock({ spacedToKeys: ['210x52.5'] }),
      }),
    );
    expect([verdict, selfFitAllowed, work.map(({ id }) => id)]).toEqual([
      'fits-with-work',
      false,
      ['travel-spacer'],
    ]);
  });
});

describe('entries of a sheet', () => {
  const byYear = aFrame({
    entries: [
      anEntry({ id: 'old', sizeKey: '210x50', modelYears: { from: 2019, to: 2021 } }),
      anEntry({ id: 'new', modelYears: { from: 2022, to: 2024 } }),
    ],
  });

  it('for another year neither save nor condemn', () => {
    expect(codes({ frame: byYear, rider: aRider({ modelYear: 2023 }) })[2]).toBe('bolts-straight-in');
    expect(codes({ frame: byYear, rider: aRider({ modelYear: 2020 }) })[2]).toBe('wont-fit');
  });

  it('that differ by what was not told are not known; what no entry has is refused all the same', () => {
    expect(codes({ frame: byYear })).toEqual([
      'eye-to-eye-agrees',
      'stroke-depends-on-frame',
      'needs-an-answer',
    ]);
    expect(codes({ frame: byYear, shock: aShock({ sizeKey: '230x60' }) })[2]).toBe('wont-fit');
    const { answers } = judge(aQuestion({ frame: byYear }));
    expect(answers.flatMap(({ ask }) => ask)).toContainEqual({ fact: 'rider.modelYear', whom: 'rider' });
  });

  it('that say the same need no answer', () => {
    const same = { ...byYear, entries: byYear.entries.map((entry) => ({ ...entry, sizeKey: '210x55' })) };
    expect(codes({ frame: same })[2]).toBe('bolts-straight-in');
  });

  it('for the other chip position do not count, and an unknown position is asked for', () => {
    const frame = aFrame({
      entries: [
        anEntry({ id: 'low', sizeKey: '210x52.5', chip: 'low' }),
        anEntry({ id: 'high', chip: 'high' }),
      ],
    });
    expect(codes({ frame, rider: aRider({ chip: 'high' }) })[2]).toBe('bolts-straight-in');
    expect(codes({ frame, rider: aRider({ chip: 'low' }) })[2]).toBe('wont-fit');
    expect(codes({ frame })[2]).toBe('needs-an-answer');
  });

  it('of no use for this bike leave the size not known', () => {
    expect(codes({ frame: byYear, rider: aRider({ modelYear: 2030 }) })).toEqual(
      Array(2).fill('size-no-entry-for-this-bike').concat('needs-an-answer'),
    );
  });
});

describe('a frame that nobody listed', () => {
  const frame = aFrame({ origin: 'described', entries: [anEntry({ sizeKey: null })] });
  const printed = aPresentShock({ printedSizeKey: '210x55', soldWithBike: 'yes' });

  it('takes its size from the present shock, at best with work, marked as such', () => {
    expect(codes({ frame, present: printed })).toEqual([
      'eye-to-eye-from-your-shock',
      'stroke-from-your-shock',
      'fits-with-work',
    ]);
    const { answers } = judge(aQuestion({ frame, present: printed }));
    expect(answers[0]?.figures[0]?.source.label).toBe('From your shock, not from the maker');
  });

  it.each(['no', 'unsure', null] as const)(
    'is not known if the shock is sold with it: %s',
    (soldWithBike) => {
      expect(codes({ frame, present: { ...printed, soldWithBike } })[2]).toBe('needs-an-answer');
    },
  );

  it('is not known while the size is not settled', () => {
    expect(codes({ frame })).toEqual([unsettled, unsettled, 'needs-an-answer']);
    const eyeToEye = { mm: 210, tool: 'tape', awkward: true } as const;
    expect(codes({ frame, present: aPresentShock({ eyeToEye, soldWithBike: 'yes' }) })[2]).toBe(
      'needs-an-answer',
    );
  });

  it('refuses every other size', () => {
    expect(codes({ frame, present: printed, shock: aShock({ sizeKey: '210x52.5' }) })[2]).toBe('wont-fit');
  });
});

describe('a settled reading against the sheet', () => {
  const present = aPresentShock({ printedSizeKey: '210x52.5' });

  it('stands against every match until confirmed', () => {
    expect(codes({ present })[2]).toBe('needs-an-answer');
    expect(codes({ present, rider: aRider({ confirmsSheetSize: true }) })[2]).toBe('bolts-straight-in');
  });

  it('compares with the entries that speak for this bike', () => {
    const frame = aFrame({
      entries: [
        anEntry({ id: 's', sizeKey: '210x52.5', frameSizes: ['S'] }),
        anEntry({ id: 'm', frameSizes: ['M'] }),
      ],
    });
    expect(codes({ frame, present, rider: aRider({ frameSize: 'M' }) })[2]).toBe('needs-an-answer');
  });
});
