import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';

import type { CheckAnswer } from '../../src/answers.js';
import { fitsInstead, tellInstead, whatWouldFit } from '../../src/instead.js';
import { judge } from '../../src/judge.js';
import { insteadSentences } from '../../src/messages/instead.en.js';
import { labels } from '../../src/messages/labels.en.js';
import { reasonCodes } from '../../src/messages/reason-codes.js';
import { sentences } from '../../src/messages/sentences.en.js';
import { tell } from '../../src/messages/tell.js';
import { randomQuestion } from './random-question.js';
import { seeded } from './seeded.js';

const src = join(import.meta.dirname, '../../src');
const random = seeded(11);
const judged = Array.from({ length: 6000 }, () => {
  const question = randomQuestion(random);
  return { question, judgement: judge(question, { full: true }) };
});
const answers: CheckAnswer[] = judged.flatMap(({ judgement }) => [...judgement.answers]);

/** Codes written in the rules, between quotes: what the engine could give. */
function codesInRules(): Set<string> {
  const files = [...readdirSync(join(src, 'rules')).map((name) => join('rules', name)), 'advice.ts'];
  const texts = files
    .filter((name) => name.endsWith('.ts') && !name.endsWith('.spec.ts'))
    .map((name) => readFileSync(join(src, name), 'utf8'));
  return new Set(
    texts.flatMap((text) => [...text.matchAll(/'([a-z][a-z-]+)'/g)].map(([, code]) => code ?? '')),
  );
}

describe('the catalogue of sentences', () => {
  it('has no sentence that no rule gives', () => {
    const inRules = codesInRules();
    expect(reasonCodes.filter((code) => !inRules.has(code))).toEqual([]);
  });

  it('has a sentence for every code that comes up', () => {
    const given = new Set(
      judged.flatMap(({ judgement }) => [...judgement.answers, ...judgement.advice]).map(({ code }) => code),
    );
    expect([...given].filter((code) => !(code in sentences))).toEqual([]);
    expect(given.size).toBeGreaterThan(reasonCodes.length * 0.9);
  });

  it('never misses a figure that its sentence names', () => {
    const lacking = answers.filter((answer) => tell(answer).short.includes('a figure we do not have'));
    expect(lacking.map(({ code }) => code)).toEqual([]);
  });

  it('has a label for every figure', () => {
    const keys = new Set(
      judged
        .flatMap(({ judgement }) => [...judgement.answers, ...judgement.advice])
        .flatMap(({ figures }) => figures.map(({ key }) => key)),
    );
    expect([...keys].filter((key) => !(key in labels))).toEqual([]);
  });

  it.each(Object.entries({ ...sentences, ...insteadSentences }))(
    '%s is one plain sentence',
    (_code, sentence) => {
      expect(sentence).toMatch(/^(?:[A-Z]|\{)[^!?]*\.$/);
      expect(sentence.replace(/\{[^}]+\}/g, '').slice(0, -1)).not.toMatch(/\.\s/);
    },
  );

  it('tells no figure that is not a number', () => {
    const texts = judged
      .flatMap(({ judgement }) => judgement.answers.map(tell))
      .flatMap(({ short, figures }) => [short, ...figures.map(({ text }) => text)]);
    expect(texts.filter((text) => /NaN|Infinity|undefined|null/.test(text))).toEqual([]);
  });
});

describe('what would fit instead', () => {
  it('is asked only of a refused shock, and says something for every reason but readings and hardware', () => {
    for (const { question, judgement } of judged.slice(0, 1500)) {
      const instead = fitsInstead(question, judgement);
      const reasons = judgement.answers.filter(({ answer }) => answer === 'fail');
      const sayable = question.frame.origin === 'sheet' && reasons.length > 0;
      if (judgement.verdict !== 'wont-fit') expect(instead).toEqual([]);
      else if (sayable) expect(instead.length).toBeGreaterThan(0);
      expect(whatWouldFit(question, judgement)).toEqual(instead.map(tellInstead));
    }
  });

  it('puts what is enough by itself first, and that is true', () => {
    let tried = 0;
    for (const { question, judgement } of judged.slice(0, 1500)) {
      const [first] = fitsInstead(question, judgement);
      if (first?.code !== 'instead-listed-size' || !first.enough) continue;
      for (const sizeKey of first.sizeKeys) {
        const shock = { ...question.shock, sizeKey, spacedToKeys: [] };
        expect(judge({ ...question, shock }).verdict).not.toBe('wont-fit');
        tried += 1;
      }
    }
    expect(tried).toBeGreaterThan(10);
  });
});
