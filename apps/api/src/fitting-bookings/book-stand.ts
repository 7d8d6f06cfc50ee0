import { randomUUID } from 'node:crypto';

import type { EntityManager } from 'typeorm';

import { sqlState } from '../database/in-transaction.js';
import { toRangeText } from '../database/time-range.js';
import { Booking } from './booking.entity.js';

export interface WantedSlot {
  workshopId: string;
  /** Tried in this order. */
  standIds: readonly string[];
  start: Date;
  end: Date;
}

/**
 * Holds the first of the stands that is still free; two at once are told apart by the exclusion constraint.
 * @returns null when none is; the transaction of `manager` goes on either way
 */
export async function bookStand(
  manager: EntityManager,
  orderId: string,
  slot: WantedSlot,
  createdAt: Date,
): Promise<Booking | null> {
  for (const standId of slot.standIds) {
    await manager.query('SAVEPOINT stand');
    try {
      const booking = await manager.save(
        manager.create(Booking, {
          orderId,
          workshopId: slot.workshopId,
          standId,
          during: toRangeText(slot),
          state: 'held',
          calendarUid: `${randomUUID()}@linkfell`,
          createdAt,
        }),
      );
      await manager.query('RELEASE SAVEPOINT stand');
      return booking;
    } catch (error) {
      if (sqlState(error) !== '23P01') throw error;
      await manager.query('ROLLBACK TO SAVEPOINT stand');
    }
  }
  return null;
}
