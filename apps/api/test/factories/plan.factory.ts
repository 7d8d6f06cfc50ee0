import type { EntityManager } from 'typeorm';

import { Plan } from '../../src/plans/plan.entity.js';
import { createShockSize } from './catalogue.factory.js';
import { createMeasureUp } from './measure-up.factory.js';

/** A self-fit plan with nothing chosen yet. */
export async function createPlan(manager: EntityManager, overrides: Partial<Plan> = {}): Promise<Plan> {
  const measureUpId = overrides.measureUpId ?? (await createMeasureUp(manager)).id;
  const shockItemId = overrides.shockItemId ?? (await createShockSize(manager)).itemId;
  return manager.save(
    manager.create(Plan, {
      measureUpId,
      shockItemId,
      choices: { fit: 'self', listings: {}, workshopId: null, slotStart: null },
      ...overrides,
    }),
  );
}
