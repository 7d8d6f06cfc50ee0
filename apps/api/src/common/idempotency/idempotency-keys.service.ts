import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';

import { Clock } from '../clock.js';
import { CommonException } from '../problems/problem.exception.js';
import { IdempotencyKey } from './idempotency-key.entity.js';

/** A request that has not answered by then has died with its process; the next one with its key takes over. */
const stuckMs = 60_000;

export interface KeyedRequest {
  actor: string;
  operation: string;
  key: string;
  requestHash: string;
}

@Injectable()
export class IdempotencyKeys {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /**
   * Claims the key for this request.
   * @returns the stored answer of an earlier one, or null when this one has to do the work
   * @throws CommonException "idempotency-key-reused" (422), "still-at-work" (409)
   */
  async begin(request: KeyedRequest): Promise<{ status: number; response: unknown } | null> {
    const { actor, operation, key, requestHash } = request;
    const now = this.clock.now();
    const claimed: unknown[] = await this.dataSource.query(
      `INSERT INTO idempotency_keys AS known (actor, operation, key, request_hash, created_at)
       VALUES ($1, $2, $3, $4, $5)
       ON CONFLICT (actor, operation, key) DO UPDATE SET created_at = $5
         WHERE known.status IS NULL AND known.request_hash = $4 AND known.created_at <= $6
       RETURNING key`,
      [actor, operation, key, requestHash, now, new Date(now.getTime() - stuckMs)],
    );
    if (claimed.length > 0) return null;
    const known = await this.dataSource.manager.findOneBy(IdempotencyKey, { actor, operation, key });
    if (known && known.requestHash !== requestHash) throw new CommonException('idempotency-key-reused');
    if (!known || known.status === null)
      throw new CommonException('still-at-work', { headers: { 'Retry-After': '1' } });
    return { status: known.status, response: known.response };
  }

  async finish({ actor, operation, key }: KeyedRequest, status: number, response: unknown): Promise<void> {
    await this.dataSource.query(
      `UPDATE idempotency_keys SET status = $4, response = $5 WHERE actor = $1 AND operation = $2 AND key = $3`,
      [actor, operation, key, status, JSON.stringify(response ?? null)],
    );
  }

  /** What failed changed nothing and may be tried again with the same key. */
  async release({ actor, operation, key }: KeyedRequest): Promise<void> {
    await this.dataSource.query(
      `DELETE FROM idempotency_keys WHERE actor = $1 AND operation = $2 AND key = $3 AND status IS NULL`,
      [actor, operation, key],
    );
  }
}
