import type { JobSheetView, OrderView, RebookOptions } from '@linkfell/contracts';
import ICAL from 'ical.js';

import { BookingsService } from '../../src/fitting-bookings/bookings.service.js';
import { Organisation } from '../../src/organisations/organisation.entity.js';
import { createMember } from '../factories/organisation.factory.js';
import { startTestApp, type TestApp } from '../support/app.js';
import { contact } from '../support/journey.js';
import { signedIn } from '../support/sign-in.js';
import { assertAllInvariants } from './invariants.js';
import { actionsOf, Scenes, shock } from './scenes.js';

const record = {
  serialNumber: 'VT-0042-17',
  spring: { kind: 'air', gaugePsi: 176 },
  sagMm: 13.8,
  torques: [{ bolt: 'Frame end bolt', printedNm: 16, setNm: 16 }],
  travelChecked: true,
  noticesChecked: true,
  notes: '',
};

describe('fittings', () => {
  let app: TestApp;
  let scenes: Scenes;
  beforeAll(async () => {
    app = await startTestApp();
    app.clock.set(new Date().toISOString());
    scenes = new Scenes(app);
    await scenes.onlyAt(shock, 'fellside-parts', 60);
  });
  afterEach(async () => {
    await scenes.rest();
    await assertAllInvariants(app);
  });
  afterAll(() => app.close());

  const subjectsAt = async (organisationId: string, reference: string) => {
    const { email } = await app.manager.findOneByOrFail(Organisation, { id: organisationId });
    return scenes.subjects(email, reference);
  };
  const rebook = (scene: Awaited<ReturnType<Scenes['paid']>>, body: object, key = '1') =>
    scene.rider.browser
      .post(`/api/orders/${scene.reference}/workshop`)
      .set('Idempotency-Key', `rebook-${scene.reference}-${key}`)
      .send(body);
  const options = async ({ rider, reference }: Awaited<ReturnType<Scenes['paid']>>) =>
    (await rider.browser.get(`/api/orders/${reference}/workshops`).expect(200)).body as RebookOptions;
  const lapse = async (reference: string) => {
    const { sheet } = await scenes.desk(reference);
    const { payload } = await scenes.message('booking-unanswered', sheet.booking.id);
    return app.nest.get(BookingsService).lapse(payload as { bookingId: string }, {
      id: sheet.booking.id,
      topic: 'booking-unanswered',
      attempt: 1,
    });
  };

  it('keep every parcel waiting until the workshop has accepted, then tell everybody once', async () => {
    const { rider, plan, reference } = await scenes.paid();
    const workshopId = plan.choices.workshopId as string;
    expect(await subjectsAt('fellside-parts', reference)).toEqual([
      `Order ${reference}: wait for the workshop`,
    ]);
    const parcel = await scenes.parcel(reference);
    const early = await parcel.keeper.post(parcel.at).send({ tracking: '' });
    expect([early.status, early.body.detail]).toEqual([409, expect.stringContaining('has not accepted')]);

    const { owner, at, sheet } = await scenes.desk(reference);
    expect(sheet.booking).toMatchObject({ state: 'requested', start: plan.choices.slotStart });
    expect(sheet.parts.every((part) => part.parcel === 'waits for your answer')).toBe(true);
    await owner.post(`${at}/accept`).send({}).expect(200);
    await owner.post(`${at}/accept`).send({}).expect(409);
    await scenes.sendAll(reference);
    await scenes.rest();

    const workshop = await app.manager.findOneOrFail(Organisation, {
      where: { id: workshopId },
      relations: { town: true },
    });
    const order = await rider.order(reference);
    expect(order.parcels[0]?.to).toEqual([
      workshop.name,
      workshop.street,
      workshop.town.name,
      workshop.postcode,
    ]);
    expect(await subjectsAt('fellside-parts', reference)).toEqual([
      `Order ${reference}: wait for the workshop`,
      `Order ${reference}: please send`,
    ]);
    const told = await subjectsAt(workshopId, reference);
    expect(told.map((subject) => subject.replace(/:.*(on their way).*/, ' $1'))).toEqual([
      expect.stringMatching(/^Fitting asked for/),
      `Order ${reference} on their way`,
    ]);
    expect(scenes.riderSubjects(reference)).toEqual([
      `Order ${reference}: paid`,
      expect.stringMatching(/^Your fitting is agreed/),
      `Order ${reference}: Fellside Parts has sent a parcel`,
    ]);
  });

  it('invite and cancel with one UID and a rising sequence, when the rider wants the money back', async () => {
    const { rider, plan, reference } = await scenes.paid();
    const { owner, at } = await scenes.desk(reference);
    await owner.post(`${at}/accept`).send({}).expect(200);
    const { body } = await rider.browser.post(`/api/orders/${reference}/refund`).send({}).expect(200);
    expect((body as OrderView).actions).toEqual([]);
    await scenes.rest();
    const calendars = app.mail
      .messages()
      .filter(({ to, text }) => to.includes(contact.email) && text?.includes(reference))
      .flatMap((message) => message.calendars.slice(0, 1))
      .reverse();
    expect(calendars.map(({ method }) => method)).toEqual(['REQUEST', 'CANCEL']);
    const [asked, gone] = calendars.map(({ text }) => {
      const event = new ICAL.Component(ICAL.parse(text)).getFirstSubcomponent('vevent');
      return { uid: event?.getFirstPropertyValue('uid'), sequence: event?.getFirstPropertyValue('sequence') };
    });
    expect(asked).toEqual({ uid: expect.stringContaining('@linkfell'), sequence: 0 });
    expect(gone).toEqual({ uid: asked?.uid, sequence: 1 });
    expect(await subjectsAt('fellside-parts', reference)).toContain(
      `Order ${reference}: cancelled, do not send`,
    );
    expect((await subjectsAt(plan.choices.workshopId as string, reference)).at(-1)).toMatch(
      /^Cancelled: fitting/,
    );
    expect((await rider.order(reference)).state).toBe('refunded');
    await owner.post(`${at}/fitted`).send({}).expect(409);
  });

  it('go to another workshop for less, and the difference goes back', async () => {
    const scene = await scenes.paid();
    const { rider, plan, reference } = scene;
    const workshopId = plan.choices.workshopId as string;
    const { owner, at } = await scenes.desk(reference);
    const declined = await owner.post(`${at}/decline`).send({ reason: 'The press is away' }).expect(200);
    expect(
      (declined.body as JobSheetView).parts.every(({ parcel }) => parcel === 'does not come to you'),
    ).toBe(true);
    const open = await rider.order(reference);
    expect(actionsOf(open)).toEqual(['choose-self-fit', 'choose-workshop', 'refund']);
    expect(open.booking?.declineReason).toBe('The press is away');
    app.clock.advance({ minutes: 1 });

    // Only workshops whose price is at most what was paid; here one that has become cheaper.
    const dearer = (await options(scene)).workshops.map(({ id }) => id);
    expect(dearer).toEqual([workshopId]);
    await app.manager.query(
      `UPDATE workshop_services SET price_minor = 3000, minutes = 75 WHERE organisation_id = 'sellick-suspension' AND work_id = 'fit-shock'`,
    );
    await app.manager.query(`UPDATE listings SET lead_days = 3 WHERE item_id = $1`, [shock]);
    const [first, last] = (await options(scene)).workshops;
    expect([first?.id, last?.id]).toEqual(['sellick-suspension', workshopId]);
    const choice = { workshopId: first?.id, slotStart: first?.slots[0]?.start };
    const { body } = await rebook(scene, choice).expect(200);
    await rebook(scene, choice).expect(200);
    const work = (body as OrderView).lines.find(({ kind }) => kind === 'work');
    expect(work).toMatchObject({
      sellerId: 'sellick-suspension',
      totalMinor: 3000,
      description: 'Fitting, 75 minutes',
    });
    expect((body as OrderView).refundedMinor).toBe(plan.totalMinor - (plan.totalMinor - 3850 + 3000));
    const { dispatchBy } = (body as OrderView).parcels[0] as OrderView['parcels'][number];
    expect(dispatchBy > ((body as OrderView).booking?.answerBy?.slice(0, 10) ?? '9')).toBe(true);
    expect(dispatchBy < (choice.slotStart ?? '').slice(0, 10)).toBe(true);

    const next = await scenes.desk(reference);
    expect(next.sheet.work.map(({ minutes }) => minutes)).toEqual([75]);
    await next.owner.post(`${next.at}/accept`).send({}).expect(200);
    await scenes.sendAll(reference);
    const { headers } = await next.owner.get(next.at);
    await next.owner
      .put(`${next.at}/record`)
      .set('If-Match', headers.etag as string)
      .send(record)
      .expect(200);
    await next.owner.post(`${next.at}/fitted`).send({}).expect(200);
    await app.manager.query(
      `UPDATE workshop_services SET price_minor = 5400, minutes = 60 WHERE organisation_id = 'sellick-suspension' AND work_id = 'fit-shock'`,
    );
    await app.manager.query(`UPDATE listings SET lead_days = 0 WHERE item_id = $1`, [shock]);
    await scenes.rest();
    expect((await rider.order(reference)).timeline.every(({ done }) => done)).toBe(true);
  });

  it('give the last slot of another workshop to one of two riders, and the other the next', async () => {
    const two = [await scenes.paid(), await scenes.paid()];
    for (const { reference } of two) {
      const { owner, at } = await scenes.desk(reference);
      await owner.post(`${at}/decline`).send({ reason: 'Ill' }).expect(200);
    }
    const [offer] = (await options(two[0] as (typeof two)[0])).workshops;
    const choice = { workshopId: offer?.id, slotStart: offer?.slots[0]?.start };
    await app.manager.query(
      `DELETE FROM stands s WHERE organisation_id = $1 AND id NOT IN (SELECT stand_id FROM bookings) AND id <> (
         SELECT min(id) FROM stands WHERE organisation_id = $1)`,
      [offer?.id],
    );
    const answers = await Promise.all(two.map((scene) => rebook(scene, choice, 'race')));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const lost = answers.find(({ status }) => status === 409);
    expect(lost?.body.code).toBe('slot-taken');
    expect(lost?.body.slots.length).toBeGreaterThan(0);
  });

  it('become self-fit: the parts go to the rider, the price of the work goes back', async () => {
    const { rider, plan, reference } = await scenes.paid();
    await lapse(reference);
    const { body } = await rider.browser.post(`/api/orders/${reference}/self-fit`).send({}).expect(200);
    const order = body as OrderView;
    const work = plan.lines.find(({ kind }) => kind === 'work');
    expect(order).toMatchObject({ fit: 'self', booking: null, refundedMinor: work?.totalMinor });
    expect(order.parcels[0]).toMatchObject({
      state: 'to-send',
      to: [contact.name, contact.street, contact.town, contact.postcode],
    });
    await rider.browser.post(`/api/orders/${reference}/self-fit`).send({}).expect(409);
    await scenes.sendAll(reference);
    await scenes.rest();
    expect((await rider.order(reference)).state).toBe('completed');
    expect(scenes.riderSubjects(reference)).toEqual([
      `Order ${reference}: paid`,
      `Order ${reference}: please choose again`,
      expect.stringContaining('goes back to you'),
      expect.stringContaining('has sent a parcel'),
    ]);
  });

  it('are not self-fitted where the work is for a workshop', async () => {
    const { rider, reference } = await scenes.paid();
    await app.manager.query(
      `UPDATE orders SET job = job || '{"selfFitAllowed": false, "selfFitReason": "Press the kit in. That is workshop work."}' WHERE reference = $1`,
      [reference],
    );
    await lapse(reference);
    expect(actionsOf(await rider.order(reference))).toEqual(['choose-workshop', 'refund']);
    const { body } = await rider.browser.post(`/api/orders/${reference}/self-fit`).send({}).expect(409);
    expect(body.detail).toContain('workshop work');
  });

  it('lapse at the end of the working day that the mail named, and not before', async () => {
    const { rider, reference } = await scenes.paid();
    const { answerBy } = (await rider.order(reference)).booking ?? {};
    const before = app.clock.now();
    app.clock.set(new Date(new Date(answerBy as string).getTime() - 1_000).toISOString());
    await app.drainOutbox();
    expect((await rider.order(reference)).booking?.state).toBe('requested');
    app.clock.set(answerBy as string);
    await app.drainOutbox();
    expect((await rider.order(reference)).booking?.state).toBe('lapsed');
    app.clock.set(before.toISOString());
  });

  it('accepted and lapsed at the same moment: one of the two', async () => {
    const outcomes = new Set<string | undefined>();
    for (let round = 0; round < 4; round += 1) {
      const { rider, reference } = await scenes.paid();
      const { owner, at } = await scenes.desk(reference);
      const accept = owner.post(`${at}/accept`).send({});
      const [answer] = await Promise.all(
        round % 2 === 0 ? [accept, lapse(reference)] : [lapse(reference).then(() => accept)],
      );
      const state = (await rider.order(reference)).booking?.state;
      expect(state).toBe(answer.status === 200 ? 'accepted' : 'lapsed');
      outcomes.add(state);
    }
    expect(outcomes).toContain('lapsed');
  });

  it('are recorded against the version, with the spring that the shock has, and remarks that stop nobody', async () => {
    const { reference } = await scenes.paid();
    const { owner, at } = await scenes.desk(reference);
    const save = (body: object, etag: string) => owner.put(`${at}/record`).set('If-Match', etag).send(body);
    expect((await save(record, '"1"')).status).toBe(409);
    const { headers } = await owner.post(`${at}/accept`).send({}).expect(200);
    const etag = headers.etag as string;
    const coil = { ...record, spring: { kind: 'coil', rateLbPerIn: 450, preloadTurns: 1 } };
    const wrong = await save(coil, etag);
    expect([wrong.status, wrong.body.errors[0].pointer]).toEqual([422, '/spring/kind']);
    expect((await save({ ...record, sagMm: 0 }, etag)).body.errors[0].pointer).toBe('/sagMm');

    const slip = { ...record, torques: [{ bolt: 'Frame end bolt', printedNm: 16, setNm: 116 }] };
    const saved = await Promise.all([save(slip, etag), save(slip, etag)]);
    expect(saved.map(({ status }) => status).sort()).toEqual([200, 412]);
    const sheet = (await owner.get(at)).body as JobSheetView;
    expect(sheet.cautions.some((line) => line.startsWith('Frame end bolt: '))).toBe(true);
    expect(sheet.missing).toEqual(['Not all parcels are sent yet.']);
    const early = await owner.post(`${at}/fitted`).send({});
    expect([early.status, early.body.detail]).toEqual([409, 'Not all parcels are sent yet.']);
  });

  it('are answered by owner and staff, recorded by owner and mechanic, and seen by no other workshop', async () => {
    const { plan, reference } = await scenes.paid();
    const workshop = await app.manager.findOneByOrFail(Organisation, {
      id: plan.choices.workshopId as string,
    });
    const { at, sheet } = await scenes.desk(reference);
    const [staff, mechanic] = [
      await signedIn(app, await createMember(app.manager, workshop, 'staff')),
      await signedIn(app, await createMember(app.manager, workshop, 'mechanic')),
    ];
    await mechanic.post(`${at}/accept`).send({}).expect(403);
    const { headers } = await staff.post(`${at}/accept`).send({}).expect(200);
    await staff
      .put(`${at}/record`)
      .set('If-Match', headers.etag as string)
      .send(record)
      .expect(403);
    await mechanic
      .put(`${at}/record`)
      .set('If-Match', headers.etag as string)
      .send(record)
      .expect(200);
    const otherId = workshop.id === 'tin-shed' ? 'beckside-cycles' : 'tin-shed';
    const other = await scenes.owner(otherId);
    const theirs = `/api/organisations/${otherId}/bookings/${sheet.booking.id}`;
    await other.get(theirs).expect(404);
    await other.post(`${theirs}/decline`).send({ reason: 'No' }).expect(404);
    await other.put(`${theirs}/record`).set('If-Match', '"2"').send(record).expect(404);
    await other.post(`${theirs}/fitted`).send({}).expect(404);
    await other.get(at).expect(404);
  });
});
