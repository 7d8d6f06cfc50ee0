import 'express-session';

/** What a guest may open without an account, by id. */
export interface GuestGrants {
  measureUps: string[];
  orders: string[];
}

declare module 'express-session' {
  interface SessionData {
    accountId?: string;
    grants?: GuestGrants;
    /** Day of the last visit; a new day prolongs the session. */
    seenOn?: string;
  }
}
