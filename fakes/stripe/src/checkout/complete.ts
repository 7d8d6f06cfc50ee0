import type { FakeContext } from '../context.js';
import { newCustomer } from '../objects/new-customer.js';
import { presentSession } from '../objects/present.js';
import type { IntentDetail } from '../objects/stored.js';

/** Ends a session whose payment succeeded and tells the webhook. */
export function completeSession(fake: FakeContext, sessionId: string, payer: IntentDetail): void {
  const session = fake.store.sessions.get(sessionId);
  if (!session) return;
  fake.sessionClock.clear(sessionId);
  session.status = 'complete';
  session.payment_status = 'paid';
  session.customer_details = {
    address: null,
    business_name: null,
    email: payer.email,
    individual_name: null,
    name: payer.cardholder,
    phone: null,
    tax_exempt: 'none',
    tax_ids: [],
  };
  if (session.customer_creation === 'always' && !session.customer) {
    const customer = newCustomer({ email: payer.email, name: payer.cardholder });
    fake.store.customers.set(customer.id, customer);
    session.customer = customer.id;
    fake.events.emit('customer.created', customer);
  }
  fake.events.emit('checkout.session.completed', presentSession(fake, session));
}
