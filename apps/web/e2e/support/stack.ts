import { spawn, type ChildProcess } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { createServer, type AddressInfo } from 'node:net';
import { fileURLToPath } from 'node:url';
import { test as base, expect } from '@playwright/test';
import { startFakeMail, type FakeMail } from '@linkfell/fake-mail';
import { startFakeStripe, type FakeStripe } from '@linkfell/fake-stripe';
import pg from 'pg';

export interface Stack {
  url: string;
  mail: FakeMail;
  stripe: FakeStripe;
  sql(text: string, parameters?: unknown[]): Promise<Record<string, unknown>[]>;
}

const needed = (name: string): string => {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set; the test command sets it, see DEVELOPERS.md`);
  return value;
};

const freePort = (): Promise<number> =>
  new Promise((resolve, reject) => {
    const server = createServer().once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address() as AddressInfo;
      server.close(() => resolve(port));
    });
  });

const fromHere = (path: string): string => fileURLToPath(new URL(path, import.meta.url));

async function ready(url: string, server: ChildProcess): Promise<void> {
  for (let tries = 0; tries < 200; tries += 1) {
    if (server.exitCode !== null) throw new Error(`the server ended with ${server.exitCode}`);
    const answer = await fetch(`${url}/health/ready`).catch(() => null);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Error('the server did not become ready');
}

/** The built product on a database of its own, with real stand-ins for payment and mail. */
async function startStack(): Promise<Stack & { stop(): Promise<void> }> {
  const admin = needed('TEST_DATABASE_ADMIN_URL');
  const name = `linkfell_web_${randomBytes(5).toString('hex')}`;
  const asAdmin = async (text: string) => {
    const client = new pg.Client({ connectionString: admin });
    await client.connect();
    await client.query(text);
    await client.end();
  };
  await asAdmin(`CREATE DATABASE ${name} TEMPLATE ${needed('TEST_TEMPLATE_DB')}`);
  const database = new URL(admin);
  database.pathname = `/${name}`;
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const secret = 'whsec_browser_tests';
  const [stripe, mail] = await Promise.all([
    startFakeStripe({ webhookUrl: `${url}/api/webhooks/stripe`, webhookSecret: secret }),
    startFakeMail(),
  ]);
  const server = spawn(process.execPath, [fromHere('../../../api/dist/main.js')], {
    stdio: 'inherit',
    env: {
      PATH: process.env.PATH,
      NODE_ENV: 'production',
      PORT: String(port),
      PUBLIC_URL: url,
      DATABASE_URL: database.toString(),
      SESSION_SECRET: randomBytes(32).toString('hex'),
      STRIPE_SECRET_KEY: 'sk_test_linkfell',
      STRIPE_WEBHOOK_SECRET: secret,
      STRIPE_API_BASE: stripe.url,
      SMTP_URL: `smtp://127.0.0.1:${mail.smtpPort}`,
      WEB_DIST: fromHere('../../dist'),
      LOG_LEVEL: 'error',
      RATE_LIMIT_SCALE: '1000',
    },
  });
  await ready(url, server);
  const pool = new pg.Pool({ connectionString: database.toString(), max: 2 });
  return {
    url,
    mail,
    stripe,
    sql: async (text, parameters) => (await pool.query<Record<string, unknown>>(text, parameters)).rows,
    stop: async () => {
      await pool.end();
      const ended = new Promise((resolve) => server.once('exit', resolve));
      server.kill('SIGTERM');
      await ended;
      await Promise.all([stripe.close(), mail.close()]);
      await asAdmin(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
    },
  };
}

export const test = base.extend<object, { stack: Stack }>({
  stack: [
    async ({ browserName: _ }, use) => {
      const stack = await startStack();
      await use(stack);
      await stack.stop();
    },
    { scope: 'worker', timeout: 60_000 },
  ],
  baseURL: async ({ stack }, use) => {
    await use(stack.url);
  },
});
export { expect };
