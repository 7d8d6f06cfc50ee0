// Measurements on the demo scenario, load generator included; bounded in count. Started by `npm run bench`.
import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { createServer } from 'node:net';
import { fileURLToPath } from 'node:url';

import pg from 'pg';

const needed = (name) => {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set; npm run bench sets it`);
  return value;
};
const quantile = (list, q) =>
  [...list].sort((a, b) => a - b)[Math.min(list.length - 1, Math.floor(list.length * q))];

const freePort = () =>
  new Promise((resolve) => {
    const server = createServer().listen(0, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });

async function timed(count, ask) {
  const times = [];
  for (let i = 0; i < count; i += 1) {
    const start = performance.now();
    await ask(i);
    times.push(performance.now() - start);
  }
  return times;
}

const headers = {
  'X-Linkfell-Csrf': '1',
  'Sec-Fetch-Site': 'same-origin',
  'Content-Type': 'application/json',
};

/** Requests one after the other, so that a ratio of medians is a ratio of work done. */
async function benchApi(url, pid) {
  const frames = (await (await fetch(`${url}/api/frames`)).json()).frames;
  const riders = [];
  for (let i = 0; i < 60; i += 1) {
    const made = await fetch(`${url}/api/measure-ups`, { method: 'POST', headers, body: '{}' });
    const cookie = made.headers
      .getSetCookie()
      .map((each) => each.split(';')[0])
      .join('; ');
    const { id } = await made.json();
    const answers = {
      frame: {
        kind: 'listed',
        frameId: frames[i % frames.length].id,
        modelYear: null,
        frameSize: null,
        chip: null,
      },
      weight: { riderKg: 60 + (i % 40), kitKg: 3 },
      'bike-mass': { kg: 14 },
      style: { style: 'trail' },
      'remote-wish': { wants: false, acceptsExternal: null },
    };
    for (const [question, value] of Object.entries(answers)) {
      await fetch(`${url}/api/measure-ups/${id}/answers/${question}`, {
        method: 'PUT',
        headers: { ...headers, cookie },
        body: JSON.stringify({ state: 'known', value }),
      });
    }
    riders.push({ id, cookie });
  }
  let judged = 0;
  const matches = await timed(180, async (i) => {
    const { id, cookie } = riders[i % riders.length];
    const { counts } = await (
      await fetch(`${url}/api/measure-ups/${id}/matches`, { headers: { cookie } })
    ).json();
    judged += Object.values(counts).reduce((a, b) => a + b, 0);
  });
  const plain = await timed(180, async () => (await fetch(`${url}/api/towns`)).json());
  const ratio = quantile(plain, 0.5) / quantile(matches, 0.5);
  console.log(
    `matches: median ${quantile(matches, 0.5).toFixed(1)} ms, p95 ${quantile(matches, 0.95).toFixed(1)} ms, ${judged} sizes judged in 180 requests`,
  );
  console.log(
    `a plain route that reads one small table: median ${quantile(plain, 0.5).toFixed(1)} ms; ratio ${(100 * ratio).toFixed(0)} %`,
  );
  const { readFileSync } = await import('node:fs');
  const rss = /VmRSS:\s+(\d+)/.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1];
  console.log(`server process: ${Math.round(Number(rss) / 1024)} MB resident`);
}

async function main() {
  const admin = needed('TEST_DATABASE_ADMIN_URL');
  const name = `linkfell_bench_${randomBytes(4).toString('hex')}`;
  const client = new pg.Client({ connectionString: admin });
  await client.connect();
  await client.query(`CREATE DATABASE ${name} TEMPLATE ${needed('TEST_TEMPLATE_DB')}`);
  const database = new URL(admin);
  database.pathname = `/${name}`;
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const server = spawn(process.execPath, [fileURLToPath(new URL('../dist/main.js', import.meta.url))], {
    stdio: ['ignore', 'ignore', 'inherit'],
    env: {
      PATH: process.env.PATH,
      NODE_ENV: 'production',
      PORT: String(port),
      PUBLIC_URL: url,
      DATABASE_URL: database.toString(),
      SESSION_SECRET: randomBytes(32).toString('hex'),
      STRIPE_SECRET_KEY: 'sk_test_none',
      STRIPE_WEBHOOK_SECRET: 'whsec_none',
      STRIPE_API_BASE: 'http://127.0.0.1:9',
      SMTP_URL: 'smtp://127.0.0.1:9',
      LOG_LEVEL: 'silent',
      RATE_LIMIT_SCALE: '100000',
    },
  });
  try {
    for (let tries = 0; tries < 200; tries += 1) {
      if ((await fetch(`${url}/health/ready`).catch(() => null))?.ok) break;
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
    await benchApi(url, server.pid);
  } finally {
    const ended = new Promise((resolve) => server.once('exit', resolve));
    server.kill('SIGTERM');
    await ended;
    await client.query(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
    await client.end();
  }
}

await main();
