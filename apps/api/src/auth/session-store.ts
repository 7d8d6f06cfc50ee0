import connectPgSimple from 'connect-pg-simple';
import session, { type SessionData } from 'express-session';
import type { Pool } from 'pg';
import type { DataSource } from 'typeorm';

import { mergeGrants } from '../common/access/grants.js';

const PgStore = connectPgSimple(session);
type StoreOptions = ConstructorParameters<typeof PgStore>[0];

/** The pool under TypeORM: sessions share its connections instead of opening their own. */
function poolOf(dataSource: DataSource): Pool {
  const { driver } = dataSource;
  if (!('master' in driver)) throw new Error('the data source is not a PostgreSQL pool');
  return driver.master as Pool;
}

/**
 * Sessions in PostgreSQL, for browsers that send several requests at once. A session is read at the start of a
 * request and written at its end; written as it is, it would take back what another request did in between:
 * a grant would be lost, or a session that was signed out would come back.
 */
export class SessionStore extends PgStore {
  constructor(
    private readonly dataSource: DataSource,
    options: StoreOptions,
  ) {
    super({ ...options, pool: poolOf(dataSource), tableName: 'sessions', disableTouch: true });
  }

  override set(sid: string, data: SessionData, callback: (error?: unknown) => void = () => undefined): void {
    // Marked when first written: from then on it is changed where it is, and never made again.
    if (!data.kept) return super.set(sid, { ...data, kept: true }, callback);
    this.change(sid, data).then(() => callback(), callback);
  }

  private async change(sid: string, data: SessionData): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      const rows: { sess: SessionData }[] = await manager.query(
        'SELECT sess FROM sessions WHERE sid = $1 FOR UPDATE',
        [sid],
      );
      const stored = rows[0]?.sess;
      if (!stored) return;
      const merged = { ...data, grants: mergeGrants(stored.grants, data.grants) };
      await manager.query('UPDATE sessions SET sess = $2, expire = $3 WHERE sid = $1', [
        sid,
        JSON.stringify(merged),
        data.cookie.expires,
      ]);
    });
  }
}
