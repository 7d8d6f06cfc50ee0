import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { payByForm, sessionParams, start } from './support/harness.js';

const eventTypes = async (stripe: Awaited<ReturnType<typeof start>>['stripe']): Promise<string[]> =>
  (await stripe.events.list({ limit: 100 })).data.map(({ type }) => type as string).reverse();

describe('the hosted payment page', () => {
  it('shows what is paid for, with labelled inputs and no way out but our own style', async () => {
    const { stripe } = await start();
    const name = '<b>Shock</b> & "kit"';
    const line = { quantity: 1, price_data: { currency: 'gbp', unit_amount: 1250, product_data: { name } } };
    const session = await stripe.checkout.sessions.create(sessionParams({ line_items: [line] }));
    const answer = await fetch(session.url ?? '');
    const page = await answer.text();
    const style = /<style>([^]*)<\/style>/.exec(page)?.[1] ?? '';
    const hash = createHash('sha256').update(style).digest('base64');
    expect(answer.headers.get('content-security-policy')).toContain(
      `default-src 'none'; style-src 'sha256-${hash}'`,
    );
    expect(page).toContain('<h1>Test payment page</h1>');
    expect(page).toContain('No real money moves');
    expect(page).toContain('&lt;b&gt;Shock&lt;/b&gt; &amp; &quot;kit&quot;');
    expect(page).toContain('Pay £12.50</button>');
    expect(page).toContain('Cancel and go back</button>');
    expect(page).toContain('Receipt to rider@example.com');
    for (const [input, autocomplete] of Object.entries({
      number: 'cc-number',
      expiry: 'cc-exp',
      cvc: 'cc-csc',
      name: 'cc-name',
    })) {
      expect(page).toMatch(new RegExp(`<label for="${input}">`));
      expect(page).toMatch(
        new RegExp(`<input\\s+id="${input}"[^>]*name="${input}"[^>]*autocomplete="${autocomplete}"`),
      );
    }
    expect(page).not.toMatch(/<script|src=|https?:\/\/(?!127)/);
  });

  it('takes a good card, goes to the success address and completes the session once', async () => {
    const { fake, stripe } = await start();
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    const answer = await payByForm(fake, id, '4242 4242 4242 4242');
    expect(answer.status).toBe(303);
    expect(answer.headers.get('location')).toBe(`http://127.0.0.1:1/orders/1?session=${id}`);
    const again = await payByForm(fake, id, '4242424242424242');
    expect(again.headers.get('location')).toBe(`http://127.0.0.1:1/orders/1?session=${id}`);
    expect(await eventTypes(stripe)).toEqual([
      'payment_intent.created',
      'charge.succeeded',
      'payment_intent.succeeded',
      'checkout.session.completed',
    ]);
    const session = await stripe.checkout.sessions.retrieve(id);
    expect(session).toMatchObject({ status: 'complete', payment_status: 'paid', url: null });
    expect(session.customer_details).toMatchObject({ email: 'rider@example.com', name: 'Test Rider' });
    expect(await (await fetch(`${fake.url}/pay/${id}`)).text()).toContain('Already paid');
  });

  it.each([
    ['4000000000000002', 'card_declined', 'generic_decline', 'Your card was declined.'],
    ['4000000000009995', 'card_declined', 'insufficient_funds', 'Your card has insufficient funds.'],
    ['4000000000000069', 'expired_card', 'expired_card', 'Your card has expired.'],
  ])(
    'declines %s, leaves the session open and takes another card',
    async (number, code, decline_code, message) => {
      const { fake, stripe } = await start();
      const { id } = await stripe.checkout.sessions.create(sessionParams());
      const answer = await payByForm(fake, id, number);
      expect(answer.headers.get('location')).toBe(`/pay/${id}`);
      const page = await (await fetch(`${fake.url}/pay/${id}`)).text();
      expect(page).toContain(`${message.replace("'", '&#39;')} You can try another card.`);
      expect(page).toContain('<title>Error: Test payment page</title>');
      const open = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent'] });
      expect(open).toMatchObject({
        status: 'open',
        payment_intent: { status: 'requires_payment_method', last_payment_error: { code, decline_code } },
      });
      await payByForm(fake, id, '4242424242424242');
      expect(await stripe.checkout.sessions.retrieve(id)).toMatchObject({ status: 'complete' });
      expect(await eventTypes(stripe)).toEqual([
        'payment_intent.created',
        'charge.failed',
        'payment_intent.payment_failed',
        'charge.succeeded',
        'payment_intent.succeeded',
        'checkout.session.completed',
      ]);
    },
  );

  it.each(['4000002500003155', '4000002760003184'])(
    'asks for confirmation with %s: refused, then completed',
    async (number) => {
      const { fake, stripe } = await start();
      const { id } = await stripe.checkout.sessions.create(sessionParams());
      const answer = async (outcome: string): Promise<Response> => {
        const asked = await payByForm(fake, id, number);
        const url = `${fake.url}${asked.headers.get('location')}`;
        const page = await (await fetch(url)).text();
        expect(page).toMatch(/Complete\s*<\/button>/);
        expect(page).toMatch(/Refuse\s*<\/button>/);
        return fetch(url, { method: 'POST', redirect: 'manual', body: new URLSearchParams({ outcome }) });
      };
      expect((await answer('refuse')).headers.get('location')).toBe(`/pay/${id}`);
      const refused = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent'] });
      expect(refused).toMatchObject({
        status: 'open',
        payment_intent: { last_payment_error: { code: 'payment_intent_authentication_failure' } },
      });
      expect((await answer('complete')).headers.get('location')).toContain(`session=${id}`);
      expect(await stripe.checkout.sessions.retrieve(id)).toMatchObject({ status: 'complete' });
    },
  );

  it('declines 4000008400001629 after the confirmation was completed', async () => {
    const { fake, stripe } = await start();
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    const asked = await payByForm(fake, id, '4000008400001629');
    const url = `${fake.url}${asked.headers.get('location')}`;
    const done = await fetch(url, {
      method: 'POST',
      redirect: 'manual',
      body: new URLSearchParams({ outcome: 'complete' }),
    });
    expect(done.headers.get('location')).toBe(`/pay/${id}`);
    const session = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent'] });
    expect(session).toMatchObject({
      status: 'open',
      payment_intent: { last_payment_error: { decline_code: 'generic_decline' } },
    });
  });

  it('names every wrong field and charges nothing', async () => {
    const { fake, stripe } = await start();
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    const answer = await payByForm(fake, id, '4242424242424241', { expiry: '01/20', cvc: '1', name: '' });
    expect(answer.status).toBe(422);
    const page = await answer.text();
    for (const message of [
      'has a wrong digit',
      'is in the past',
      '3 or 4 digits',
      'Enter the name on the card',
    ])
      expect(page).toContain(message);
    expect(page).toContain('value="4242424242424241"');
    expect(await stripe.checkout.sessions.retrieve(id)).toMatchObject({ payment_intent: null });
  });

  it('goes back on cancel and leaves the session open', async () => {
    const { fake, stripe } = await start();
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    const answer = await fetch(`${fake.url}/pay/${id}/cancel`, { method: 'POST', redirect: 'manual' });
    expect(answer.headers.get('location')).toBe('http://127.0.0.1:1/plans/1?cancelled=1');
    expect(await stripe.checkout.sessions.retrieve(id)).toMatchObject({ status: 'open' });
  });

  it('takes no card once expired, even in the middle of a confirmation', async () => {
    const { fake, stripe, control } = await start();
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    const asked = await payByForm(fake, id, '4000002500003155');
    await control.post(`/sessions/${id}/expire-now`);
    await fetch(`${fake.url}${asked.headers.get('location')}`, {
      method: 'POST',
      redirect: 'manual',
      body: new URLSearchParams({ outcome: 'complete' }),
    });
    await payByForm(fake, id, '4242424242424242');
    expect(await (await fetch(`${fake.url}/pay/${id}`)).text()).toContain('This payment page has expired');
    const session = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent'] });
    expect(session).toMatchObject({
      status: 'expired',
      payment_status: 'unpaid',
      payment_intent: { status: 'canceled' },
    });
    expect(await eventTypes(stripe)).toContain('checkout.session.expired');
    expect(await eventTypes(stripe)).not.toContain('charge.succeeded');
  });
});
