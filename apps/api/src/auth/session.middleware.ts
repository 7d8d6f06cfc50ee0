import { Logger } from '@nestjs/common';
import type { NextFunction, Request, RequestHandler, Response } from 'express';
import session from 'express-session';
import type { DataSource } from 'typeorm';

import type { Config } from '../config/config.js';
import { SessionStore } from './session-store.js';

const days = 24 * 60 * 60 * 1000;

/** `__Host-` ties the cookie to this host and to https; plain http (loopback) cannot carry that name. */
export const cookieName = (config: Config): string => (config.https ? '__Host-linkfell' : 'linkfell');

/** What the cookie is set with; also what it must be cleared with. */
export const cookieOptions = (config: Config) =>
  ({ path: '/', httpOnly: true, sameSite: 'lax', secure: config.https }) as const;

/** Sessions in PostgreSQL; a guest gets one only when there is something to remember. */
export function sessions(config: Config, dataSource: DataSource): RequestHandler[] {
  const logger = new Logger('Sessions');
  const pruneSeconds = config.NODE_ENV === 'test' ? false : 15 * 60;
  return [
    session({
      name: cookieName(config),
      secret: config.SESSION_SECRET,
      store: new SessionStore(dataSource, {
        pruneSessionInterval: pruneSeconds,
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
