import { Logger } from '@nestjs/common';
import connectPgSimple from 'connect-pg-simple';
import type { NextFunction, Request, RequestHandler, Response } from 'express';
import session from 'express-session';
import type { Pool } from 'pg';
import type { DataSource } from 'typeorm';

import type { Config } from '../config/config.js';

const days = 24 * 60 * 60 * 1000;

/** `__Host-` ties the cookie to this host and to https; plain http (loopback) cannot carry that name. */
export const cookieName = (config: Config): string => (config.https ? '__Host-linkfell' : 'linkfell');

/** What the cookie is set with; also what it must be cleared with. */
export const cookieOptions = (config: Config) =>
  ({ path: '/', httpOnly: true, sameSite: 'lax', secure: config.https }) as const;

/** The pool under TypeORM: sessions share its connections instead of opening their own. */
function poolOf(dataSource: DataSource): Pool {
  const { driver } = dataSource;
  if (!('master' in driver)) throw new Error('the data source is not a PostgreSQL pool');
  return driver.master as Pool;
}

/** Sessions in PostgreSQL; a guest gets one only when there is something to remember. */
export function sessions(config: Config, dataSource: DataSource): RequestHandler[] {
  const logger = new Logger('Sessions');
  const Store = connectPgSimple(session);
  const pruneMinutes = config.NODE_ENV === 'test' ? false : 15 * 60;
  return [
    session({
      name: cookieName(config),
      secret: config.SESSION_SECRET,
      store: new Store({
        pool: poolOf(dataSource),
        tableName: 'sessions',
        pruneSessionInterval: pruneMinutes,
        disableTouch: true,
        errorLog: (...parts: unknown[]) => logger.error(parts.map(String).join(' ')),
      }),
      resave: false,
      saveUninitialized: false,
      cookie: { ...cookieOptions(config), maxAge: 60 * days },
    }),
    prolongDaily,
  ];
}

/** One write a day keeps a session alive, instead of one per request. */
function prolongDaily(request: Request, _response: Response, next: NextFunction): void {
  const today = new Date().toISOString().slice(0, 10);
  const used = request.session.accountId !== undefined || request.session.grants !== undefined;
  if (used && request.session.seenOn !== today) request.session.seenOn = today;
  next();
}
