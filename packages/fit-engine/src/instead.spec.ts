import { describe, expect, it } from 'vitest';

import { aFrame, aQuestion, aRider, aShock, anEntry, fact } from '../test/judging/questions.js';
import type { FitQuestion } from './facts.js';
import { fitsInstead, whatWouldFit } from './instead.js';
import { judge } from './judge.js';

const instead = (over: Partial<FitQuestion>) => {
  const question = aQuestion(over);
  return fitsInstead(question, judge(question, { full: true }));
};
const reservoir = { lengthMm: 90, diameterMm: 40, positionsDeg: [0], outlines: [] };

describe('fitsInstead', () => {
  it('says nothing of a shock that fits', () => expect(instead({})).toEqual([]));

  it('names the listed sizes that would let this very shock in', () => {
    const frame = aFrame({
      entries: [anEntry({ id: 'a', sizeKey: '210x50' }), anEntry({ id: 'b', sizeKey: '210x52.5' })],
    });
    expect(instead({ frame })).toEqual([
      { code: 'instead-listed-size', sizeKeys: ['210x50', '210x52.5'], enough: true },
    ]);
    const question = aQuestion({ frame });
    expect(whatWouldFit(question, judge(question))).toEqual(['A shock of size 210x50 or 210x52.5.']);
  });

  it('says of each of two reasons that it is not enough alone', () => {
    const frame = aFrame({ tunnelWidthMm: fact(50), reservoirStatement: fact('inline-only') });
    const both = instead({ frame, shock: aShock({ reservoir }) });
    expect(both).toEqual([
      { code: 'instead-inline', sizeKeys: [], enough: false },
      { code: 'instead-narrower', sizeKeys: [], enough: null },
    ]);
  });

  it('inline alone is enough where only the reservoir is refused', () => {
    const frame = aFrame({ reservoirStatement: fact('inline-only') });
    expect(instead({ frame, shock: aShock({ reservoir }) })).toEqual([
      { code: 'instead-inline', sizeKeys: [], enough: true },
    ]);
  });

  it('without its remote, where nothing holds it open', () => {
    const remote = { action: 'pull-to-open', line: 'cable', holdOpenPartId: null } as const;
    expect(instead({ shock: aShock({ remote }), rider: aRider({ wantsRemote: false }) })).toEqual([
      { code: 'instead-without-remote', sizeKeys: [], enough: true },
    ]);
  });
});
