import { createHmac, randomUUID } from 'node:crypto';

import type { GuestGrants } from '../../src/common/access/session.js';
import { CONFIG, type Config } from '../../src/config/config.js';
import type { TestApp } from './app.js';
import type { Client } from './client.js';

/** A browser without an account whose session holds the given grants, as if it had earned them earlier. */
export async function guestWith(app: TestApp, grants: Partial<GuestGrants>): Promise<Client> {
  const sid = randomUUID();
  const sess = {
    kept: true,
    cookie: { originalMaxAge: 60 * 86_400_000, path: '/', httpOnly: true, sameSite: 'lax' },
    grants: { measureUps: [], orders: [], ...grants },
  };
  await app.dataSource.query(
    `INSERT INTO sessions (sid, sess, expire) VALUES ($1, $2, now() + interval '1 day')`,
    [sid, JSON.stringify(sess)],
  );
  // The session cookie is the id with its HMAC, as express-session signs it.
  const { SESSION_SECRET } = app.nest.get<Config>(CONFIG);
  const signature = createHmac('sha256', SESSION_SECRET).update(sid).digest('base64').replace(/=+$/, '');
  return app.client().set('Cookie', `linkfell=${encodeURIComponent(`s:${sid}.${signature}`)}`);
}
