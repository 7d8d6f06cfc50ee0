import {
  Inject,
  Injectable,
  Logger as NestLogger,
  type BeforeApplicationShutdown,
  type OnApplicationBootstrap,
} from '@nestjs/common';
import { Logger, run, type Runner } from 'graphile-worker';
import { Pool } from 'pg';

import { CONFIG, type Config } from '../config/config.js';
import { OutboxRunner } from './outbox-runner.js';
import { outboxTask } from './outbox.service.js';

const sweepMs = 30_000;

/**
 * Works the outbox inside the API process: the queue wakes it for each message, and a sweep finds what a killed
 * process left behind. Stops after the message in hand.
 */
@Injectable()
export class OutboxWorker implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new NestLogger(OutboxWorker.name);
  private pool: Pool | null = null;
  private queue: Runner | null = null;
  private timer: NodeJS.Timeout | null = null;
  private sweeping: Promise<unknown> = Promise.resolve();

  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly runner: OutboxRunner,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    if (this.config.WORKER === 'in-process') await this.start();
  }

  async beforeApplicationShutdown(): Promise<void> {
    if (this.timer) clearInterval(this.timer);
    this.timer = null;
    await this.queue?.stop();
    this.queue = null;
    await this.sweeping;
    await this.pool?.end();
    this.pool = null;
  }

  async start(): Promise<void> {
    this.pool = new Pool({
      connectionString: this.config.DATABASE_URL,
      max: 4,
      application_name: 'linkfell-worker',
    });
    const lost = (error: Error): void => this.logger.warn({ err: error }, 'connection lost');
    this.pool.on('error', lost).on('connect', (client) => client.on('error', lost));
    this.queue = await run({
      pgPool: this.pool,
      taskList: {
        [outboxTask]: async (payload) => {
          await this.runner.run((payload as { id: string }).id);
        },
      },
      concurrency: 2,
      pollInterval: 1_000,
      noHandleSignals: true,
      logger: new Logger((scope) => (level, message) => {
        if (level === 'error') this.logger.error({ scope, queue: message }, 'queue');
        else if (level === 'warning') this.logger.warn({ scope, queue: message }, 'queue');
      }),
    });
    this.timer = setInterval(() => this.sweep(), sweepMs);
    this.timer.unref();
    this.sweep();
  }

  private sweep(): void {
    this.sweeping = this.sweeping
      .then(() => this.runner.runDue())
      .catch((error: unknown) => this.logger.error({ err: error }, 'sweep failed'));
  }
}
