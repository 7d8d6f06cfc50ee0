import { describe, expect, it } from 'vitest';
import Stripe from 'stripe';
import type { Delivery } from '../src/index.js';
import {
  payByForm,
  receiver,
  sessionParams,
  start,
  WEBHOOK_SECRET,
  type Received,
} from './support/harness.js';

const PAID = [
  'payment_intent.created',
  'charge.succeeded',
  'payment_intent.succeeded',
  'checkout.session.completed',
];

const verify = ({ body, signature }: Received): Stripe.Event =>
  Stripe.webhooks.constructEvent(body, signature, WEBHOOK_SECRET);

async function shop(...statuses: number[]) {
  const hook = await receiver(...statuses);
  const running = await start({
    webhookUrl: hook.url,
    webhookSecret: WEBHOOK_SECRET,
    webhookRetryMs: [30, 60],
  });
  const { fake, stripe } = running;
  const payOne = async (): Promise<string> => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await payByForm(fake, id, '4242424242424242');
    return id;
  };
  const settled = () =>
    expect
      .poll(async () => (await running.control.get<{ idle: boolean }>('/webhooks/deliveries')).idle)
      .toBe(true);
  return { ...running, hook, payOne, settled };
}

describe('webhooks', () => {
  it('arrive in order, signed so that the SDK accepts them', async () => {
    const { hook, payOne, stripe, settled } = await shop();
    const id = await payOne();
    await expect.poll(hook.types).toEqual(PAID);
    await settled();
    const event = verify(hook.received[3] as Received);
    expect(event.data.object).toMatchObject({
      id,
      status: 'complete',
      payment_status: 'paid',
      metadata: { order: 'order-1' },
    });
    expect(await stripe.events.retrieve(event.id)).toMatchObject({ id: event.id, pending_webhooks: 0 });
    const forged = {
      ...(hook.received[3] as Received),
      body: (hook.received[3] as Received).body.replace('order-1', 'order-2'),
    };
    expect(() => verify(forged)).toThrow(Stripe.errors.StripeSignatureVerificationError);
  });

  it('are tried again after a failure, and given up after the last try', async () => {
    const { hook, stripe, settled, control } = await shop(500, 503, 200, 500, 500, 500);
    const tries = async (): Promise<[number, number | null][]> => {
      const { deliveries } = await control.get<{ deliveries: Delivery[] }>('/webhooks/deliveries');
      return deliveries.map(({ attempt, status }) => [attempt, status]);
    };
    await stripe.customers.create({ name: 'A' });
    await expect.poll(() => hook.received.length).toBe(3);
    await settled();
    expect(await tries()).toEqual([
      [1, 500],
      [2, 503],
      [3, 200],
    ]);
    const { id } = await stripe.customers.create({ name: 'B' });
    await expect.poll(() => hook.received.length).toBe(6);
    await settled();
    expect((await tries()).slice(3)).toEqual([
      [1, 500],
      [2, 500],
      [3, 500],
    ]);
    const [event] = (await stripe.events.list({ limit: 1 })).data;
    expect(event).toMatchObject({ pending_webhooks: 1, data: { object: { id } } });
  });

  it('name the request that caused them', async () => {
    const { stripe, hook } = await shop();
    await stripe.customers.create({ name: 'A' }, { idempotencyKey: 'k' });
    await expect.poll(() => hook.received.length).toBe(1);
    expect(verify(hook.received[0] as Received).request).toMatchObject({ idempotency_key: 'k' });
  });

  it('come twice on request', async () => {
    const { hook, payOne, control, settled } = await shop();
    await control.post('', { fault: 'webhook-duplicate', type: 'checkout.session.completed' });
    await payOne();
    await expect.poll(hook.types).toEqual([...PAID, 'checkout.session.completed']);
    await settled();
    expect(verify(hook.received[4] as Received).id).toBe(verify(hook.received[3] as Received).id);
  });

  it('come late on request', async () => {
    const { hook, payOne, control } = await shop();
    await control.post('', { fault: 'webhook-late', type: 'charge.succeeded', delayMs: 200 });
    await payOne();
    await expect.poll(hook.types).toEqual([PAID[0], PAID[2], PAID[3], PAID[1]]);
  });

  it('come in the wrong order on request', async () => {
    const { hook, payOne, control } = await shop();
    await control.post('', { fault: 'webhook-reversed', times: 4 });
    await payOne();
    await expect.poll(hook.types).toEqual([...PAID].reverse());
  });

  it('come with a bad signature on request, and rightly when sent again', async () => {
    const { hook, payOne, control, stripe, settled } = await shop();
    await control.post('', { fault: 'webhook-bad-signature', type: 'checkout.session.completed' });
    await payOne();
    await expect.poll(() => hook.received.length).toBe(4);
    await settled();
    const bad = hook.received.find(({ body }) =>
      body.includes('"type": "checkout.session.completed"'),
    ) as Received;
    expect(() => verify(bad)).toThrow(Stripe.errors.StripeSignatureVerificationError);
    const [event] = (await stripe.events.list({ type: 'checkout.session.completed' })).data;
    await control.post(`/redeliver/${event?.id}`);
    await expect.poll(() => hook.received.length).toBe(5);
    expect(verify(hook.received[4] as Received).id).toBe(event?.id);
  });

  it('get lost on request, and wait while paused', async () => {
    const { hook, payOne, control } = await shop();
    await control.post('', { fault: 'webhook-lost', type: 'charge.succeeded' });
    await control.post('/webhooks/pause');
    await payOne();
    await new Promise((resolve) => setTimeout(resolve, 100));
    expect(hook.received).toHaveLength(0);
    await control.post('/webhooks/resume');
    await expect.poll(hook.types).toEqual([PAID[0], PAID[2], PAID[3]]);
  });

  it('can be pointed at an address later', async () => {
    const { fake, stripe } = await start();
    const hook = await receiver();
    await stripe.customers.create({ name: 'before' });
    fake.setWebhook(hook.url, WEBHOOK_SECRET);
    await stripe.customers.create({ name: 'after' });
    await expect.poll(() => hook.received.length).toBe(1);
    expect(verify(hook.received[0] as Received).data.object).toMatchObject({ name: 'after' });
  });
});
