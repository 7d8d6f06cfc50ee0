import { describe, expect, it } from 'vitest';

import { aFrame, aQuestion, aRider, aShock, fact } from '../../test/judging/questions.js';
import type { CheckId } from '../answers.js';
import type { FitQuestion, RiderFacts, WeightLimit } from '../facts.js';
import { judge } from '../judge.js';

const codeOf = (check: CheckId, over: Partial<FitQuestion>): string | undefined =>
  judge(aQuestion(over), { full: true }).answers.find((given) => given.check === check)?.code;

describe('rider weight', () => {
  const limited = (limit: WeightLimit, rider: Partial<RiderFacts> = {}): string | undefined =>
    codeOf('rider-weight', { shock: aShock({ riderLimit: fact(limit) }), rider: aRider(rider) });

  it.each([
    ['rider', 78, 77.9],
    ['rider-and-kit', 83, 82.9],
    ['with-bike', 97.5, 97.4],
  ] as const)('counts on its basis, %s: %s passes, %s does not', (basis, at, below) => {
    expect(limited({ kg: at, basis })).toBe('rider-weight-within');
    expect(limited({ kg: below, basis })).toBe('rider-weight-over');
  });

  it('at the limit passes in fractions that binary cannot hold', () => {
    expect(limited({ kg: 0.3 + 80, basis: 'rider-and-kit' }, { riderKg: 80.1, kitKg: 0.2 })).toBe(
      'rider-weight-within',
    );
  });

  it('without a basis is not known within the bike’s mass of the limit', () => {
    expect(limited({ kg: 97.5, basis: null })).toBe('rider-weight-within');
    expect(limited({ kg: 97.4, basis: null })).toBe('rider-weight-basis-not-printed');
    expect(limited({ kg: 83, basis: null })).toBe('rider-weight-basis-not-printed');
    expect(limited({ kg: 82.9, basis: null })).toBe('rider-weight-over');
  });

  it('not told is not known where a limit is printed, a remark where none is', () => {
    expect(limited({ kg: 200, basis: 'rider' }, { riderKg: null })).toBe('rider-weight-not-known');
    expect(codeOf('rider-weight', {})).toBe('rider-weight-no-limit');
  });

  it('holds the frame’s limit as well', () => {
    const frame = aFrame({ riderLimit: fact({ kg: 70, basis: 'rider' }) });
    expect(
      codeOf('rider-weight', { frame, shock: aShock({ riderLimit: fact({ kg: 120, basis: 'rider' }) }) }),
    ).toBe('rider-weight-over');
  });
});
