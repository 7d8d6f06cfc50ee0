import { runMigrations } from 'graphile-worker';
import { DataSource } from 'typeorm';

import { migrations } from './migrations/all.js';

/**
 * Brings a database up to date: our own migrations, then the job queue's schema.
 * @returns the names of the migrations that ran
 * @throws the database's own error, with the failed migration rolled back
 */
export async function migrateDatabase(url: string): Promise<string[]> {
  const source = new DataSource({
    type: 'postgres',
    url,
    migrations,
    migrationsTransactionMode: 'each',
    uuidExtension: 'pgcrypto',
    installExtensions: false,
  });
  await source.initialize();
  try {
    const ran = await source.runMigrations();
    await runMigrations({ connectionString: url });
    return ran.map((migration) => migration.name);
  } finally {
    await source.destroy();
  }
}
