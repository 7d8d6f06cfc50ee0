import type Stripe from 'stripe';

import { STRIPE } from '../../src/payments/stripe-client.js';
import type { TestApp } from '../support/app.js';
import { assertInvariants } from '../support/journey.js';

interface PaidRow {
  reference: string;
  order_state: string;
  intent: string;
  amount: number;
  refunded: number;
  done: number;
  fulfilled: number;
}

/** What has been sold is all items and carriage, and the work unless the rider fits it. */
const paidSql = `
  SELECT o.reference, o.state AS order_state, p.provider_payment_intent_id AS intent, p.amount_minor AS amount,
         p.refunded_minor AS refunded,
         (SELECT coalesce(sum(r.amount_minor), 0)::int FROM refunds r WHERE r.payment_id = p.id AND r.state = 'done') AS done,
         (SELECT coalesce(sum(l.unit_minor * l.quantity), 0)::int FROM order_lines l
           WHERE l.order_id = o.id AND (l.kind <> 'work' OR o.fit = 'workshop')) AS fulfilled
    FROM payments p JOIN orders o ON o.id = p.order_id WHERE p.state = 'paid'`;

/** Rows that must not exist, each with what it would mean. */
const never: Record<string, string> = {
  'an order that was let go still reserves stock': `
    SELECT o.reference FROM orders o JOIN stock_movements m ON m.order_id = o.id
     WHERE o.state IN ('released','refunding','refunded') GROUP BY o.reference HAVING sum(m.reserved_delta) <> 0`,
  'an order that waits does not reserve all it needs': `
    SELECT o.reference FROM orders o WHERE o.state = 'held' AND
      (SELECT sum(reserved_delta) FROM stock_movements m WHERE m.order_id = o.id) IS DISTINCT FROM
      (SELECT sum(quantity) FROM order_lines l WHERE l.order_id = o.id AND l.kind = 'item')`,
  'a completed order has not left the shelves': `
    SELECT o.reference FROM orders o WHERE o.state = 'completed' AND
      (SELECT -sum(quantity_delta) FROM stock_movements m WHERE m.order_id = o.id) IS DISTINCT FROM
      (SELECT sum(quantity) FROM order_lines l WHERE l.order_id = o.id AND l.kind = 'item')`,
  'two orders live for one plan': `
    SELECT plan_id FROM orders WHERE state IN ('held','paid','completed','refunding') GROUP BY plan_id HAVING count(*) > 1`,
  'a stand is kept for an order that is over': `
    SELECT b.id FROM bookings b JOIN orders o ON o.id = b.order_id
     WHERE b.state IN ('held','requested','accepted') AND o.state NOT IN ('held','paid')`,
  'a parcel left for a workshop that had not accepted': `
    SELECT p.id FROM parcels p JOIN orders o ON o.id = p.order_id
     WHERE o.fit = 'workshop' AND p.state IN ('to-send','sent')
       AND NOT EXISTS (SELECT 1 FROM bookings b WHERE b.order_id = o.id AND b.state IN ('accepted','fitted'))`,
  'the same mail was sent twice': `
    SELECT payload->>'template' FROM outbox WHERE topic = 'mail' AND state = 'done'
     GROUP BY payload->>'template', payload->>'to', payload->'data' HAVING count(*) > 1`,
};

/** What must hold after whatever has happened, on our side, at the payment provider and in the inboxes. */
export async function assertAllInvariants(app: TestApp): Promise<void> {
  await assertInvariants(app);
  for (const [meaning, sql] of Object.entries(never)) {
    expect({ meaning, rows: await app.manager.query<unknown[]>(sql) }).toEqual({ meaning, rows: [] });
  }
  await assertMoney(app);
  const ids = app.mail
    .messages()
    .map(({ headers }) => headers.find(({ name }) => /^message-id$/i.test(name))?.value);
  expect(new Set(ids).size).toBe(ids.length);
}

async function assertMoney(app: TestApp): Promise<void> {
  const paid: PaidRow[] = await app.manager.query(paidSql);
  for (const row of paid) {
    const about = { reference: row.reference, state: row.order_state };
    const owed = row.order_state === 'completed' ? row.fulfilled : row.order_state === 'refunded' ? 0 : null;
    if (owed !== null)
      expect({ ...about, captured: row.amount }).toEqual({ ...about, captured: owed + row.refunded });
    if (row.order_state === 'refunded')
      expect({ ...about, done: row.done }).toEqual({ ...about, done: row.amount });
  }
  const stripe: Stripe = app.nest.get(STRIPE);
  const charges = await stripe.charges.list({ limit: 100 });
  const captured = charges.data.filter((charge) => charge.paid);
  const theirs = captured.map((charge) => [
    charge.payment_intent,
    charge.amount_captured,
    charge.amount_refunded,
  ]);
  const ours = paid.map((row) => [row.intent, row.amount, row.done]);
  expect(ours.sort()).toEqual(theirs.sort());
}
