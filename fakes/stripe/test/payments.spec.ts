import { describe, expect, it } from 'vitest';
import type Stripe from 'stripe';
import { start } from './support/harness.js';

const pay = (
  stripe: Stripe,
  payment_method = 'pm_card_visa',
  amount = 10_000,
): Promise<Stripe.PaymentIntent> =>
  stripe.paymentIntents.create({
    amount,
    currency: 'gbp',
    payment_method,
    confirm: true,
    transfer_group: 'g',
  });

describe('payment intents', () => {
  it('is confirmed, or refused by the card with the intent in the error', async () => {
    const { stripe } = await start();
    const intent = await stripe.paymentIntents.create({
      amount: 5000,
      currency: 'gbp',
      metadata: { order: '1' },
    });
    expect(intent.status).toBe('requires_payment_method');
    await expect(
      stripe.paymentIntents.confirm(intent.id, {
        payment_method: 'pm_card_visa_chargeDeclinedInsufficientFunds',
      }),
    ).rejects.toMatchObject({
      type: 'StripeCardError',
      statusCode: 402,
      code: 'card_declined',
      decline_code: 'insufficient_funds',
      payment_intent: { id: intent.id, status: 'requires_payment_method' },
    });
    const paid = await stripe.paymentIntents.confirm(intent.id, {
      payment_method: 'pm_card_visa',
      expand: ['latest_charge'],
    });
    expect(paid).toMatchObject({
      status: 'succeeded',
      latest_charge: { paid: true, metadata: { order: '1' } },
    });
    await expect(stripe.paymentIntents.cancel(intent.id)).rejects.toMatchObject({
      code: 'payment_intent_unexpected_state',
    });
    expect((await stripe.paymentIntents.list()).data.map(({ id }) => id)).toEqual([intent.id]);
  });

  it('waits for the bank where the card asks for it, and can be cancelled meanwhile', async () => {
    const { fake, stripe } = await start();
    const intent = await pay(stripe, 'pm_card_authenticationRequired');
    expect(intent).toMatchObject({
      status: 'requires_action',
      next_action: { redirect_to_url: { url: `${fake.url}/authenticate/${intent.id}` } },
    });
    expect(await stripe.paymentIntents.cancel(intent.id)).toMatchObject({
      status: 'canceled',
      next_action: null,
    });
    const [event] = (await stripe.events.list({ type: 'payment_intent.canceled' })).data;
    expect(event?.data.object).toMatchObject({ id: intent.id, status: 'canceled' });
  });
});

describe('refunds', () => {
  it('gives back in parts, never more than was paid', async () => {
    const { stripe } = await start();
    const intent = await pay(stripe);
    await expect(stripe.refunds.create({ payment_intent: intent.id, amount: 10_001 })).rejects.toMatchObject({
      type: 'StripeInvalidRequestError',
      param: 'amount',
      message: 'Refund amount (£100.01) is greater than charge amount (£100.00)',
    });
    const part = await stripe.refunds.create({
      payment_intent: intent.id,
      amount: 4000,
      reason: 'requested_by_customer',
    });
    expect(part).toMatchObject({
      object: 'refund',
      amount: 4000,
      status: 'succeeded',
      charge: intent.latest_charge,
    });
    await expect(stripe.refunds.create({ payment_intent: intent.id, amount: 6001 })).rejects.toMatchObject({
      message: 'Refund amount (£60.01) is greater than unrefunded amount on charge (£60.00)',
    });
    expect((await stripe.refunds.create({ charge: intent.latest_charge as string })).amount).toBe(6000);
    await expect(stripe.refunds.create({ payment_intent: intent.id })).rejects.toMatchObject({
      code: 'charge_already_refunded',
    });
    const charge = await stripe.charges.retrieve(intent.latest_charge as string, { expand: ['refunds'] });
    expect(charge).toMatchObject({ refunded: true, amount_refunded: 10_000 });
    expect(charge.refunds?.data.map(({ amount }) => amount)).toEqual([6000, 4000]);
    const types = (await stripe.events.list({ types: ['refund.created', 'charge.refunded'] })).data;
    expect(types).toHaveLength(4);
  });

  it('refuses what was never paid', async () => {
    const { stripe } = await start();
    const unpaid = await stripe.paymentIntents.create({ amount: 5000, currency: 'gbp' });
    await expect(stripe.refunds.create({ payment_intent: unpaid.id })).rejects.toMatchObject({
      param: 'payment_intent',
    });
    await expect(stripe.refunds.create({ payment_intent: 'pi_none' })).rejects.toMatchObject({
      code: 'resource_missing',
    });
    await expect(stripe.refunds.create({})).rejects.toMatchObject({ code: 'parameter_missing' });
  });

  it('ends later, well or badly, for the two cards that are made for it', async () => {
    const { stripe } = await start();
    const [slow, bad] = [await pay(stripe, 'pm_card_pendingRefund'), await pay(stripe, 'pm_card_refundFail')];
    const later = await stripe.refunds.create({ payment_intent: slow.id });
    const failing = await stripe.refunds.create({ payment_intent: bad.id });
    expect([later.status, failing.status]).toEqual(['pending', 'succeeded']);
    await expect
      .poll(async () => (await stripe.refunds.retrieve(later.id)).status, { timeout: 3000 })
      .toBe('succeeded');
    await expect
      .poll(async () => (await stripe.refunds.retrieve(failing.id)).status, { timeout: 3000 })
      .toBe('failed');
    expect(await stripe.charges.retrieve(bad.latest_charge as string)).toMatchObject({
      refunded: false,
      amount_refunded: 0,
    });
    expect((await stripe.events.list({ type: 'refund.failed' })).data).toHaveLength(1);
  });
});

describe('connected accounts and transfers', () => {
  it('moves no more than the charge brought, and takes back no more than was moved', async () => {
    const { stripe } = await start();
    const account = await stripe.accounts.create({
      type: 'express',
      country: 'GB',
      metadata: { shop: 'one' },
    });
    expect(account).toMatchObject({
      charges_enabled: true,
      payouts_enabled: true,
      metadata: { shop: 'one' },
    });
    const intent = await pay(stripe);
    const source_transaction = intent.latest_charge as string;
    const base = { currency: 'gbp', destination: account.id };
    const transfer = await stripe.transfers.create({ ...base, amount: 9000, source_transaction });
    expect(transfer).toMatchObject({ amount: 9000, transfer_group: 'g', reversed: false });
    await expect(
      stripe.transfers.create({ ...base, amount: 1001, source_transaction }),
    ).rejects.toMatchObject({ param: 'amount' });
    await expect(stripe.transfers.create({ ...base, amount: 1001 })).rejects.toMatchObject({
      code: 'balance_insufficient',
    });
    await expect(
      stripe.transfers.create({ ...base, amount: 1, destination: 'acct_none' }),
    ).rejects.toMatchObject({ code: 'resource_missing' });
    await stripe.transfers.createReversal(transfer.id, { amount: 4000 });
    await expect(stripe.transfers.createReversal(transfer.id, { amount: 5001 })).rejects.toMatchObject({
      param: 'amount',
    });
    expect((await stripe.balance.retrieve()).available).toMatchObject([{ amount: 5000, currency: 'gbp' }]);
    expect((await stripe.balance.retrieve({}, { stripeAccount: account.id })).available).toMatchObject([
      { amount: 5000 },
    ]);
    const seen = await stripe.transfers.retrieve(transfer.id);
    expect(seen).toMatchObject({
      amount_reversed: 4000,
      reversed: false,
      reversals: { data: [{ amount: 4000 }] },
    });
    const types = (await stripe.events.list({ types: ['transfer.*'] })).data.map(({ type }) => type);
    expect(types).toEqual(['transfer.reversed', 'transfer.created']);
  });
});

describe('customers', () => {
  it('keeps, updates and unsets what is sent', async () => {
    const { stripe } = await start();
    const { id } = await stripe.customers.create({
      email: 'rider@example.com',
      name: 'A',
      metadata: { a: '1', b: '2' },
    });
    const updated = await stripe.customers.update(id, { name: '', metadata: { a: '', c: '3' } });
    expect(updated).toMatchObject({ email: 'rider@example.com', name: null });
    expect(updated.metadata).toEqual({ b: '2', c: '3' });
    expect((await stripe.customers.list({ email: 'nobody@example.com' })).data).toEqual([]);
  });
});
