import type { FakeContext } from '../context.js';
import { presentSession } from '../objects/present.js';
import type { StoredSession } from '../objects/stored.js';
import { cancelIntent } from '../payments/confirm.js';
import { nowSeconds } from '../store/ids.js';

/** Ends an open session unpaid: no card can be tried any more, a payment under way is given up. */
export function expireSession(fake: FakeContext, session: StoredSession): void {
  fake.sessionClock.clear(session.id);
  session.status = 'expired';
  const intent = session.payment_intent ? fake.store.intents.get(session.payment_intent) : undefined;
  if (intent && intent.status !== 'succeeded') cancelIntent(fake, intent, 'expired', nowSeconds());
  fake.events.emit('checkout.session.expired', presentSession(fake, session));
}

/** A session by id, expired first if its time has passed. */
export function currentSession(fake: FakeContext, id: string): StoredSession | undefined {
  const session = fake.store.sessions.get(id);
  if (session?.status === 'open' && session.expires_at <= nowSeconds()) expireSession(fake, session);
  return session;
}
