import { migrations } from '@linkfell/db';
import { DataSource, type DataSourceOptions } from 'typeorm';

import { entities } from './entities.js';
import { SchemaNamingStrategy } from './naming-strategy.js';

/** How we talk to PostgreSQL. The schema belongs to the migrations alone: nothing is synchronised from entities. */
export function dataSourceOptions(url: string): DataSourceOptions {
  return {
    type: 'postgres',
    url,
    entities,
    migrations,
    synchronize: false,
    migrationsRun: false,
    namingStrategy: new SchemaNamingStrategy(),
    uuidExtension: 'pgcrypto',
    installExtensions: false,
    applicationName: 'linkfell-api',
    poolSize: 10,
    extra: { connectionTimeoutMillis: 5_000, statement_timeout: 15_000 },
  };
}

export function createDataSource(url: string): DataSource {
  return new DataSource(dataSourceOptions(url));
}
