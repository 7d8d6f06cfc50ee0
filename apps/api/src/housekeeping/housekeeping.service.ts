import {
  Inject,
  Injectable,
  Logger,
  type BeforeApplicationShutdown,
  type OnApplicationBootstrap,
} from '@nestjs/common';
import { DataSource } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CONFIG, type Config } from '../config/config.js';

const hourMs = 3_600_000;

/** What we keep only as long as it is of use, in days. Sessions are pruned by their store. */
const rules = [
  { sql: 'DELETE FROM idempotency_keys WHERE created_at < $1', days: 7 },
  { sql: 'DELETE FROM sign_in_attempts WHERE at < $1', days: 2 },
  { sql: 'DELETE FROM password_resets WHERE expires_at < $1', days: 7 },
  // Addresses and texts of mails that have left; the mail log says that they did.
  { sql: `DELETE FROM outbox WHERE state = 'done' AND done_at < $1`, days: 30 },
] as const;

/** Throws away, once an hour, what nobody needs any more. */
@Injectable()
export class Housekeeping implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger(Housekeeping.name);
  private timer: NodeJS.Timeout | null = null;

  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  onApplicationBootstrap(): void {
    if (this.config.WORKER !== 'in-process') return;
    this.timer = setInterval(() => {
      this.run().catch((error: unknown) => this.logger.error({ err: error }, 'housekeeping failed'));
    }, hourMs);
    this.timer.unref();
  }

  beforeApplicationShutdown(): void {
    if (this.timer) clearInterval(this.timer);
  }

  async run(): Promise<void> {
    const now = this.clock.now().getTime();
    for (const { sql, days } of rules) await this.dataSource.query(sql, [new Date(now - days * 24 * hourMs)]);
  }
}
