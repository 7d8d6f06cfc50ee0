import fc from 'fast-check';
import { expect, it } from 'vitest';

import { judge } from '../../src/judge.js';
import { factsRead } from '../../src/rules/facts-read.js';
import { randomQuestion } from './random-question.js';
import { seeded } from './seeded.js';

it('no check asks which way an eye points: the shaft turns', () => {
  for (const path of Object.values(factsRead).flat()) expect(path).not.toMatch(/direction|angle|deg$/i);
});

it('eyes at any angle to each other are judged alike', () => {
  const angle = fc.integer({ min: 0, max: 359 });
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 2 ** 31 - 1 }), angle, angle, (seed, a, b) => {
      const question = randomQuestion(seeded(seed));
      const { shock } = question;
      // What a catalogue may say of the eyes beside their bores rides along and changes nothing.
      const bodyEnd = { ...shock.bodyEnd, directionDeg: a };
      const shaftEnd = { ...shock.shaftEnd, directionDeg: b };
      expect(judge({ ...question, shock: { ...shock, bodyEnd, shaftEnd } }, { full: true })).toEqual(
        judge(question, { full: true }),
      );
    }),
    { numRuns: 1500, seed: 9 },
  );
});
