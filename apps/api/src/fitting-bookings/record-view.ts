import type { FittingRecordView } from '@linkfell/contracts';
import type { EntityManager } from 'typeorm';

import { FittingRecord } from './fitting-record.entity.js';

/** What was recorded at the fitting, or null. */
export async function recordView(
  manager: EntityManager,
  bookingId: string,
): Promise<FittingRecordView | null> {
  const found = await manager.findOne(FittingRecord, { where: { bookingId }, relations: { mechanic: true } });
  return (
    found && {
      record: found.record,
      mechanic: found.mechanic.displayName,
      savedAt: found.savedAt.toISOString(),
      fittedAt: found.fittedAt?.toISOString() ?? null,
      version: found.version,
    }
  );
}
