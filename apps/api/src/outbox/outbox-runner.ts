import { Injectable, Logger } from '@nestjs/common';
import { DataSource } from 'typeorm';

import { Clock } from '../common/clock.js';
import { mask } from '../common/logging/mask.js';
import { backoffMs, maxAttempts } from './backoff.js';
import { GiveUp } from './outbox-handler.js';
import { OutboxMessage } from './outbox-message.entity.js';
import { OutboxRegistry } from './outbox-registry.js';
import { OutboxService } from './outbox.service.js';

/** A process that died with a message in hand holds it no longer than this. */
export const leaseMs = 2 * 60_000;

export type OutboxOutcome = 'done' | 'retry' | 'dead' | 'not-due';

type Ending = Partial<Pick<OutboxMessage, 'state' | 'doneAt' | 'nextTryAt' | 'lastError'>>;

/** Takes messages, one lease each, and hands them to their handlers. */
@Injectable()
export class OutboxRunner {
  private readonly logger = new Logger(OutboxRunner.name);

  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly registry: OutboxRegistry,
    private readonly outbox: OutboxService,
  ) {}

  /** Delivers one message if it is due and nobody else has it. */
  async run(id: string): Promise<OutboxOutcome> {
    const message = await this.take(id);
    if (!message) return 'not-due';
    const { topic, attempts: attempt } = message;
    try {
      await this.registry.handlerOf(topic)(message.payload, { id, topic, attempt });
    } catch (error) {
      return this.failed(message, error);
    }
    await this.settle(message, { state: 'done', doneAt: this.clock.now(), lastError: null });
    return 'done';
  }

  /** Delivers what is due, oldest first. @returns how many messages were taken */
  async runDue(limit = 100): Promise<number> {
    const now = this.clock.now();
    const due: { id: string }[] = await this.dataSource.query(
      `SELECT id FROM outbox
       WHERE state = 'pending' AND next_try_at <= $1 AND (lease_until IS NULL OR lease_until <= $1)
       ORDER BY next_try_at, created_at LIMIT $2`,
      [now, limit],
    );
    let taken = 0;
    for (const { id } of due) if ((await this.run(id)) !== 'not-due') taken += 1;
    return taken;
  }

  /** Delivers until nothing is due any more, including what handlers add on the way. */
  async drain(): Promise<number> {
    let total = 0;
    for (let taken = await this.runDue(); taken > 0; taken = await this.runDue()) total += taken;
    return total;
  }

  private async take(id: string): Promise<OutboxMessage | null> {
    const now = this.clock.now();
    const result: { raw: { id: string }[] } = await this.dataSource
      .createQueryBuilder()
      .update(OutboxMessage)
      .set({ leaseUntil: new Date(now.getTime() + leaseMs), attempts: () => 'attempts + 1' })
      .where(
        `id = (SELECT id FROM outbox WHERE id = :id AND state = 'pending' AND next_try_at <= :now
               AND (lease_until IS NULL OR lease_until <= :now) FOR UPDATE SKIP LOCKED)`,
        { id, now },
      )
      .returning('id')
      .execute();
    if (result.raw.length === 0) return null;
    return this.dataSource.manager.findOneByOrFail(OutboxMessage, { id });
  }

  private async failed(message: OutboxMessage, error: unknown): Promise<OutboxOutcome> {
    const { id, topic, attempts } = message;
    const lastError = mask(error instanceof Error ? error.message : String(error)).slice(0, 500);
    const dead = error instanceof GiveUp || attempts >= maxAttempts;
    if (dead) {
      this.logger.error({ err: error, outboxId: id, topic, attempts }, 'message given up');
      await this.settle(message, { state: 'dead', lastError });
      return 'dead';
    }
    this.logger.warn({ outboxId: id, topic, attempts, reason: lastError }, 'message will be tried again');
    const nextTryAt = new Date(this.clock.now().getTime() + backoffMs(attempts));
    await this.settle(message, { nextTryAt, lastError });
    await this.outbox.wake(this.dataSource.manager, id, nextTryAt);
    return 'retry';
  }

  /** Only the holder of the last lease may say how it ended: attempts count the leases. */
  private async settle({ id, attempts }: OutboxMessage, change: Ending): Promise<void> {
    await this.dataSource.manager.update(
      OutboxMessage,
      { id, attempts, state: 'pending' },
      { ...change, leaseUntil: null },
    );
  }
}
