import type Stripe from 'stripe';

import { PaymentsService } from '../../src/payments/payments.service.js';
import { STRIPE } from '../../src/payments/stripe-client.js';
import { startTestApp, type TestApp } from '../support/app.js';
import { testConfig } from '../support/config.js';
import { contact } from '../support/journey.js';
import { assertAllInvariants } from './invariants.js';
import { Scenes, sessionOf, shock, type HeldScene } from './scenes.js';

describe('payments', () => {
  let app: TestApp;
  let scenes: Scenes;
  let stripe: Stripe;
  const { STRIPE_WEBHOOK_SECRET: secret } = testConfig({ DATABASE_URL: 'postgres://nowhere' });

  beforeAll(async () => {
    app = await startTestApp();
    app.clock.set(new Date().toISOString());
    scenes = new Scenes(app);
    stripe = app.nest.get(STRIPE);
    await scenes.onlyAt(shock, 'fellside-parts', 60);
  });
  afterEach(async () => {
    await scenes.rest();
    await assertAllInvariants(app);
  });
  afterAll(() => app.close());

  const paidMails = (reference: string) =>
    scenes.riderSubjects(reference).filter((subject) => subject === `Order ${reference}: paid`);
  const expectPaidOnce = async ({ rider, reference }: HeldScene) => {
    const order = await rider.order(reference);
    expect(order).toMatchObject({ state: 'paid', refundedMinor: 0 });
    expect(order.booking?.state ?? 'self').toBe(order.fit === 'self' ? 'self' : 'requested');
    expect(paidMails(reference)).toHaveLength(1);
  };
  const post = (body: string, signature: string) =>
    fetch(`${app.url}/api/webhooks/stripe`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'stripe-signature': signature },
      body,
    });
  /** A message as the provider would sign it, `age` seconds ago. */
  const signed = (event: object, age = 0) => {
    const payload = JSON.stringify(event);
    const timestamp = Math.floor(Date.now() / 1000) - age;
    return post(payload, stripe.webhooks.generateTestHeaderString({ payload, secret, timestamp }));
  };
  const completed = (id: string, sessionId: string) => ({
    id,
    object: 'event',
    type: 'checkout.session.completed',
    data: { object: { id: sessionId } },
  });
  const kept = (id: string) =>
    app.manager.query<{ done: boolean }[]>(
      `SELECT processed_at IS NOT NULL AS done FROM stripe_events WHERE id = $1`,
      [id],
    );

  describe('messages of the provider', () => {
    it.each([
      ['twice', { fault: 'webhook-duplicate', times: 3 }],
      ['newest first', { fault: 'webhook-reversed', times: 3 }],
      ['late', { fault: 'webhook-late', delayMs: 300, type: 'checkout.session.completed' }],
    ])('settle once when they come %s', async (_how, fault) => {
      const scene = await scenes.held();
      await scenes.fault(fault);
      expect(await scenes.card(scene.sessionId)).toBe(true);
      await scenes.rest();
      await expectPaidOnce(scene);
    });

    it('settle once when ten come at the same moment, of one event and of several', async () => {
      const scene = await scenes.held();
      await scenes.control('/webhooks/pause');
      await scenes.card(scene.sessionId);
      const ids = [
        ...Array<string>(5).fill('evt_same'),
        ...Array.from({ length: 5 }, (_, i) => `evt_other_${i}`),
      ];
      const answers = await Promise.all(ids.map((id) => signed(completed(id, scene.sessionId))));
      expect(answers.map(({ status }) => status)).toEqual(Array(10).fill(200));
      await scenes.control('/webhooks/resume');
      await scenes.rest();
      await expectPaidOnce(scene);
    });

    it('are hints: one that claims a payment changes nothing while the session is open', async () => {
      const { rider, reference, sessionId } = await scenes.held();
      expect((await signed(completed('evt_hint', sessionId))).status).toBe(200);
      expect((await rider.order(reference)).state).toBe('held');
    });

    it('are refused, and not kept, with a wrong signature, an old one or none', async () => {
      const event = completed('evt_false', 'cs_1');
      expect((await post(JSON.stringify(event), 't=1,v1=00')).status).toBe(400);
      expect((await post(JSON.stringify(event), '')).status).toBe(400);
      expect((await signed(event, 310)).status).toBe(400);
      expect(await kept('evt_false')).toEqual([]);
      expect((await signed({ ...event, type: 'customer.created' }, 290)).status).toBe(200);
      expect(await kept('evt_false')).toEqual([{ done: true }]);
    });

    it('are answered with a fault and tried again when they cannot be worked on', async () => {
      const scene = await scenes.held();
      await scenes.control('/webhooks/pause');
      await scenes.card(scene.sessionId);
      const at = `/v1/checkout/sessions/${scene.sessionId}`;
      await scenes.fault({ fault: 'answer-500-once', path: at, method: 'GET', times: 3 });
      expect((await signed(completed('evt_again', scene.sessionId))).status).toBe(500);
      expect(await kept('evt_again')).toEqual([{ done: false }]);
      expect((await scene.rider.order(scene.reference)).state).toBe('held');
      expect((await signed(completed('evt_again', scene.sessionId))).status).toBe(200);
      expect(await kept('evt_again')).toEqual([{ done: true }]);
      await scenes.control('/webhooks/resume');
      await scenes.rest();
      await expectPaidOnce(scene);
    });

    it('do not settle an amount that is not the order’s', async () => {
      const scene = await scenes.held();
      const id = await scenes.orderId(scene.reference);
      await scenes.control('/webhooks/pause');
      await scenes.card(scene.sessionId);
      await app.manager.query(`UPDATE payments SET amount_minor = amount_minor + 1 WHERE order_id = $1`, [
        id,
      ]);
      expect((await signed(completed('evt_amount', scene.sessionId))).status).toBe(500);
      expect((await scene.rider.order(scene.reference)).state).toBe('held');
      await app.manager.query(`UPDATE payments SET amount_minor = amount_minor - 1 WHERE order_id = $1`, [
        id,
      ]);
      await scenes.control('/webhooks/resume');
      await scenes.rest();
      await expectPaidOnce(scene);
    });
  });

  describe('the payment page', () => {
    it('is one page when the answer is lost on the way', async () => {
      await scenes.fault({ fault: 'lose-answer', path: '/v1/checkout/sessions', method: 'POST' });
      const scene = await scenes.held();
      const { data } = await stripe.checkout.sessions.list({ limit: 100 });
      expect(data.filter((session) => session.client_reference_id === scene.reference)).toHaveLength(1);
      await scenes.card(scene.sessionId);
      await scenes.rest();
      await expectPaidOnce(scene);
    });

    it('asks for exactly the order: every line, its total, its reference, half an hour at least', async () => {
      const { rider, reference, sessionId } = await scenes.held();
      const order = await rider.order(reference);
      const session = await stripe.checkout.sessions.retrieve(sessionId, { expand: ['line_items'] });
      expect(session).toMatchObject({
        amount_total: order.totalMinor,
        currency: 'gbp',
        client_reference_id: reference,
        customer_email: contact.email,
        metadata: { reference, order_id: await scenes.orderId(reference) },
      });
      expect(session.line_items?.data.map(({ description }) => description)).toEqual(
        order.lines.map(({ description }) => description),
      );
      expect(session.expires_at - session.created).toBeGreaterThanOrEqual(30 * 60);
      expect(session.success_url).toBe(`http://127.0.0.1:4310/orders/${reference}?paid=1`);
      expect(session.cancel_url).toBe(`http://127.0.0.1:4310/orders/${reference}?cancelled=1`);
    });

    it('holds nothing and says so when the provider is away', async () => {
      const { rider, plan } = await scenes.plan();
      await scenes.fault({
        fault: 'answer-500-once',
        path: '/v1/checkout/sessions',
        method: 'POST',
        times: 3,
      });
      const refused = await rider.checkout(plan);
      expect([refused.status, refused.body.code]).toEqual([502, 'payment-unavailable']);
      expect(refused.body.detail).toContain('nothing is held');
      await rider.checkout(plan).expect(201);
    });

    it.each(['4000000000000002', '4000000000009995', '4000008400001629'])(
      'stays open after card %s, the hold stands, and another card pays',
      async (number) => {
        const scene = await scenes.held();
        expect(await scenes.card(scene.sessionId, number)).toBe(false);
        await scenes.rest();
        expect((await scene.rider.order(scene.reference)).state).toBe('held');
        expect(await scenes.card(scene.sessionId, '4000002500003155')).toBe(true);
        await scenes.rest();
        await expectPaidOnce(scene);
      },
    );
  });

  describe('the end of a hold', () => {
    it('comes by call when the rider cancels, and no card is taken any more', async () => {
      const { rider, plan, reference, sessionId } = await scenes.held();
      const { body } = await rider.browser
        .post(`/api/orders/${reference}/cancel-payment`)
        .send({})
        .expect(200);
      expect(body).toMatchObject({ state: 'released', releaseReason: 'cancelled', actions: [] });
      expect(await scenes.card(sessionId)).toBe(false);
      await scenes.rest();
      expect(scenes.riderSubjects(reference)).toEqual([]);
      expect((await rider.browser.get(`/api/plans/${plan.id}`).expect(200)).body.missing).toEqual([]);
    });

    it('keeps the hold and says so when the provider cannot be reached to cancel', async () => {
      const { rider, reference, sessionId } = await scenes.held();
      const at = `/v1/checkout/sessions/${sessionId}`;
      await scenes.fault({ fault: 'answer-500-once', path: at, method: 'GET', times: 3 });
      const { body } = await rider.browser
        .post(`/api/orders/${reference}/cancel-payment`)
        .send({})
        .expect(502);
      expect(body.detail).toContain('still held');
      expect((await rider.order(reference)).state).toBe('held');
    });

    it('comes when its time is over, is told by mail once, and the plan is still there', async () => {
      const { rider, plan, reference, sessionId } = await scenes.held();
      const id = await scenes.orderId(reference);
      await app.manager.query(`UPDATE outbox SET next_try_at = $2 WHERE dedupe_key = 'hold-ended:' || $1`, [
        id,
        app.clock.now(),
      ]);
      await scenes.rest();
      expect(await rider.order(reference)).toMatchObject({ state: 'released', releaseReason: 'expired' });
      expect(await scenes.card(sessionId)).toBe(false);
      expect(scenes.riderSubjects(reference)).toEqual([`Order ${reference}: nothing was paid`]);
      await rider.browser.get(`/api/plans/${plan.id}`).expect(200);
    });

    it('comes by the provider’s message as well', async () => {
      const { rider, reference, sessionId } = await scenes.held();
      await scenes.control(`/sessions/${sessionId}/expire-now`);
      await scenes.rest();
      expect(await rider.order(reference)).toMatchObject({ state: 'released', releaseReason: 'expired' });
    });

    it.each([
      ['after the call', `provider_session_id = NULL, url = NULL, state = 'preparing'`],
      [
        'before the call',
        `provider_session_id = NULL, url = NULL, state = 'preparing', id = gen_random_uuid()`,
      ],
    ])('comes although the process died %s', async (_when, lost) => {
      const { rider, reference, sessionId } = await scenes.held();
      const id = await scenes.orderId(reference);
      await app.manager.query(`UPDATE payments SET ${lost} WHERE order_id = $1`, [id]);
      await app.manager.query(
        `UPDATE orders SET created_at = created_at - interval '32 minutes',
                hold_expires_at = hold_expires_at - interval '32 minutes' WHERE id = $1 AND $2`,
        [id, lost.includes('gen_random_uuid')],
      );
      await app.nest.get(PaymentsService).giveUp(id, 'expired');
      expect((await rider.order(reference)).state).toBe('released');
      // With another id nothing leads to the session that was made here: it stands for one that never was.
      if (!lost.includes('gen_random_uuid')) expect(await scenes.card(sessionId)).toBe(false);
    });

    it('and a payment at the same moment: one of the two, never both', async () => {
      const states: string[] = [];
      for (let round = 0; round < 6; round += 1) {
        const { rider, reference, sessionId } = await scenes.held('self');
        const cancel = rider.browser.post(`/api/orders/${reference}/cancel-payment`).send({});
        const [paid, answer] = await Promise.all(
          round % 2 === 0
            ? [scenes.card(sessionId), cancel]
            : [cancel.then(() => scenes.card(sessionId)), cancel],
        );
        expect(answer.status).toBe(200);
        await scenes.rest();
        const { state } = await rider.order(reference);
        expect(state).toBe(paid ? 'paid' : 'released');
        states.push(state);
      }
      expect(states).toContain('released');
    });
  });

  describe('a payment after the hold has ended', () => {
    /** Let go on our side while the session is still open at the provider's. */
    const lapsed = async (fit: 'workshop' | 'self' = 'workshop') => {
      const scene = await scenes.held(fit);
      await app.nest
        .get(PaymentsService)
        .release(await scenes.orderId(scene.reference), 'payment-unavailable');
      return scene;
    };
    const pay = async ({ sessionId }: HeldScene) => {
      expect(await scenes.card(sessionId)).toBe(true);
      await scenes.rest();
    };

    it('is fulfilled when stock and slot are still there', async () => {
      const scene = await lapsed();
      await pay(scene);
      await expectPaidOnce(scene);
    });

    it('goes back at once, and says so, when the stock has gone', async () => {
      const scene = await lapsed('self');
      await scenes.onlyAt(shock, 'fellside-parts', 0);
      await pay(scene);
      const order = await scene.rider.order(scene.reference);
      expect(order).toMatchObject({ state: 'refunded', refundedMinor: order.totalMinor, actions: [] });
      const [subject] = scenes.riderSubjects(scene.reference);
      expect(subject).toContain('goes back to you');
      await scenes.onlyAt(shock, 'fellside-parts', 30);
    });

    it('goes back when the slot has gone on every stand', async () => {
      const scene = await lapsed();
      const stands = await app.manager.query<{ n: number }[]>(
        `SELECT count(*)::int AS n FROM stands WHERE organisation_id = $1`,
        [scene.plan.choices.workshopId],
      );
      for (let i = 0; i < (stands[0]?.n ?? 0); i += 1) {
        const { plan } = await scenes.held();
        expect(plan.choices.slotStart).toBe(scene.plan.choices.slotStart);
      }
      await pay(scene);
      expect((await scene.rider.order(scene.reference)).state).toBe('refunded');
    });

    it('goes back when the plan has been ordered anew, so that nobody pays twice', async () => {
      const scene = await lapsed();
      const second = await scene.rider.checkout(scene.plan).expect(201);
      await pay(scene);
      expect((await scene.rider.order(scene.reference)).state).toBe('refunded');
      expect(await scenes.card(sessionOf(second.body.paymentUrl as string))).toBe(true);
      await scenes.rest();
      expect((await scene.rider.order(second.body.reference as string)).state).toBe('paid');
    });
  });

  describe('a refund', () => {
    const refund = async (card?: string) => {
      const scene = await scenes.paid('self', card);
      await scene.rider.browser.post(`/api/orders/${scene.reference}/refund`).send({}).expect(200);
      return scene;
    };

    it('is asked for once although the answer is lost, and done when the provider says so', async () => {
      await scenes.fault({ fault: 'lose-answer', path: '/v1/refunds', method: 'POST' });
      const { rider, reference } = await refund();
      expect((await rider.order(reference)).state).toBe('refunding');
      await scenes.rest();
      expect((await rider.order(reference)).state).toBe('refunded');
    });

    it('waits for a bank that takes its time', async () => {
      const { rider, reference } = await refund('4000000000007726');
      await app.drainOutbox();
      expect((await rider.order(reference)).state).toBe('refunding');
      await new Promise((resolve) => setTimeout(resolve, 700));
      await scenes.rest();
      expect((await rider.order(reference)).state).toBe('refunded');
    });

    it('is owed again, and the rider asked, when the bank hands it back', async () => {
      const { rider, reference } = await refund('4000000000005126');
      await new Promise((resolve) => setTimeout(resolve, 100));
      await app.drainOutbox();
      await new Promise((resolve) => setTimeout(resolve, 700));
      await scenes.rest();
      const order = await rider.order(reference);
      expect(order.state).toBe('refunding');
      const failed = scenes.riderSubjects(reference).filter((subject) => /did not take/.test(subject));
      expect(failed).toHaveLength(1);
    });

    it('is tried again when the provider is away', async () => {
      const { rider, reference } = await refund();
      await scenes.fault({ fault: 'answer-500-once', path: '/v1/refunds', method: 'POST', times: 3 });
      await app.drainOutbox();
      expect((await rider.order(reference)).state).toBe('refunding');
      app.clock.advance({ minutes: 1 });
      await scenes.rest();
      expect((await rider.order(reference)).state).toBe('refunded');
    });
  });
});
