import type { PlanView } from '@linkfell/contracts';

import { startTestApp, type TestApp } from '../support/app.js';
import { guestWith } from '../support/guest.js';
import { contact } from '../support/journey.js';
import { assertAllInvariants } from './invariants.js';
import { Scenes, sessionOf, shock } from './scenes.js';

describe('checkout', () => {
  let app: TestApp;
  let scenes: Scenes;
  beforeAll(async () => {
    app = await startTestApp();
    app.clock.set(new Date().toISOString());
    scenes = new Scenes(app);
    // One stand each: a slot is a slot.
    await app.manager.query(
      `DELETE FROM stands WHERE id NOT IN (SELECT min(id) FROM stands GROUP BY organisation_id)`,
    );
    await scenes.onlyAt(shock, 'fellside-parts', 60);
  });
  afterEach(async () => {
    await scenes.rest();
    await assertAllInvariants(app);
  });
  afterAll(() => app.close());

  const send = (browser: ReturnType<TestApp['client']>, plan: PlanView, body: object, key: string) =>
    browser
      .post(`/api/plans/${plan.id}/checkout`)
      .set('Idempotency-Key', `checkout-${plan.id}-${key}`)
      .send({ contact, acceptTerms: true, totalMinor: plan.totalMinor, ...body });

  it('holds stock and stand, and opens one page for one order', async () => {
    const { rider, plan, reference, sessionId } = await scenes.held();
    const order = await rider.order(reference);
    expect(order).toMatchObject({
      state: 'held',
      totalMinor: plan.totalMinor,
      actions: ['pay', 'cancel-payment'],
    });
    expect(order.booking?.start).toBe(plan.choices.slotStart);
    const again = await rider.checkout(plan).expect(201);
    expect(again.body.reference).toBe(reference);
    expect(sessionOf(again.body.paymentUrl)).toBe(sessionId);
  });

  it('lets a second press with another address replace the first, which is ended by call', async () => {
    const { rider, plan, reference, sessionId } = await scenes.held('self');
    const moved = { ...contact, street: '9 Quarry Row' };
    const { body } = await send(rider.browser, plan, { contact: moved }, 'moved').expect(201);
    expect(body.reference).not.toBe(reference);
    expect(await rider.order(reference)).toMatchObject({ state: 'released', releaseReason: 'replaced' });
    expect(await scenes.card(sessionId)).toBe(false);
    expect(await scenes.card(sessionOf(body.paymentUrl as string))).toBe(true);
    await scenes.rest();
    expect((await rider.order(body.reference as string)).parcels[0]?.to).toContain('9 Quarry Row');
    expect(scenes.riderSubjects(reference)).toEqual([]);
  });

  it('follows a plan that was changed after the first press', async () => {
    const { rider, plan, reference } = await scenes.held();
    app.clock.advance({ minutes: 1 });
    const { body } = await rider.browser
      .put(`/api/plans/${plan.id}/choices`)
      .set('If-Match', `"${plan.revision}"`)
      .send({ fit: 'self' })
      .expect(200);
    const second = await rider.checkout(body as PlanView).expect(201);
    expect((await rider.order(second.body.reference as string)).fit).toBe('self');
    expect((await rider.order(reference)).state).toBe('released');
  });

  it('gives whoever came by the rider’s link neither the order nor its end', async () => {
    const { rider, plan, reference } = await scenes.held();
    const visitor = await guestWith(app, { measureUps: [plan.measureUpId] });
    const other = { ...contact, name: 'Crow Tarrant', email: 'crow@rider.example' };
    const refused = await send(visitor, plan, { contact: other }, 'visitor');
    expect([refused.status, refused.body.code]).toEqual([409, 'held-elsewhere']);
    await visitor.get(`/api/orders/${reference}`).expect(404);
    expect((await rider.order(reference)).state).toBe('held');
  });

  it('is refused with the new total when the price has changed, and goes through with that', async () => {
    const { rider, plan } = await scenes.plan();
    const row = plan.lines.find(({ kind }) => kind === 'item');
    await app.manager.query(`UPDATE listings SET price_minor = price_minor + 250 WHERE item_id = $1`, [
      shock,
    ]);
    const refused = await rider.checkout(plan);
    expect([refused.status, refused.body.code]).toEqual([409, 'price-changed']);
    expect(refused.body.totalMinor).toBe(plan.totalMinor + 250);
    expect(refused.body.detail).toContain(`£${((plan.totalMinor + 250) / 100).toFixed(2)}`);
    await send(rider.browser, plan, { totalMinor: refused.body.totalMinor as number }, 'dearer').expect(201);
    expect(row?.quantity).toBe(1);
  });

  it('wants a key, the terms, and a contact that can be reached', async () => {
    const { rider, plan } = await scenes.plan();
    const at = `/api/plans/${plan.id}/checkout`;
    const body = { contact, acceptTerms: true, totalMinor: plan.totalMinor };
    expect((await rider.browser.post(at).send(body)).status).toBe(400);
    const wrong = {
      contact: { ...contact, email: 'nobody' },
      acceptTerms: false,
      totalMinor: plan.totalMinor,
    };
    const refused = await send(rider.browser, plan, wrong, 'wrong');
    expect(refused.status).toBe(422);
    const pointers = (refused.body.errors as { pointer: string }[]).map(({ pointer }) => pointer);
    expect(pointers.sort()).toEqual(['/acceptTerms', '/contact/email']);
  });

  it('gives the last slot to one of six who press at once, and offers the others the next', async () => {
    const six = await Promise.all(Array.from({ length: 6 }, () => scenes.plan()));
    const wanted = new Set(six.map(({ plan }) => plan.choices.slotStart));
    expect(wanted.size).toBe(1);
    const answers = await Promise.all(six.map(({ rider, plan }) => rider.checkout(plan)));
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409, 409, 409, 409]);
    for (const { body } of answers.filter(({ status }) => status === 409)) {
      expect(body.code).toBe('slot-taken');
      expect(body.slots.length).toBeGreaterThan(0);
      expect(body.slots.map(({ start }: { start: string }) => start)).not.toContain([...wanted][0]);
    }
  });

  it('sells the last unit to one of six who press at once, and names it to the others', async () => {
    await scenes.onlyAt(shock, 'fellside-parts', 1);
    const six = await Promise.all(Array.from({ length: 6 }, () => scenes.plan('self')));
    const answers = await Promise.all(six.map(({ rider, plan }) => rider.checkout(plan)));
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409, 409, 409, 409]);
    for (const { body } of answers.filter(({ status }) => status === 409)) {
      expect(body.code).toBe('stock-gone');
      expect(body.detail).toContain('Tarn');
      expect(body.detail).toContain('Your plan and answers are kept');
    }
    await scenes.onlyAt(shock, 'fellside-parts', 20);
  });

  it('lets eight who press at once through when there is enough', async () => {
    const many = await Promise.all(Array.from({ length: 8 }, () => scenes.plan('self')));
    const answers = await Promise.all(many.map(({ rider, plan }) => rider.checkout(plan)));
    expect(answers.map(({ status }) => status)).toEqual(Array(8).fill(201));
  });
});
