// Checkout against raw SQL: reserve, order and outbox in one transaction, as the API does it, and the same number of
// statements by the plain client.
import pg from 'pg';

import { quantile } from './load.mjs';

const headers = {
  'X-Linkfell-Csrf': '1',
  'Sec-Fetch-Site': 'same-origin',
  'Content-Type': 'application/json',
};
const contact = {
  name: 'Wren Hollis',
  email: 'wren@rider.example',
  phone: '01632 960123',
  street: '1 Beck Lane',
  town: 'Skelhow',
  postcode: 'QF1 9ZZ',
};

/** One rider from the fitting sheet to the order; null where nothing on the sheet can be fitted by the rider. */
async function buy(url, { id, cookie }) {
  const ask = async (method, path, body, more = {}) => {
    const answer = await fetch(url + path, {
      method,
      headers: { ...headers, ...more, cookie },
      body: body && JSON.stringify(body),
    });
    if (!answer.ok) throw new Error(`${method} ${path}: ${answer.status} ${await answer.text()}`);
    return answer.json();
  };
  const { rows } = await ask('GET', `/api/measure-ups/${id}/matches?maxMinor=1000000&limit=20`);
  const row = rows.find(
    ({ price, verdict }) =>
      price.selfFitMinor !== null && ['bolts-straight-in', 'fits-with-work'].includes(verdict),
  );
  if (!row) return null;
  const plan = await ask('POST', `/api/measure-ups/${id}/plans`, { sizeId: row.sizeId });
  const { totalMinor } = await ask(
    'PUT',
    `/api/plans/${plan.id}/choices`,
    { fit: 'self' },
    { 'If-Match': `"${plan.revision}"` },
  );
  await ask(
    'POST',
    `/api/plans/${plan.id}/checkout`,
    { contact, acceptTerms: true, totalMinor },
    { 'Idempotency-Key': `bench-${plan.id}` },
  );
  return row.sizeId;
}

/** The same number of statements, the same kinds of them in turn, each awaited, in one transaction. */
async function raw(client, statements, listings, times) {
  const took = [];
  for (let i = 0; i < times; i += 1) {
    const start = performance.now();
    await client.query('BEGIN');
    for (let n = 0; n < statements - 2; n += 1) {
      if (n % 3 === 0)
        await client.query(
          'UPDATE listings SET reserved = reserved WHERE id = $1 AND quantity - reserved >= 1',
          [listings[(i * 7 + n) % listings.length]],
        );
      else if (n % 3 === 1)
        await client.query('INSERT INTO bench_rows (body) VALUES ($1)', [JSON.stringify(contact)]);
      else
        await client.query('SELECT * FROM listings WHERE id = $1', [
          listings[(i * 11 + n) % listings.length],
        ]);
    }
    await client.query('COMMIT');
    took.push(performance.now() - start);
  }
  return took;
}

/** @param api a server started with watch-transactions.mjs, which sends what it notes */
export async function benchCheckout(api, riders, databaseUrl, count) {
  const seen = [];
  api.server.on('message', (message) => seen.push(message));
  for (let i = 0; seen.length < count && i < riders.length * 5; i += 1) {
    await buy(api.url, riders[i % riders.length]);
  }
  if (seen.length < count) throw new Error(`only ${seen.length} of ${count} orders were made`);
  const client = new pg.Client({ connectionString: databaseUrl });
  await client.connect();
  await client.query('CREATE TABLE bench_rows (id bigserial PRIMARY KEY, body jsonb)');
  const { rows } = await client.query('SELECT id FROM listings WHERE quantity > reserved LIMIT 500');
  const statements = Math.round(
    quantile(
      seen.map((one) => one.statements),
      0.5,
    ),
  );
  const plain = await raw(
    client,
    statements,
    rows.map(({ id }) => id),
    count,
  );
  await client.end();
  const ours = quantile(
    seen.map(({ ms }) => ms),
    0.5,
  );
  const theirs = quantile(plain, 0.5);
  return { orders: seen.length, statements, oursMs: ours, rawMs: theirs, ratio: theirs / ours };
}
