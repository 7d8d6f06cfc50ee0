import { startTestApp, type TestApp } from '../support/app.js';
import { assertInvariants, contact, pay, RiderJourney, webhooksIdle } from '../support/journey.js';

const frame = 'ullscar-withen-140';
const shock = 'vellacott-tarn-210x50';

describe('payments when things go wrong', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp();
    app.clock.set(new Date().toISOString());
  });
  afterEach(() => assertInvariants(app));
  afterAll(() => app.close());

  const control = (path: string, body: object = {}) =>
    fetch(`${app.stripe.url}/_control${path}`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(body),
    });
  const paidMails = (reference: string) =>
    app.mail
      .messages()
      .filter(({ subject, to }) => subject === `Order ${reference}: paid` && to.includes(contact.email));

  it.each(['webhook-duplicate', 'webhook-reversed'])('settles once when %s', async (fault) => {
    await control('', { fault, times: fault === 'webhook-reversed' ? 3 : 1 });
    const rider = new RiderJourney(app);
    const { reference, sessionId } = await rider.held(frame, shock);
    await pay(app, sessionId);
    await control('/reset').catch(() => undefined);
    expect((await rider.order(reference)).state).toBe('paid');
    expect(paidMails(reference)).toHaveLength(1);
  });

  it('believes no webhook with a bad signature', async () => {
    const answer = await fetch(`${app.url}/api/webhooks/stripe`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'stripe-signature': 't=1,v1=00' },
      body: JSON.stringify({
        id: 'evt_false',
        type: 'checkout.session.completed',
        data: { object: { id: 'cs_1' } },
      }),
    });
    expect(answer.status).toBe(400);
    const kept = await app.manager.query(`SELECT 1 FROM stripe_events WHERE id = 'evt_false'`);
    expect(kept).toEqual([]);
  });

  it('makes one session only when the answer is lost on the way', async () => {
    await control('', { fault: 'lose-answer', path: '/v1/checkout/sessions', method: 'POST', times: 1 });
    const rider = new RiderJourney(app);
    const { reference, sessionId } = await rider.held(frame, shock);
    await pay(app, sessionId);
    expect((await rider.order(reference)).state).toBe('paid');
  });

  it('holds nothing and says so when the payment service is away', async () => {
    await control('', { fault: 'answer-500-once', path: '/v1/checkout/sessions', method: 'POST', times: 9 });
    const rider = new RiderJourney(app);
    const id = await rider.measureUp({
      frame: { kind: 'listed', frameId: frame, modelYear: null, frameSize: null, chip: null },
      weight: { riderKg: 80, kitKg: 3 },
      'bike-mass': { kg: 14 },
      style: { style: 'trail' },
      'remote-wish': { wants: false, acceptsExternal: null },
    });
    const plan = await rider.plan(id, shock);
    const refused = await rider.checkout(plan);
    await control('/reset');
    app.stripe.setWebhook(`${app.url}/api/webhooks/stripe`, 'whsec_test');
    expect(refused.status).toBe(502);
    expect(refused.body.detail).toContain('nothing is held');
    const [held] = await app.manager.query<{ n: number }[]>(
      `SELECT count(*)::int AS n FROM orders WHERE plan_id = $1 AND state = 'held'`,
      [plan.id],
    );
    expect(held?.n).toBe(0);
  });

  it('answers the same request again with the same session, and another body with a refusal', async () => {
    const rider = new RiderJourney(app);
    const id = await rider.measureUp({
      frame: { kind: 'listed', frameId: frame, modelYear: null, frameSize: null, chip: null },
      weight: { riderKg: 80, kitKg: 3 },
      'bike-mass': { kg: 14 },
      style: { style: 'trail' },
      'remote-wish': { wants: false, acceptsExternal: null },
    });
    const plan = await rider.plan(id, shock);
    const send = (totalMinor: number) =>
      rider.browser
        .post(`/api/plans/${plan.id}/checkout`)
        .set('Idempotency-Key', `same-${plan.id}`)
        .send({ contact, acceptTerms: true, totalMinor });
    const first = await send(plan.totalMinor);
    const again = await send(plan.totalMinor);
    expect([first.status, again.status]).toEqual([201, 201]);
    expect(again.body).toEqual(first.body);
    expect((await send(plan.totalMinor + 1)).status).toBe(422);
    await webhooksIdle(app);
  });
});
