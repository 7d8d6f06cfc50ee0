import { verify } from '@node-rs/argon2';
import pg from 'pg';
import { expect, it } from 'vitest';

import { migrateDatabase } from '../src/migrate-database.js';
import { loadDemo } from '../src/seed/load-demo.js';
import { resetDemo } from '../src/seed/reset-demo.js';
import { readScenario } from '../src/seed/scenario.js';
import { withOwnDatabase } from './support/own-database.js';

async function withClient<T>(url: string, use: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return await use(client);
  } finally {
    await client.end();
  }
}

/** Every row of every table of ours, as one digest per table. */
const digests = (url: string) =>
  withClient(url, async (client) => {
    const tables = await client.query<{ name: string }>(
      `SELECT table_name AS name FROM information_schema.tables WHERE table_schema = 'public' ORDER BY 1`,
    );
    const found: Record<string, string> = {};
    for (const { name } of tables.rows) {
      const { rows } = await client.query<{ digest: string }>(
        `SELECT count(*) || ' ' || coalesce(md5(string_agg(t::text, '|' ORDER BY t::text)), '') AS digest FROM "${name}" t`,
      );
      found[name] = rows[0]?.digest ?? '';
    }
    return found;
  });

it('migrates and loads once, and a second run of both changes nothing', async () => {
  await withOwnDatabase(async (url) => {
    expect((await migrateDatabase(url)).length).toBeGreaterThan(0);
    expect(await loadDemo(url)).toBe(true);
    const first = await digests(url);
    expect(first['listings']).not.toMatch(/^0 /);
    expect(await migrateDatabase(url)).toEqual([]);
    expect(await loadDemo(url)).toBe(false);
    expect(await digests(url)).toEqual(first);
  });
}, 60_000);

it('stores what the files say, and starts fresh again', async () => {
  const s = readScenario();
  await withOwnDatabase(async (url) => {
    await migrateDatabase(url);
    await loadDemo(url);
    await withClient(url, async (client) => {
      await client.query('UPDATE listings SET price_minor = 1');
      await client.query(`DELETE FROM organisation_members`);
    });
    await resetDemo(url);
    await withClient(url, async (client) => {
      const all = async <T extends pg.QueryResultRow>(sql: string): Promise<T[]> =>
        (await client.query<T>(sql)).rows;
      const entries = await all<{ facts: unknown }>(
        'SELECT e.facts FROM frame_sheet_entries e JOIN frame_sheets s ON s.id = e.sheet_id ORDER BY s.frame_id, e.position',
      );
      const frames = [...s.frames].sort((a, b) => (a.id < b.id ? -1 : 1));
      expect(entries.map((row) => row.facts)).toEqual(frames.flatMap((frame) => frame.sheet.entries));
      const shocks = await all<{ item_id: string; facts: unknown }>('SELECT item_id, facts FROM shock_sizes');
      expect(new Map(shocks.map((row) => [row.item_id, row.facts]))).toEqual(
        new Map(s.shockSizes.map((size) => [size.id, size.facts])),
      );
      const stock = await all(
        `SELECT l.id FROM listings l LEFT JOIN (SELECT listing_id, sum(quantity_delta) AS q FROM stock_movements GROUP BY 1) m
           ON m.listing_id = l.id WHERE m.q IS DISTINCT FROM l.quantity OR l.price_minor < 100`,
      );
      expect(stock).toEqual([]);
      expect(await all('SELECT 1 FROM listings')).toHaveLength(s.listings.length);
      expect(await all('SELECT 1 FROM organisation_members')).toHaveLength(
        s.accounts.filter((account) => account.organisation).length,
      );
      const rider = s.accounts[0];
      const [stored] = await all<{ password_hash: string }>(
        `SELECT password_hash FROM accounts WHERE email = '${rider?.email}'`,
      );
      expect(stored?.password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
      expect(await verify(stored?.password_hash ?? '', rider?.password ?? '')).toBe(true);
    });
  });
}, 60_000);
