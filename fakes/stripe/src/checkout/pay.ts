import type { FakeContext } from '../context.js';
import { newIntent } from '../objects/new-intent.js';
import type { StoredIntent, StoredSession } from '../objects/stored.js';
import { confirmIntent, type CardInPlay } from '../payments/confirm.js';

/** Where the browser goes once a session is paid. */
export function successUrl(session: StoredSession): string {
  return (session.success_url ?? '').replaceAll('{CHECKOUT_SESSION_ID}', session.id);
}

/** The session's intent; made at the first try of a card, as the service does since API version 2022-08-01. */
function intentOf(fake: FakeContext, session: StoredSession, email: string | null): StoredIntent {
  const known = session.payment_intent ? fake.store.intents.get(session.payment_intent) : undefined;
  if (known) return known;
  const detail = fake.store.sessionDetails.get(session.id);
  const intent = newIntent({
    amount: session.amount_total ?? 0,
    currency: session.currency ?? 'gbp',
    customer: session.customer,
    description: detail?.intentDescription,
    metadata: { ...detail?.intentMetadata },
    receiptEmail: email,
    transferGroup: detail?.transferGroup,
  });
  fake.store.intents.set(intent.id, intent);
  fake.store.intentDetails.set(intent.id, {
    sessionId: session.id,
    cardNumber: null,
    cardholder: null,
    email,
    returnUrl: successUrl(session),
  });
  session.payment_intent = intent.id;
  fake.events.emit('payment_intent.created', intent);
  return intent;
}

/** Tries a card for an open session and returns the intent, whose status says how it went. */
export function payForSession(fake: FakeContext, session: StoredSession, card: CardInPlay): StoredIntent {
  const customer = session.customer ? fake.store.customers.get(session.customer) : undefined;
  const email = session.customer_email ?? customer?.email ?? card.email ?? null;
  const intent = intentOf(fake, session, email);
  confirmIntent(fake, intent, { ...card, email });
  return intent;
}
