import { describe, expect, it } from 'vitest';

import { checkIds, type CheckId } from '../../src/answers.js';
import { judge } from '../../src/judge.js';
import { factsRead } from '../../src/rules/facts-read.js';
import { randomQuestion } from './random-question.js';
import { factsReadBy } from './record-facts.js';
import { seeded } from './seeded.js';

const random = seeded(5);
const questions = Array.from({ length: 3000 }, () => randomQuestion(random));
const isFact = (path: string): boolean => !path.endsWith('.source');

function everRead(check: CheckId): string[] {
  const all = new Set(questions.flatMap((question) => [...factsReadBy(check, question)]));
  return [...all].filter(isFact).sort();
}

describe('the table of facts read', () => {
  it.each(checkIds)('lists exactly what "%s" reads', (check) => {
    expect(everRead(check)).toEqual([...new Set(factsRead[check])].sort());
  });

  it('holds every fact that an answer asks for', () => {
    const all = new Set(Object.values(factsRead).flat());
    const asked = new Set(
      questions
        .flatMap((question) => judge(question, { full: true }).answers.flatMap(({ ask }) => ask))
        .map(({ fact }) => fact),
    );
    expect([...asked].filter((fact) => !all.has(fact))).toEqual([]);
    expect(asked.size).toBeGreaterThan(20);
  });
});
