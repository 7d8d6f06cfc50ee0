import { randomBytes } from 'node:crypto';

import { Client } from 'pg';

function required(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set; the test command sets it, see DEVELOPERS.md`);
  return value;
}

async function asAdmin(sql: string): Promise<void> {
  const client = new Client({ connectionString: required('TEST_DATABASE_ADMIN_URL') });
  await client.connect();
  try {
    await client.query(sql);
  } finally {
    await client.end();
  }
}

export interface TestDatabase {
  url: string;
  drop(): Promise<void>;
}

/** A database of the test file's own, copied from the migrated and seeded template. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const name = `linkfell_test_${randomBytes(6).toString('hex')}`;
  await asAdmin(`CREATE DATABASE ${name} TEMPLATE ${required('TEST_TEMPLATE_DB')}`);
  const url = new URL(required('TEST_DATABASE_ADMIN_URL'));
  url.pathname = `/${name}`;
  return { url: url.toString(), drop: () => asAdmin(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`) };
}
