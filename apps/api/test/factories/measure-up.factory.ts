import type { QuestionKey, StoredAnswer } from '@linkfell/contracts';
import type { EntityManager } from 'typeorm';

import { MeasureUpAnswer } from '../../src/measure-ups/measure-up-answer.entity.js';
import { MeasureUp } from '../../src/measure-ups/measure-up.entity.js';

/** A measure-up with the given answers, each at its own revision. */
export async function createMeasureUp(
  manager: EntityManager,
  answers: Partial<Record<QuestionKey, StoredAnswer>> = {},
  overrides: Partial<MeasureUp> = {},
): Promise<MeasureUp> {
  const given = Object.entries(answers) as [QuestionKey, StoredAnswer][];
  const measureUp = await manager.save(manager.create(MeasureUp, { revision: given.length, ...overrides }));
  for (const [index, [question, value]] of given.entries()) {
    await manager.insert(MeasureUpAnswer, {
      measureUpId: measureUp.id,
      question,
      value,
      revision: index + 1,
    });
  }
  return measureUp;
}
