import { describe, expect, it } from 'vitest';

import { aFrame, aPresentShock, aQuestion, aShock } from '../../test/judging/questions.js';
import type { PresentShock } from '../facts.js';
import { judge } from '../judge.js';

const kindFor = (present: Partial<PresentShock>): string | undefined => {
  const like = { diameterMm: 55, spring: 'air', bodyEndKind: 'eyelet' } as const;
  const question = aQuestion({
    frame: aFrame({ tunnelWidthMm: null }),
    present: aPresentShock({ ...like, ...present }),
    shock: aShock({ diameterMm: 55 }),
  });
  return judge(question).answers.find(({ check }) => check === 'diameter')?.answer;
};

describe('a can in a tunnel that nobody measured', () => {
  it('passes when no wider than the present shock of the same spring and body end', () => {
    expect(kindFor({})).toBe('pass');
  });

  it.each([
    { diameterMm: 54.9 },
    { diameterMm: null },
    { diameterMm: NaN },
    { spring: 'coil' },
    { spring: null },
    { bodyEndKind: 'trunnion' },
    { bodyEndKind: null },
  ] as const)('is not known with %j', (present) => expect(kindFor(present)).toBe('unknown'));
});
