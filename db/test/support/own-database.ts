import { randomBytes } from 'node:crypto';

import pg from 'pg';

function adminUrl(): string {
  const url = process.env.TEST_DATABASE_ADMIN_URL;
  if (!url) throw new Error('TEST_DATABASE_ADMIN_URL is not set; the test command sets it');
  return url;
}

async function asAdmin(sql: string): Promise<void> {
  const client = new pg.Client({ connectionString: adminUrl() });
  await client.connect();
  try {
    await client.query(sql);
  } finally {
    await client.end();
  }
}

/** An empty database of the test's own, for the time of `use`. */
export async function withOwnDatabase(use: (url: string) => Promise<void>): Promise<void> {
  const name = `linkfell_seed_${randomBytes(6).toString('hex')}`;
  await asAdmin(`CREATE DATABASE ${name}`);
  try {
    const url = new URL(adminUrl());
    url.pathname = `/${name}`;
    await use(url.toString());
  } finally {
    await asAdmin(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
  }
}
