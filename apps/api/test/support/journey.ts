import type { MatchesView, MeasureUpView, OrderView, PlanView, QuestionKey } from '@linkfell/contracts';

import { Organisation } from '../../src/organisations/organisation.entity.js';
import { createMember } from '../factories/organisation.factory.js';
import type { TestApp } from './app.js';
import type { Client } from './client.js';
import { signedIn } from './sign-in.js';

export const contact = {
  name: 'Wren Hollis',
  email: 'wren@rider.example',
  phone: '01632 960123',
  street: '1 Beck Lane',
  town: 'Skelhow',
  postcode: 'QF1 9ZZ',
};

/** Answers of an 80 kg trail rider on a listed frame. */
export const usualAnswers = (frameId: string): Partial<Record<QuestionKey, unknown>> => ({
  frame: { kind: 'listed', frameId, modelYear: 2024, frameSize: null, chip: null },
  weight: { riderKg: 80, kitKg: 3 },
  'bike-mass': { kg: 14.5 },
  style: { style: 'trail' },
  'remote-wish': { wants: false, acceptsExternal: null },
  place: { townId: 'skelhow', heightM: null },
});

/** The steps of a rider over HTTP, each asserted to succeed. */
export class RiderJourney {
  readonly browser: Client;
  private key = 0;

  constructor(private readonly app: TestApp) {
    this.browser = app.client();
  }

  async measureUp(answers: Partial<Record<QuestionKey, unknown>>): Promise<string> {
    const made = await this.browser.post('/api/measure-ups').send({}).expect(201);
    const { id } = made.body as MeasureUpView;
    for (const [question, value] of Object.entries(answers)) {
      await this.browser
        .put(`/api/measure-ups/${id}/answers/${question}`)
        .send({ state: 'known', value })
        .expect(200);
    }
    return id;
  }

  async matches(id: string, query = ''): Promise<MatchesView> {
    return (await this.browser.get(`/api/measure-ups/${id}/matches${query}`).expect(200)).body as MatchesView;
  }

  async plan(id: string, sizeId: string): Promise<PlanView> {
    return (await this.browser.post(`/api/measure-ups/${id}/plans`).send({ sizeId }).expect(201))
      .body as PlanView;
  }

  checkout(plan: PlanView) {
    this.key += 1;
    return this.browser
      .post(`/api/plans/${plan.id}/checkout`)
      .set('Idempotency-Key', `journey-${plan.id}-${this.key}`)
      .send({ contact, acceptTerms: true, totalMinor: plan.totalMinor });
  }

  /** From nothing to an order that is held. */
  async held(
    frameId: string,
    sizeId: string,
  ): Promise<{ plan: PlanView; reference: string; sessionId: string }> {
    const id = await this.measureUp(usualAnswers(frameId));
    const plan = await this.plan(id, sizeId);
    const { body } = await this.checkout(plan).expect(201);
    const { reference, paymentUrl } = body as { reference: string; paymentUrl: string };
    return { plan, reference, sessionId: new URL(paymentUrl).pathname.split('/').at(-1) as string };
  }

  async order(reference: string): Promise<OrderView> {
    return (await this.browser.get(`/api/orders/${reference}`).expect(200)).body as OrderView;
  }
}

/** Pays on the fake's side, waits for the webhook and delivers what follows from it. */
export async function pay(app: TestApp, sessionId: string, number = '4242424242424242'): Promise<void> {
  await fetch(`${app.stripe.url}/_control/sessions/${sessionId}/pay`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ number }),
  });
  await webhooksIdle(app);
  await app.drainOutbox();
}

/** Until the fake has no delivery under way; bounded. */
export async function webhooksIdle(app: TestApp): Promise<void> {
  for (let tries = 0; tries < 100; tries += 1) {
    const answer = await fetch(`${app.stripe.url}/_control/webhooks/deliveries`);
    if (((await answer.json()) as { idle: boolean }).idle) return;
    await new Promise((resolve) => setTimeout(resolve, 30));
  }
  throw new Error('webhooks did not come to rest');
}

/** A browser in which an owner of that organisation is signed in. */
export async function ownerOf(app: TestApp, organisationId: string): Promise<Client> {
  const organisation = await app.manager.findOneByOrFail(Organisation, { id: organisationId });
  return signedIn(app, await createMember(app.manager, organisation, 'owner'));
}

/** What must hold after whatever has happened. */
export async function assertInvariants(app: TestApp): Promise<void> {
  const [stock] = await app.manager.query<{ bad: number }[]>(
    `SELECT count(*)::int AS bad FROM listings WHERE NOT (quantity >= reserved AND reserved >= 0)`,
  );
  expect(stock?.bad).toBe(0);
  const [ledger] = await app.manager.query<{ bad: number }[]>(
    `SELECT count(*)::int AS bad FROM listings l JOIN (
       SELECT listing_id, sum(quantity_delta) AS q, sum(reserved_delta) AS r FROM stock_movements GROUP BY listing_id
     ) m ON m.listing_id = l.id WHERE m.q <> l.quantity OR m.r <> l.reserved`,
  );
  expect(ledger?.bad).toBe(0);
  const [overlaps] = await app.manager.query<{ bad: number }[]>(
    `SELECT count(*)::int AS bad FROM bookings a JOIN bookings b ON a.stand_id = b.stand_id AND a.id < b.id
        AND a.during && b.during AND a.state IN ('held','requested','accepted','fitted')
        AND b.state IN ('held','requested','accepted','fitted')`,
  );
  expect(overlaps?.bad).toBe(0);
  const [money] = await app.manager.query<{ bad: number }[]>(
    `SELECT count(*)::int AS bad FROM payments p JOIN orders o ON o.id = p.order_id
       LEFT JOIN (SELECT payment_id, sum(amount_minor)::int AS sum FROM refunds GROUP BY payment_id) r ON r.payment_id = p.id
      WHERE p.refunded_minor <> coalesce(r.sum, 0)
         OR (o.state = 'refunded' AND p.refunded_minor <> p.amount_minor)
         OR (o.state IN ('paid','completed','refunding','refunded') AND p.state <> 'paid')`,
  );
  expect(money?.bad).toBe(0);
  const [mails] = await app.manager.query<{ bad: number }[]>(
    `SELECT count(*)::int AS bad FROM outbox WHERE state = 'dead' OR (state = 'done' AND topic = 'mail' AND NOT EXISTS (
       SELECT 1 FROM mail_log m WHERE m.outbox_id = outbox.id))`,
  );
  expect(mails?.bad).toBe(0);
}
