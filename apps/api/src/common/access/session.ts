import 'express-session';

import type { GuestGrants } from './grants.js';

export type { GuestGrants } from './grants.js';

declare module 'express-session' {
  interface SessionData {
    accountId?: string;
    grants?: GuestGrants;
    /** Day of the last visit; a new day prolongs the session. */
    seenOn?: string;
    /** Set by the store once it is in the database. */
    kept?: boolean;
  }
}
