// The API under load on a catalogue of full size; started by `npm run bench`. What is measured: README.md beside it.
import { randomBytes } from 'node:crypto';
import { cpus } from 'node:os';

import { startFakeStripe } from '@linkfell/fake-stripe';
import pg from 'pg';

import { benchCheckout } from './checkout.mjs';
import { counted, fillFrames, fillListings, fillSizes } from './fill.mjs';
import { quantile, underLoad } from './load.mjs';
import { drawRiders } from './riders.mjs';
import { apiMemory } from '../../../packages/launcher/src/servers.mjs';
import { fromHere, startServer } from './servers.mjs';

const needed = (name) => {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set; npm run bench sets it`);
  return value;
};
/** Smaller for a quick try: BENCH_SCALE=0.1. What is printed says the size that was measured. */
const scale = Number(process.env.BENCH_SCALE ?? 1);
const size = {
  sheets: 2000 * scale,
  sizes: Math.max(200, 5000 * scale),
  listings: 100_000 * scale,
  riders: 1000 * scale,
  orders: Math.max(10, 100 * scale),
};
const secret = randomBytes(32).toString('hex');
const percent = (ratio) => `${(100 * ratio).toFixed(1)} %`;

const apiSettings = (databaseUrl, stripeUrl) => ({
  DATABASE_URL: databaseUrl,
  SESSION_SECRET: secret,
  STRIPE_SECRET_KEY: 'sk_test_linkfell',
  STRIPE_WEBHOOK_SECRET: 'whsec_none',
  STRIPE_API_BASE: stripeUrl,
  SMTP_URL: 'smtp://127.0.0.1:9',
  LOG_LEVEL: 'silent',
  RATE_LIMIT_SCALE: '1000000',
});

const matchesOf = (riders) =>
  riders.map(({ id, cookie }) => ({
    method: 'GET',
    path: `/api/measure-ups/${id}/matches?limit=20`,
    headers: { cookie },
  }));

/** One server at a time is under load, each warmed by requests of its own first. */
async function measured(start, warming, requests) {
  const server = await start();
  try {
    await underLoad(server.url, warming, { pid: server.pid });
    return await underLoad(server.url, requests, { pid: server.pid });
  } finally {
    await server.stop();
  }
}

/** How many sizes are judged for a rider, and how many of them may fit. */
async function judgedFor(startApi, riders) {
  const server = await startApi();
  try {
    let [judged, mayFit] = [0, 0];
    for (const { id, cookie } of riders) {
      const answer = await fetch(`${server.url}/api/measure-ups/${id}/matches?limit=20`, {
        headers: { cookie },
      });
      const { counts } = await answer.json();
      const all = Object.values(counts).reduce((a, b) => a + b, 0);
      judged += all;
      mayFit += all - counts['wont-fit'];
    }
    return { judged: Math.round(judged / riders.length), mayFit: Math.round(mayFit / riders.length) };
  } finally {
    await server.stop();
  }
}

async function bench(client, databaseUrl, stripeUrl) {
  const startApi = () =>
    startServer('../dist/main.js', '/health/ready', apiSettings(databaseUrl, stripeUrl), apiMemory);
  console.log(`\nThe API under load (${cpus().length} cores of ${cpus()[0]?.model ?? 'an unknown kind'})`);
  await fillFrames(client, size.sheets);
  await fillSizes(client, size.sizes);
  const all = await drawRiders(client, size.riders + Math.ceil(size.riders / 10), secret);
  const [riders, others] = [all.slice(0, size.riders), all.slice(size.riders)];
  await fillListings(client, size.listings / 10);
  const few = await counted(client);
  const withFew = await measured(startApi, matchesOf(others), matchesOf(riders));
  await fillListings(client, size.listings);
  const many = await counted(client);
  const withMany = await measured(startApi, matchesOf(others), matchesOf(riders));
  const { judged, mayFit } = await judgedFor(startApi, riders.slice(0, 50));

  const { rows } = await client.query('SELECT id FROM listings ORDER BY random() LIMIT $1', [size.riders]);
  // So fast that it needs ten times the requests to be measured at all.
  const byKey = Array.from({ length: 10 * size.riders }, (_, i) => rows[i % rows.length]).map(({ id }) => ({
    method: 'GET',
    path: `/listings/${id}`,
  }));
  const startBare = () =>
    startServer('bare-route.mjs', `/listings/${rows[0].id}`, { DATABASE_URL: databaseUrl });
  const bare = await measured(startBare, byKey.slice(0, size.riders), byKey);

  console.log(
    `  catalogue       ${many.sheets} frame sheets, ${many.sizes} sizes, ${many.listings} listings; ${riders.length} riders, each asked once`,
  );
  console.log(
    `  matches         ${withMany.perSecond.toFixed(0)} a second, median ${quantile(withMany.times, 0.5).toFixed(1)} ms, p95 ${quantile(withMany.times, 0.95).toFixed(1)} ms; ${judged} sizes judged for a rider, of which ${mayFit} may fit`,
  );
  console.log(
    `  bare route      ${bare.perSecond.toFixed(0)} a second, p95 ${quantile(bare.times, 0.95).toFixed(1)} ms`,
  );
  console.log(
    `  ratio           ${percent(withMany.perSecond / bare.perSecond)} of the bare route (aim: at least 10 %)`,
  );
  console.log(
    `  ten times more  ${few.listings} to ${many.listings} listings cost ${(withFew.perSecond / withMany.perSecond).toFixed(2)} times the time (aim: at most 1.3)`,
  );
  console.log(`  memory          ${withMany.mostMb} MB resident at most (aim: below 300)`);

  const api = await startServer('../dist/main.js', '/health/ready', apiSettings(databaseUrl, stripeUrl), [
    ...apiMemory,
    '--import',
    fromHere('watch-transactions.mjs'),
  ]);
  try {
    const { orders, statements, oursMs, rawMs, ratio } = await benchCheckout(
      api,
      riders,
      databaseUrl,
      size.orders,
    );
    console.log(
      `  checkout        ${orders} orders, ${statements} statements in one transaction, ${oursMs.toFixed(1)} ms; the plain client ${rawMs.toFixed(1)} ms: ${percent(ratio)} (aim: at least 25 %)`,
    );
  } finally {
    await api.stop();
  }
}

async function main() {
  const admin = needed('TEST_DATABASE_ADMIN_URL');
  const name = `linkfell_bench_${randomBytes(4).toString('hex')}`;
  const adminClient = new pg.Client({ connectionString: admin });
  await adminClient.connect();
  await adminClient.query(`CREATE DATABASE ${name} TEMPLATE ${needed('TEST_TEMPLATE_DB')}`);
  const database = new URL(admin);
  database.pathname = `/${name}`;
  const client = new pg.Client({ connectionString: database.toString() });
  const stripe = await startFakeStripe();
  try {
    await client.connect();
    await bench(client, database.toString(), stripe.url);
  } finally {
    await client.end();
    await stripe.close();
    await adminClient.query(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
    await adminClient.end();
  }
}

await main();
