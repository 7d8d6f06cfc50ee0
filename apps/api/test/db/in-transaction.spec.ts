import { setTimeout as sleep } from 'node:timers/promises';

import { QueryFailedError, type DataSource, type EntityManager } from 'typeorm';

import { CommonException } from '../../src/common/problems/problem.exception.js';
import { createDataSource } from '../../src/database/data-source.js';
import { inTransaction, sqlState, violatedConstraint } from '../../src/database/in-transaction.js';
import { createTestDatabase, type TestDatabase } from '../support/database.js';

describe('inTransaction', () => {
  let database: TestDatabase;
  let source: DataSource;

  beforeAll(async () => {
    database = await createTestDatabase();
    source = await createDataSource(database.url).initialize();
    await source.query('CREATE TABLE counters (id integer PRIMARY KEY, n integer NOT NULL)');
    await source.query('INSERT INTO counters VALUES (1, 0), (2, 0)');
  });
  afterAll(async () => {
    await source.destroy();
    await database.drop();
  });

  const raise = (manager: EntityManager, state: string) =>
    manager.query(`DO $$ BEGIN RAISE EXCEPTION 'made up' USING ERRCODE = '${state}'; END $$`);

  it('untangles two transactions that lock the same rows in opposite order', async () => {
    const add = (first: number, second: number) =>
      inTransaction(source, async (manager) => {
        await manager.query('UPDATE counters SET n = n + 1 WHERE id = $1', [first]);
        await sleep(50);
        await manager.query('UPDATE counters SET n = n + 1 WHERE id = $1', [second]);
      });
    await Promise.all([add(1, 2), add(2, 1), add(1, 2), add(2, 1)]);
    expect(await source.query('SELECT n FROM counters ORDER BY id')).toEqual([{ n: 4 }, { n: 4 }]);
  });

  it('gives up after four tries and says that it is busy', async () => {
    let tries = 0;
    const hopeless = inTransaction(source, (manager) => {
      tries += 1;
      return raise(manager, '40001');
    });
    await expect(hopeless).rejects.toThrow(CommonException);
    await expect(hopeless).rejects.toMatchObject({ code: 'busy', status: 503 });
    expect(tries).toBe(4);
  });

  it('does not try again what trying cannot mend', async () => {
    let tries = 0;
    const wrong = inTransaction(source, (manager) => {
      tries += 1;
      return manager.query('INSERT INTO counters VALUES (1, 0)');
    });
    const error: unknown = await wrong.catch((reason: unknown) => reason);
    expect(error).toBeInstanceOf(QueryFailedError);
    expect([sqlState(error), violatedConstraint(error)]).toEqual(['23505', 'counters_pkey']);
    expect(tries).toBe(1);
  });
});
