import { questionKeys } from '@linkfell/contracts';
import { factsRead } from '@linkfell/fit-engine';

import { factOrigins, questionForFact } from './fact-origins.js';

const catalogue = /^(shock|sale)\./;

describe('where facts come from', () => {
  const read = [...new Set(Object.values(factsRead).flat())];

  it.each(read.filter((fact) => !catalogue.test(fact)))('%s has a question or a sheet field', (fact) => {
    expect(factOrigins[fact]).toBeDefined();
  });

  it('names only questions that exist, and leads the rider to them', () => {
    for (const [fact, origin] of Object.entries(factOrigins)) {
      if (!('question' in origin)) continue;
      expect(questionKeys).toContain(origin.question);
      expect(questionForFact(fact)).toBe(origin.question);
    }
    expect(questionForFact('frame.springStatement')).toBeNull();
  });
});
