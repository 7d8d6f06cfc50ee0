import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';

export interface OutboxOptions {
  /** A second message with the same key is not written: the first one stands. */
  dedupeKey?: string;
  /** Not before this instant; now when left out. */
  runAt?: Date;
}

/** Name of the queue task that wakes the outbox. */
export const outboxTask = 'outbox';

/** Writes what must leave the process into the transaction that decided it, so that both happen or neither. */
@Injectable()
export class OutboxService {
  constructor(private readonly clock: Clock) {}

  /**
   * Adds a message to the transaction of `manager`. Its handler runs after the commit, at least once.
   * @returns the message's id, or null if `dedupeKey` was there already
   */
  async add(
    manager: EntityManager,
    topic: string,
    payload: object,
    { dedupeKey, runAt = this.clock.now() }: OutboxOptions = {},
  ): Promise<string | null> {
    // clock_timestamp(), not now(): messages of one transaction keep the order in which they were added.
    const rows: { id: string }[] = await manager.query(
      `INSERT INTO outbox (topic, payload, dedupe_key, next_try_at, created_at)
       VALUES ($1, $2, $3, $4, clock_timestamp())
       ON CONFLICT (dedupe_key) DO NOTHING
       RETURNING id`,
      [topic, JSON.stringify(payload), dedupeKey ?? null, runAt],
    );
    const id = rows[0]?.id;
    if (id === undefined) return null;
    await this.wake(manager, id, runAt);
    return id;
  }

  /** Asks the queue to look at the message at that instant; looking too often does no harm. */
  async wake(manager: EntityManager, id: string, at: Date): Promise<void> {
    await manager.query(
      `SELECT 1 FROM graphile_worker.add_job($1, json_build_object('id', $2::text), run_at := $3, max_attempts := 1, job_key := $4)`,
      [outboxTask, id, at, `outbox:${id}`],
    );
  }
}
