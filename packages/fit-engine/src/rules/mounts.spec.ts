import { describe, expect, it } from 'vitest';

import { aFrame, anEntry, aPinEnd, aQuestion, aShock } from '../../test/judging/questions.js';
import type { FrameEnd, ShockMount } from '../facts.js';
import { judge } from '../judge.js';

const codeOf = (linkEnd: FrameEnd | null, shaftEnd: ShockMount): string | undefined => {
  const frame = aFrame({ entries: [anEntry({ linkEnd })] });
  const { answers } = judge(aQuestion({ frame, shock: aShock({ shaftEnd }) }), { full: true });
  return answers.find(({ check }) => check === 'mounts')?.code;
};
const pin = (diameterMm: number | null, uncertaintyMm = 0): FrameEnd =>
  aPinEnd({ mount: { kind: 'pin', diameterMm, widthMm: 24 }, uncertaintyMm });
const eye15: ShockMount = { kind: 'eyelet', boreMm: 15 };

describe('a pin', () => {
  it.each([
    ['published, equal', pin(15), 'mounts-agree'],
    ['published, a tenth off', pin(15.1), 'mounts-pin-differs'],
    ['read within two uncertainties', pin(15.4, 0.25), 'mounts-agree-by-your-reading'],
    ['read between two and four', pin(15.8, 0.25), 'mounts-reading-too-coarse'],
    ['read beyond four', pin(16.1, 0.25), 'mounts-pin-differs'],
    ['read by caliper in the frame', pin(15.2, 0.559), 'mounts-agree-by-your-reading'],
    ['read by ruler, however near', pin(15, 0.7), 'mounts-reading-too-coarse'],
    ['read by tape, however near', pin(15, 1.2), 'mounts-reading-too-coarse'],
    ['not read', pin(null), 'mounts-not-measured'],
    ['of unknown uncertainty', pin(15, NaN), 'mounts-reading-too-coarse'],
    ['of impossible uncertainty', pin(15, -1), 'mounts-pin-differs'],
  ] as const)('%s', (_what, end, code) => expect(codeOf(end, eye15)).toBe(code));

  it('that nobody described is not known', () => expect(codeOf(null, eye15)).toBe('mounts-not-known'));
});

describe('a bolt for a bearing eye', () => {
  const eye: ShockMount = { kind: 'bearing-eye', boltMm: 8, widthMm: 30 };
  const bolt = (boltMm: number | null, widthMm: number | null): FrameEnd =>
    aPinEnd({ mount: { kind: 'bearing-bolt', boltMm, widthMm } });

  it.each([
    [8, 30, 'mounts-agree'],
    [10, 30, 'mounts-bearing-differs'],
    [8, 28, 'mounts-bearing-differs'],
    [8, null, 'mounts-not-measured'],
    [10, null, 'mounts-bearing-differs'],
  ])('of %s mm, %s wide', (boltMm, widthMm, code) => {
    const frame = aFrame({ entries: [anEntry({ linkEnd: bolt(boltMm, widthMm) })] });
    const question = aQuestion({ frame, shock: aShock({ shaftEnd: eye }) });
    const { answers } = judge(question, { full: true });
    expect(answers.find(({ check }) => check === 'mounts')?.code).toBe(code);
  });
});
