import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';

import { startFakeMail, type FakeMail } from '@linkfell/fake-mail';
import { startFakeStripe, type FakeStripe } from '@linkfell/fake-stripe';
import type { Type } from '@nestjs/common';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import { DataSource, type EntityManager } from 'typeorm';

import { AppModule } from '../../src/app.module.js';
import { Clock } from '../../src/common/clock.js';
import { configureApp } from '../../src/configure-app.js';
import { OutboxRunner } from '../../src/outbox/outbox-runner.js';
import { createClient, type Client } from './client.js';
import { testConfig } from './config.js';
import { createTestDatabase } from './database.js';
import { TestClock } from './test-clock.js';

export interface TestApp {
  url: string;
  nest: NestExpressApplication;
  clock: TestClock;
  /** The payment service this application talks to; its webhooks come to this application. */
  stripe: FakeStripe;
  /** The mail server this application sends through. */
  mail: FakeMail;
  dataSource: DataSource;
  manager: EntityManager;
  /** A new browser without cookies. */
  client(): Client;
  /** Delivers everything that is due by the test's clock, and what follows from it. `@returns` how many. */
  drainOutbox(): Promise<number>;
  close(): Promise<void>;
}

export interface TestAppOptions {
  /** May still add to the application before it listens. */
  prepare?: (nest: NestExpressApplication) => void;
  /** Routes of the test's own, beside the real ones. */
  controllers?: Type[];
}

/**
 * The real application on a free port, with a database of its own.
 * @param env overrides single variables
 */
export async function startTestApp(
  env: Record<string, string> = {},
  { prepare, controllers = [] }: TestAppOptions = {},
): Promise<TestApp> {
  const database = await createTestDatabase();
  const clock = new TestClock();
  const [stripe, mail] = await Promise.all([startFakeStripe(), startFakeMail()]);
  const config = testConfig({
    DATABASE_URL: database.url,
    STRIPE_API_BASE: stripe.url,
    SMTP_URL: `smtp://127.0.0.1:${mail.smtpPort}`,
    ...env,
  });
  const testing = await Test.createTestingModule({ imports: [AppModule.with(config)], controllers })
    .overrideProvider(Clock)
    .useValue(clock)
    .compile();
  const nest = testing.createNestApplication<NestExpressApplication>({
    bodyParser: false,
    rawBody: true,
    bufferLogs: true,
  });
  configureApp(nest);
  prepare?.(nest);
  await nest.listen(0, '127.0.0.1');
  const server = nest.getHttpServer() as Server;
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  stripe.setWebhook(`${url}/api/webhooks/stripe`, config.STRIPE_WEBHOOK_SECRET);
  const dataSource = nest.get(DataSource);
  return {
    url,
    nest,
    clock,
    stripe,
    mail,
    dataSource,
    manager: dataSource.manager,
    client: () => createClient(server),
    drainOutbox: () => nest.get(OutboxRunner).drain(),
    close: async () => {
      await nest.close();
      await Promise.all([stripe.close(), mail.close()]);
      await database.drop();
    },
  };
}
