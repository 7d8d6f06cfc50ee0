import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it, onTestFinished } from 'vitest';
import { SessionClock } from '../src/checkout/session-clock.js';
import { payByForm, sessionParams, start } from './support/harness.js';

describe('time', () => {
  it('calls when a session is due, and not for one that was cleared', async () => {
    const due: string[] = [];
    const clock = new SessionClock((id) => due.push(id));
    const now = Math.floor(Date.now() / 1000);
    clock.set('soon', now + 1);
    clock.set('cleared', now);
    clock.clear('cleared');
    clock.set('long', now + 86_400);
    await expect.poll(() => due, { timeout: 3000 }).toEqual(['soon']);
    expect(Date.now()).toBeGreaterThanOrEqual((now + 1) * 1000);
    clock.clearAll();
  });
});

describe('a restart with a state file', () => {
  it('still knows the payment, refunds it, and expires what ran out meanwhile', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'fake-stripe-'));
    onTestFinished(() => rmSync(folder, { recursive: true }));
    const stateFile = join(folder, 'state.json');
    const before = await start({ stateFile });
    const paid = await before.stripe.checkout.sessions.create(sessionParams());
    await payByForm(before.fake, paid.id, '4242424242424242');
    const open = await before.stripe.checkout.sessions.create(sessionParams());
    const overdue = await before.stripe.checkout.sessions.create(sessionParams());
    const slow = await before.stripe.paymentIntents.create({
      amount: 5000,
      currency: 'gbp',
      payment_method: 'pm_card_pendingRefund',
      confirm: true,
    });
    const pending = await before.stripe.refunds.create({ payment_intent: slow.id });
    await before.fake.close();

    const text = readFileSync(stateFile, 'utf8');
    const saved = JSON.parse(text) as { sessions: [string, { expires_at: number }][] };
    for (const [id, session] of saved.sessions) if (id === overdue.id) session.expires_at = 1;
    writeFileSync(stateFile, JSON.stringify(saved));

    const { fake, stripe } = await start({ stateFile });
    expect(await stripe.refunds.retrieve(pending.id)).toMatchObject({ status: 'succeeded' });
    const session = await stripe.checkout.sessions.retrieve(paid.id);
    expect(session.status).toBe('complete');
    expect(await stripe.refunds.create({ payment_intent: session.payment_intent as string })).toMatchObject({
      amount: 74_000,
    });
    expect((await stripe.checkout.sessions.retrieve(open.id)).url).toBe(`${fake.url}/pay/${open.id}`);
    const [event] = (await stripe.events.list({ type: 'checkout.session.expired' })).data;
    expect(event?.data.object).toMatchObject({ id: overdue.id, status: 'expired' });
  });
});
