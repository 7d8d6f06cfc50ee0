import type { DynamicModule } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';

import type { Config } from '../config/config.js';
import { dataSourceOptions } from './data-source.js';

/** Makes the one `DataSource` injectable everywhere; features use its manager or a transaction's. */
export function databaseModule(config: Config): DynamicModule {
  return TypeOrmModule.forRoot({
    ...dataSourceOptions(config.DATABASE_URL),
    retryAttempts: 3,
    retryDelay: 1_000,
  });
}
