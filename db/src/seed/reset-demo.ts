import pg from 'pg';

import { migrateDatabase } from '../migrate-database.js';
import { loadDemo } from './load-demo.js';

/** Throws away everything in the database and loads the demo scenario afresh. */
export async function resetDemo(url: string): Promise<void> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    await client.query(
      'DROP SCHEMA IF EXISTS graphile_worker CASCADE; DROP SCHEMA public CASCADE; CREATE SCHEMA public',
    );
  } finally {
    await client.end();
  }
  await migrateDatabase(url);
  await loadDemo(url);
}
