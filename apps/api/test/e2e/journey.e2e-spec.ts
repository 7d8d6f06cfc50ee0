import type { BookingList, JobSheetView, OrderView, ParcelList, RebookOptions } from '@linkfell/contracts';
import ICAL from 'ical.js';

import { startTestApp, type TestApp } from '../support/app.js';
import {
  assertInvariants,
  contact,
  pay,
  RiderJourney,
  ownerOf,
  usualAnswers,
  webhooksIdle,
} from '../support/journey.js';

const frame = 'ullscar-withen-140';
const shock = 'vellacott-tarn-210x50';
const record = {
  serialNumber: 'VT-0042-17',
  spring: { kind: 'air', gaugePsi: 176 },
  sagMm: 13.8,
  torques: [{ bolt: 'Frame end', printedNm: 16, setNm: 16 }],
  travelChecked: true,
  noticesChecked: true,
  notes: '',
};

describe('from measurements to a fitted shock', () => {
  let app: TestApp;
  beforeAll(async () => {
    app = await startTestApp();
    // The payment service keeps real time, so this application does too.
    app.clock.set(new Date().toISOString());
  });
  afterEach(() => assertInvariants(app));
  afterAll(() => app.close());

  const mailsTo = (to: string, subject: RegExp) =>
    app.mail
      .messages()
      .filter(
        (message) =>
          message.to.some((address) => JSON.stringify(address).includes(to)) &&
          subject.test(message.subject ?? ''),
      );

  /** Paid, with the workshop's view of it. */
  async function paid(sizeId = shock) {
    const rider = new RiderJourney(app);
    const { plan, reference, sessionId } = await rider.held(frame, sizeId);
    await pay(app, sessionId);
    const workshopId = plan.choices.workshopId as string;
    const owner = await ownerOf(app, workshopId);
    const { body } = await owner.get(`/api/organisations/${workshopId}/bookings`).expect(200);
    const booking = (body as BookingList).bookings.find((each) => each.orderReference === reference);
    return { rider, plan, reference, owner, workshopId, bookingId: booking?.id as string };
  }

  async function sendAll(reference: string, order: OrderView) {
    for (const shop of new Set(
      order.lines.filter((line) => line.kind === 'item').map((line) => line.sellerId),
    )) {
      const keeper = await ownerOf(app, shop);
      const { parcels } = (await keeper.get(`/api/organisations/${shop}/parcels`)).body as ParcelList;
      const parcel = parcels.find((each) => each.orderReference === reference);
      await keeper
        .post(`/api/organisations/${shop}/parcels/${parcel?.id}/sent`)
        .send({ tracking: 'AB 12' })
        .expect(200);
    }
  }

  it('shows matches of every verdict with reasons, priced from the listings', async () => {
    const rider = new RiderJourney(app);
    const id = await rider.measureUp(usualAnswers(frame));
    const view = await rider.matches(id, '?wontFit=shown&limit=100');
    const row = view.rows.find(({ sizeId }) => sizeId === shock);
    expect(row?.verdict).toBe('bolts-straight-in');
    const [cheapest] = await app.manager.query<{ total: number }[]>(
      `SELECT min(l.price_minor + o.carriage_minor)::int AS total FROM listings l JOIN organisations o ON o.id = l.shop_id
        WHERE l.item_id = $1 AND l.quantity > l.reserved`,
      [shock],
    );
    expect(row?.price.partsMinor).toBe(cheapest?.total);
    expect(view.rows.filter(({ verdict }) => verdict === 'wont-fit').every(({ reason }) => reason)).toBe(
      true,
    );
    expect(view.rows.length + view.leftOut).toBe(Object.values(view.counts).reduce((a, b) => a + b, 0));
    const hidden = await rider.matches(id);
    expect(hidden.rows.some(({ verdict }) => verdict === 'wont-fit')).toBe(false);
  });

  it('goes the whole way, with the mails read', async () => {
    const { rider, reference, owner, workshopId, bookingId } = await paid();
    expect((await rider.order(reference)).state).toBe('paid');
    expect(mailsTo(contact.email, new RegExp(`${reference}: paid`))).toHaveLength(1);
    const at = `/api/organisations/${workshopId}/bookings/${bookingId}`;
    const sheet = (await owner.get(at).expect(200)).body as JobSheetView;
    expect(sheet.missing).toEqual([]);
    await owner.post(`${at}/accept`).send({}).expect(200);
    await app.drainOutbox();
    const [invitation] = mailsTo(contact.email, /Your fitting is agreed/);
    const calendar = invitation?.calendars[0];
    expect(calendar?.method).toBe('REQUEST');
    const event = new ICAL.Component(ICAL.parse(calendar?.text ?? '')).getFirstSubcomponent('vevent');
    const order = await rider.order(reference);
    expect(event && new ICAL.Event(event).startDate.toJSDate().toISOString()).toBe(order.booking?.start);

    expect(((await owner.get(at)).body as JobSheetView).missing).toContain('Not all parcels are sent yet.');
    await owner.post(`${at}/fitted`).send({}).expect(409);
    await sendAll(reference, order);
    const ready = await owner.get(at);
    await owner.put(`${at}/record`).send(record).expect(428);
    await owner.put(`${at}/record`).set('If-Match', '"999"').send(record).expect(412);
    await owner
      .put(`${at}/record`)
      .set('If-Match', ready.headers.etag as string)
      .send(record)
      .expect(200);
    await owner.post(`${at}/fitted`).send({}).expect(200);
    await app.drainOutbox();
    const done = await rider.order(reference);
    expect(done.state).toBe('completed');
    expect(done.fitting?.record.serialNumber).toBe('VT-0042-17');
    expect(mailsTo(contact.email, /Your shock is fitted/)[0]?.text).toContain('176 psi');
  });

  it('offers another workshop, or all the money back, when one declines', async () => {
    const { rider, reference, owner, workshopId, bookingId } = await paid();
    const at = `/api/organisations/${workshopId}/bookings/${bookingId}`;
    await owner.post(`${at}/decline`).send({ reason: 'The press is away for repair' }).expect(200);
    await owner.post(`${at}/accept`).send({}).expect(409);
    const order = await rider.order(reference);
    expect(order.actions).toEqual(expect.arrayContaining(['choose-workshop', 'refund']));
    const options = (await rider.browser.get(`/api/orders/${reference}/workshops`).expect(200))
      .body as RebookOptions;
    const [other] = options.workshops;
    const again = await rider.browser
      .post(`/api/orders/${reference}/workshop`)
      .set('Idempotency-Key', `again-${reference}`)
      .send({ workshopId: other?.id, slotStart: other?.slots[0]?.start });
    expect(again.status).toBe(200);
    expect((again.body as OrderView).booking?.state).toBe('requested');
    const refunded = await rider.browser.post(`/api/orders/${reference}/refund`).send({}).expect(200);
    expect((refunded.body as OrderView).state).toBe('refunding');
    await app.drainOutbox();
    const end = await rider.order(reference);
    expect(end.state).toBe('refunded');
    expect(end.refundedMinor).toBe(end.totalMinor);
  });

  it('lapses when a workshop does not answer within its working day', async () => {
    const { rider, reference } = await paid();
    const before = app.clock.now();
    app.clock.advance({ days: 7 });
    await app.drainOutbox();
    expect((await rider.order(reference)).booking?.state).toBe('lapsed');
    expect(mailsTo(contact.email, /please choose again/).length).toBeGreaterThan(0);
    app.clock.set(before.toISOString());
  });

  it('keeps the hold after a declined card, and lets go when the rider cancels', async () => {
    const rider = new RiderJourney(app);
    const { plan, reference, sessionId } = await rider.held(frame, shock);
    await pay(app, sessionId, '4000000000000002');
    expect((await rider.order(reference)).state).toBe('held');
    const { body } = await rider.browser.post(`/api/orders/${reference}/cancel-payment`).send({}).expect(200);
    expect((body as OrderView).state).toBe('released');
    await webhooksIdle(app);
    const again = await rider.browser.get(`/api/plans/${plan.id}`).expect(200);
    expect(again.body.missing).toEqual([]);
  });

  it('lets go when the hold runs out', async () => {
    const rider = new RiderJourney(app);
    const { reference } = await rider.held(frame, shock);
    const before = app.clock.now();
    app.clock.advance({ minutes: 40 });
    await app.drainOutbox();
    app.clock.set(before.toISOString());
    const order = await rider.order(reference);
    expect(order.state).toBe('released');
    expect(order.releaseReason).toBe('expired');
  });

  it('sells the last unit to one of two riders who press at once, and tells the other kindly', async () => {
    await app.manager.query(
      `UPDATE listings SET quantity = 0 WHERE item_id = $1 AND shop_id <> (
      SELECT shop_id FROM listings WHERE item_id = $1 AND quantity > reserved ORDER BY shop_id LIMIT 1) AND reserved = 0`,
      ['vellacott-tarn-210x55'],
    );
    await app.manager.query(`UPDATE listings SET quantity = 1 WHERE item_id = $1 AND quantity > 0`, [
      'vellacott-tarn-210x55',
    ]);
    await app.manager.query(
      `DELETE FROM stock_movements WHERE listing_id IN (SELECT id FROM listings WHERE item_id = 'vellacott-tarn-210x55')`,
    );
    await app.manager.query(
      `INSERT INTO stock_movements (listing_id, kind, quantity_delta, reserved_delta) SELECT id, 'open', quantity, 0 FROM listings WHERE item_id = 'vellacott-tarn-210x55'`,
    );
    const riders = [new RiderJourney(app), new RiderJourney(app)];
    const plans = await Promise.all(
      riders.map(async (rider) =>
        rider.plan(await rider.measureUp(usualAnswers(frame)), 'vellacott-tarn-210x55'),
      ),
    );
    const answers = await Promise.all(
      riders.map((rider, i) => rider.checkout(plans[i] as (typeof plans)[0])),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    const lost = answers.find(({ status }) => status === 409);
    expect(['stock-gone', 'not-ready', 'slot-taken']).toContain(lost?.body.code);
    expect(lost?.body.detail).toBeTruthy();
  });

  it('gives the last slot to one of many', async () => {
    const riders = Array.from({ length: 6 }, () => new RiderJourney(app));
    const plans = await Promise.all(
      riders.map(async (rider) => rider.plan(await rider.measureUp(usualAnswers(frame)), shock)),
    );
    const stands = 3;
    const answers = await Promise.all(
      riders.map((rider, i) => rider.checkout(plans[i] as (typeof plans)[0])),
    );
    const won = answers.filter(({ status }) => status === 201).length;
    expect(won).toBeGreaterThanOrEqual(1);
    expect(won).toBeLessThanOrEqual(stands);
    expect(answers.every(({ status }) => status === 201 || status === 409)).toBe(true);
  });

  it('finds an order by reference and e-mail, and nothing by half of it', async () => {
    const { reference } = await paid();
    const stranger = app.client();
    await stranger.post('/api/orders/find').send({ reference, email: 'other@rider.example' }).expect(404);
    await stranger.get(`/api/orders/${reference}`).expect(404);
    await stranger.post('/api/orders/find').send({ reference, email: contact.email }).expect(204);
    await stranger.get(`/api/orders/${reference}`).expect(200);
  });

  it('does not let another workshop see or answer a booking', async () => {
    const { bookingId, workshopId } = await paid();
    const other = workshopId === 'tin-shed' ? 'beckside-cycles' : 'tin-shed';
    const stranger = await ownerOf(app, other);
    await stranger.get(`/api/organisations/${other}/bookings/${bookingId}`).expect(404);
    await stranger.post(`/api/organisations/${other}/bookings/${bookingId}/accept`).send({}).expect(404);
    await stranger.get(`/api/organisations/${workshopId}/bookings/${bookingId}`).expect(404);
  });

  it('changes stock against its version only, and never below what is held', async () => {
    const keeper = await ownerOf(app, 'fellside-parts');
    const at = '/api/organisations/fellside-parts/stock';
    const { rows } = (await keeper.get(at).expect(200)).body as {
      rows: { listingId: string; version: number; quantity: number }[];
    };
    const row = rows[0] as (typeof rows)[0];
    await keeper.patch(`${at}/${row.listingId}`).send({ priceMinor: 100_00 }).expect(428);
    await keeper
      .patch(`${at}/${row.listingId}`)
      .set('If-Match', `"${row.version}"`)
      .send({ quantity: row.quantity + 2 })
      .expect(200);
    await keeper
      .patch(`${at}/${row.listingId}`)
      .set('If-Match', `"${row.version}"`)
      .send({ quantity: 1 })
      .expect(412);
  });
});
