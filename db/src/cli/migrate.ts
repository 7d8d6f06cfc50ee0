import { migrateDatabase } from '../migrate-database.js';
import { databaseUrl } from './database-url.js';

try {
  const ran = await migrateDatabase(databaseUrl());
  console.log(ran.length === 0 ? 'database is up to date' : `migrated: ${ran.join(', ')}`);
} catch (error) {
  console.error(
    `Migration failed, nothing of it was kept: ${error instanceof Error ? error.message : String(error)}`,
  );
  process.exitCode = 1;
}
