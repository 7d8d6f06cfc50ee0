import { describe, expect, it } from 'vitest';
import type { LoggedRequest } from '../src/index.js';
import { sdk, sessionParams, start } from './support/harness.js';

describe('Idempotency-Key', () => {
  it('answers the same request again with the stored answer', async () => {
    const { stripe, control } = await start();
    const first = await stripe.checkout.sessions.create(sessionParams(), { idempotencyKey: 'order-1' });
    const second = await stripe.checkout.sessions.create(sessionParams(), { idempotencyKey: 'order-1' });
    expect(second.id).toBe(first.id);
    expect(first.lastResponse.headers['idempotent-replayed']).toBeUndefined();
    expect(second.lastResponse.headers['idempotent-replayed']).toBe('true');
    expect(second.lastResponse.headers['original-request']).toBe(first.lastResponse.requestId);
    expect((await stripe.checkout.sessions.list()).data).toHaveLength(1);
    const { requests } = await control.get<{ requests: LoggedRequest[] }>('/requests');
    expect(
      requests.map(({ method, idempotencyKey, replayed }) => [method, idempotencyKey, replayed]),
    ).toEqual([
      ['POST', 'order-1', false],
      ['POST', 'order-1', true],
      ['GET', null, false],
    ]);
  });

  it('refuses the key with another body or for another endpoint', async () => {
    const { stripe } = await start();
    await stripe.customers.create({ email: 'rider@example.com' }, { idempotencyKey: 'k' });
    const wrong = { type: 'StripeIdempotencyError', statusCode: 400 };
    await expect(
      stripe.customers.create({ email: 'other@example.com' }, { idempotencyKey: 'k' }),
    ).rejects.toMatchObject(wrong);
    await expect(
      stripe.accounts.create({ email: 'rider@example.com' }, { idempotencyKey: 'k' }),
    ).rejects.toMatchObject(wrong);
  });

  it('answers 409 while the first request with the key is running', async () => {
    const { stripe, control } = await start();
    await control.post('', { fault: 'slow-answer', delayMs: 300 });
    const slow = stripe.customers.create({ name: 'A' }, { idempotencyKey: 'k' });
    await new Promise((resolve) => setTimeout(resolve, 100));
    await expect(stripe.customers.create({ name: 'A' }, { idempotencyKey: 'k' })).rejects.toMatchObject({
      statusCode: 409,
      code: 'idempotency_key_in_use',
    });
    expect((await slow).name).toBe('A');
    expect((await stripe.customers.list()).data).toHaveLength(1);
  });

  it('keeps a refusal by the state of things, but not one of the parameters', async () => {
    const { stripe } = await start();
    const declined = {
      amount: 5000,
      currency: 'gbp',
      payment_method: 'pm_card_visa_chargeDeclined',
      confirm: true,
    };
    for (const replayed of [undefined, 'true']) {
      const error: { type?: string; headers?: Record<string, string> } = await stripe.paymentIntents
        .create(declined, { idempotencyKey: 'card' })
        .then(
          () => ({}),
          (reason: object) => reason,
        );
      expect(error.type).toBe('StripeCardError');
      expect(error.headers?.['idempotent-replayed']).toBe(replayed);
    }
    expect((await stripe.charges.list()).data).toHaveLength(1);
    await expect(
      stripe.paymentIntents.create({ amount: 0, currency: 'gbp' }, { idempotencyKey: 'amount' }),
    ).rejects.toMatchObject({ statusCode: 400 });
    expect(
      (await stripe.paymentIntents.create({ amount: 100, currency: 'gbp' }, { idempotencyKey: 'amount' }))
        .amount,
    ).toBe(100);
  });
});

describe('faults of the API', () => {
  it('loses the answer after the work was done; the same key finds it', async () => {
    const { stripe, control } = await start();
    // The SDK itself tries a closed connection once more, so one loss goes unseen and two do not.
    await control.post('', { fault: 'lose-answer', path: '/v1/checkout/sessions', method: 'POST', times: 2 });
    const create = () => stripe.checkout.sessions.create(sessionParams(), { idempotencyKey: 'order-1' });
    await expect(create()).rejects.toMatchObject({ type: 'StripeConnectionError' });
    const { data } = await stripe.checkout.sessions.list();
    expect(data).toHaveLength(1);
    expect((await create()).id).toBe(data[0]?.id);
    expect((await stripe.checkout.sessions.list()).data).toHaveLength(1);
  });

  it('answers 500 once without doing anything; the SDK gets through on its retry', async () => {
    const { fake, stripe, control } = await start();
    await control.post('', { fault: 'answer-500-once', path: '/v1/refunds' });
    await control.post('', { fault: 'answer-500-once', path: '/v1/customers' });
    await expect(stripe.customers.create({ name: 'A' })).rejects.toMatchObject({
      statusCode: 500,
      type: 'StripeAPIError',
    });
    expect((await stripe.customers.list()).data).toHaveLength(0);
    await control.post('', { fault: 'answer-500-once', path: '/v1/customers' });
    expect((await sdk(fake, undefined, 2).customers.create({ name: 'B' })).name).toBe('B');
    expect(await control.get('/faults')).toEqual({
      pending: [{ fault: 'answer-500-once', path: '/v1/refunds', times: 1 }],
    });
    expect((await control.post('', { fault: 'nonsense' })).status).toBe(400);
  });

  it('forgets everything on reset', async () => {
    const { stripe, control } = await start();
    await stripe.customers.create({ name: 'A' });
    await control.post('', { fault: 'answer-429' });
    await control.post('/reset');
    expect((await stripe.customers.list()).data).toHaveLength(0);
    expect(await control.get('/faults')).toEqual({ pending: [] });
  });
});
