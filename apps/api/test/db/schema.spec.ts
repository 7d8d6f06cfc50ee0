import type { DataSource } from 'typeorm';

import { createDataSource } from '../../src/database/data-source.js';
import { createTestDatabase, type TestDatabase } from '../support/database.js';

describe('entities and migrations', () => {
  let database: TestDatabase;
  let source: DataSource;

  beforeAll(async () => {
    database = await createTestDatabase();
    source = await createDataSource(database.url).initialize();
  });

  afterAll(async () => {
    await source.destroy();
    await database.drop();
  });

  it('agree: TypeORM would change nothing', async () => {
    const { upQueries } = await source.driver.createSchemaBuilder().log();
    expect(upQueries.map(({ query }) => query)).toEqual([]);
  });

  it('cover every table', async () => {
    const rows: { name: string }[] = await source.query(
      `SELECT table_name AS name FROM information_schema.tables WHERE table_schema = 'public' AND table_name <> 'migrations' ORDER BY 1`,
    );
    const known = source.entityMetadatas.map((entity) => entity.tableName).sort();
    expect(known).toEqual(rows.map((row) => row.name));
  });
});
