import pg from 'pg';

import { migrateDatabase } from '../migrate-database.js';
import { loadDemo } from '../seed/load-demo.js';
import { databaseUrl } from './database-url.js';

const url = databaseUrl();
const client = new pg.Client({ connectionString: url });
await client.connect();
await client.query(
  'DROP SCHEMA IF EXISTS graphile_worker CASCADE; DROP SCHEMA public CASCADE; CREATE SCHEMA public',
);
await client.end();
await migrateDatabase(url);
await loadDemo(url);
console.log('fresh demo data loaded');
