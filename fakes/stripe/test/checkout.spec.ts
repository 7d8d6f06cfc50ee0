import { describe, expect, it } from 'vitest';
import Stripe from 'stripe';
import { payByForm, sdk, sessionParams, start } from './support/harness.js';

const now = (): number => Math.floor(Date.now() / 1000);

describe('Checkout Sessions through the SDK', () => {
  it('makes an open session with its total, address and the id format of the API', async () => {
    const { fake, stripe } = await start();
    const session = await stripe.checkout.sessions.create(sessionParams());
    expect(session).toMatchObject({
      object: 'checkout.session',
      amount_total: 74_000,
      currency: 'gbp',
      status: 'open',
      payment_status: 'unpaid',
      payment_intent: null,
      client_reference_id: 'order-1',
      customer_email: 'rider@example.com',
      metadata: { order: 'order-1' },
      url: `${fake.url}/pay/${session.id}`,
    });
    expect(session.id).toMatch(/^cs_test_[A-Za-z0-9]{58}$/);
    expect(session.expires_at - session.created).toBe(86_400);
    expect(session.lastResponse.requestId).toMatch(/^req_/);
    expect(session.line_items).toBeUndefined();
  });

  it('keeps expires_at within 30 minutes and 24 hours', async () => {
    const { stripe } = await start();
    const create = (expires_at: number) => stripe.checkout.sessions.create(sessionParams({ expires_at }));
    await expect(create(now() + 29 * 60)).rejects.toMatchObject({ statusCode: 400, param: 'expires_at' });
    await expect(create(now() + 24 * 3600 + 60)).rejects.toMatchObject({
      statusCode: 400,
      param: 'expires_at',
    });
    const expiresAt = now() + 31 * 60;
    expect((await create(expiresAt)).expires_at).toBe(expiresAt);
  });

  it.each([
    ['mode', { mode: undefined }, 'parameter_missing'],
    ['success_url', { success_url: 'orders/1' }, 'url_invalid'],
    ['line_items', { line_items: undefined }, 'parameter_missing'],
    ['customer_email', { customer_email: 'nobody' }, 'email_invalid'],
    ['tax_id_collection', { tax_id_collection: { enabled: true } }, 'parameter_unknown'],
  ])('refuses a wrong %s', async (param, over, code) => {
    const { stripe } = await start();
    await expect(stripe.checkout.sessions.create(sessionParams(over))).rejects.toMatchObject({
      type: 'StripeInvalidRequestError',
      param,
      code,
    });
  });

  it('names the line whose figure is wrong', async () => {
    const { stripe } = await start();
    const params = sessionParams();
    const bad = {
      quantity: 0,
      price_data: { currency: 'gbp', unit_amount: 100, product_data: { name: 'Spring' } },
    };
    params.line_items = [...(params.line_items ?? []), bad];
    await expect(stripe.checkout.sessions.create(params)).rejects.toMatchObject({
      param: 'line_items[2][quantity]',
    });
    const wrong = sessionParams({
      line_items: [
        { quantity: 1, price_data: { currency: 'gbp', unit_amount: 10.5, product_data: { name: 'Spring' } } },
      ],
    });
    await expect(stripe.checkout.sessions.create(wrong)).rejects.toMatchObject({
      code: 'parameter_invalid_integer',
    });
  });

  it('refuses a total below the least charge', async () => {
    const { stripe } = await start();
    const line = {
      quantity: 1,
      price_data: { currency: 'gbp', unit_amount: 29, product_data: { name: 'Washer' } },
    };
    await expect(
      stripe.checkout.sessions.create(sessionParams({ line_items: [line] })),
    ).rejects.toMatchObject({ code: 'amount_too_small' });
  });

  it('shows lines and payment on request', async () => {
    const { fake, stripe } = await start();
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    const lines = await stripe.checkout.sessions.listLineItems(id);
    expect(lines.data.map((line) => [line.description, line.quantity, line.amount_total])).toEqual([
      ['Air shock 210x55', 1, 68_000],
      ['Hardware 30x8', 2, 6000],
    ]);
    await payByForm(fake, id, '4242424242424242');
    const session = await stripe.checkout.sessions.retrieve(id, {
      expand: ['payment_intent.latest_charge', 'line_items'],
    });
    expect(session.line_items?.data).toHaveLength(2);
    const intent = session.payment_intent as Stripe.PaymentIntent;
    expect(intent).toMatchObject({
      status: 'succeeded',
      metadata: { order: 'order-1' },
      transfer_group: 'group-1',
      amount_received: 74_000,
    });
    expect(intent.latest_charge).toMatchObject({ object: 'charge', paid: true, amount_captured: 74_000 });
    await expect(stripe.checkout.sessions.retrieve(id, { expand: ['nonsense'] })).rejects.toMatchObject({
      statusCode: 400,
    });
  });

  it('expires an open session by call, once', async () => {
    const { stripe } = await start();
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    expect(await stripe.checkout.sessions.expire(id)).toMatchObject({ status: 'expired', url: null });
    await expect(stripe.checkout.sessions.expire(id)).rejects.toMatchObject({
      statusCode: 400,
      type: 'StripeInvalidRequestError',
    });
  });

  it('lists the newest first, page by page', async () => {
    const { stripe } = await start();
    const made: string[] = [];
    for (let i = 0; i < 5; i += 1) made.unshift((await stripe.checkout.sessions.create(sessionParams())).id);
    const first = await stripe.checkout.sessions.list({ limit: 2 });
    expect(first.data.map(({ id }) => id)).toEqual(made.slice(0, 2));
    expect(first.has_more).toBe(true);
    const all: string[] = [];
    for await (const { id } of stripe.checkout.sessions.list({ limit: 2 })) all.push(id);
    expect(all).toEqual(made);
    await expect(stripe.checkout.sessions.list({ limit: 101 })).rejects.toMatchObject({ param: 'limit' });
  });

  it('answers unknown ids, keys and addresses as the API documents', async () => {
    const { fake, stripe } = await start();
    await expect(stripe.checkout.sessions.retrieve('cs_test_none')).rejects.toMatchObject({
      statusCode: 404,
      code: 'resource_missing',
    });
    await expect(sdk(fake, 'sk_test_wrong_key_here').customers.list()).rejects.toMatchObject({
      type: 'StripeAuthenticationError',
      statusCode: 401,
    });
    await expect(stripe.products.list()).rejects.toMatchObject({
      statusCode: 404,
      type: 'StripeInvalidRequestError',
    });
  });
});
