import type { ParcelList, StockList, StockRow } from '@linkfell/contracts';

import { startTestApp, type TestApp } from '../support/app.js';
import { assertAllInvariants } from './invariants.js';
import { Scenes, shock } from './scenes.js';

const shop = 'fellside-parts';
const stockAt = `/api/organisations/${shop}/stock`;

describe('a shop', () => {
  let app: TestApp;
  let scenes: Scenes;
  beforeAll(async () => {
    app = await startTestApp();
    app.clock.set(new Date().toISOString());
    scenes = new Scenes(app);
    await scenes.onlyAt(shock, shop, 20);
  });
  afterEach(async () => {
    await scenes.rest();
    await assertAllInvariants(app);
  });
  afterAll(() => app.close());

  const keeper = () => scenes.owner(shop);
  const row = async (itemId = shock): Promise<StockRow> => {
    const { rows } = (await (await keeper()).get(stockAt).expect(200)).body as StockList;
    const found = rows.find((each) => each.itemId === itemId);
    if (!found) throw new Error('not in stock');
    return found;
  };
  const patch = async ({ listingId, version }: StockRow, change: object) =>
    (await keeper()).patch(`${stockAt}/${listingId}`).set('If-Match', `"${version}"`).send(change);
  const movements = (listingId: string) =>
    app.manager.query<{ kind: string; quantity_delta: number; reserved_delta: number }[]>(
      `SELECT kind, quantity_delta, reserved_delta FROM stock_movements WHERE listing_id = $1 ORDER BY id DESC LIMIT 1`,
      [listingId],
    );

  it('changes price, quantity and lead days, and the ledger says who took what', async () => {
    const before = await row();
    const { body, headers } = await patch(before, { priceMinor: 37_500, quantity: 22, leadDays: 1 });
    expect(body).toMatchObject({
      priceMinor: 37_500,
      quantity: 22,
      leadDays: 1,
      version: before.version + 1,
    });
    expect(headers.etag).toBe(`"${before.version + 1}"`);
    expect(await movements(before.listingId)).toEqual([
      { kind: 'set', quantity_delta: 22 - before.quantity, reserved_delta: 0 },
    ]);
    const [by] = await app.manager.query<{ known: boolean }[]>(
      `SELECT account_id IS NOT NULL AS known FROM stock_movements WHERE listing_id = $1 ORDER BY id DESC LIMIT 1`,
      [before.listingId],
    );
    expect(by?.known).toBe(true);
  });

  it('cannot have fewer than are held for orders, and is told how many those are', async () => {
    await scenes.held('self');
    await scenes.held('self');
    const now = await row();
    expect(now.reserved).toBe(2);
    const refused = await patch(now, { quantity: 1 });
    expect([refused.status, refused.body.code]).toEqual([409, 'held-for-orders']);
    expect(refused.body.detail).toBe('2 are held for orders, so there must be at least that many.');
    expect((await patch(now, { quantity: 2 })).status).toBe(200);
    await scenes.onlyAt(shock, shop, 20);
  });

  it('loses no change: of two from one version one is told, and no version or a stray field is refused', async () => {
    const now = await row();
    const answers = await Promise.all([patch(now, { leadDays: 2 }), patch(now, { leadDays: 3 })]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 412]);
    expect((await (await keeper()).patch(`${stockAt}/${now.listingId}`).send({ leadDays: 2 })).status).toBe(
      428,
    );
    const fresh = await row();
    expect((await patch(fresh, { reserved: 0 })).status).toBe(422);
    expect((await patch(fresh, { quantity: -1 })).body.errors[0].pointer).toBe('/quantity');
    expect((await patch(fresh, { leadDays: 0 })).status).toBe(200);
  });

  it('keeps selling right while it counts: orders and new quantities at the same moment', async () => {
    await scenes.onlyAt(shock, shop, 3);
    const plans = await Promise.all(Array.from({ length: 5 }, () => scenes.plan('self')));
    const now = await row();
    const answers = await Promise.all([
      ...plans.map(({ rider, plan }) => rider.checkout(plan).then(({ status }) => status)),
      patch(now, { quantity: now.reserved + 1 }).then(({ status }) => status),
    ]);
    const after = await row();
    expect(after.quantity).toBeGreaterThanOrEqual(after.reserved);
    expect(answers.slice(0, 5).filter((status) => status === 201)).toHaveLength(
      after.reserved - now.reserved,
    );
    await scenes.onlyAt(shock, shop, 20);
  });

  it('marks a parcel sent once, however often it is pressed; stock and reservation fall together', async () => {
    const { rider, reference } = await scenes.paid('self');
    const before = await row();
    const parcel = await scenes.parcel(reference);
    const press = () =>
      parcel.keeper
        .post(parcel.at)
        .send({ tracking: 'AB 12' })
        .then(({ status }) => status);
    const answers = await Promise.all([press(), press(), press()]);
    expect(answers.sort()).toEqual([200, 409, 409]);
    const after = await row();
    expect([after.quantity, after.reserved]).toEqual([before.quantity - 1, before.reserved - 1]);
    expect(await movements(after.listingId)).toEqual([
      { kind: 'dispatch', quantity_delta: -1, reserved_delta: -1 },
    ]);
    await scenes.rest();
    expect((await rider.order(reference)).state).toBe('completed');
    const sent = scenes.riderSubjects(reference).filter((subject) => /has sent a parcel/.test(subject));
    expect(sent).toHaveLength(1);
  });

  it('sends a parcel or hears that the money went back, never both', async () => {
    const states: string[] = [];
    for (let round = 0; round < 4; round += 1) {
      const { rider, reference } = await scenes.paid('self');
      const parcel = await scenes.parcel(reference);
      const send = () =>
        parcel.keeper
          .post(parcel.at)
          .send({ tracking: '' })
          .then(({ status }) => status);
      const refund = () =>
        rider.browser
          .post(`/api/orders/${reference}/refund`)
          .send({})
          .then(({ status }) => status);
      const [sent, refunded] = await Promise.all(
        round % 2 === 0 ? [send(), refund()] : [new Promise((go) => setTimeout(go, 5)).then(send), refund()],
      );
      expect([sent, refunded].sort()).toEqual([200, 409]);
      await scenes.rest();
      const { state } = await rider.order(reference);
      expect(state).toBe(sent === 200 ? 'completed' : 'refunded');
      states.push(state);
    }
    expect(states).toHaveLength(4);
  });

  it('sees parcels of paid orders only, its own only, those to send first', async () => {
    const { reference: held } = await scenes.held('self');
    const { reference: waiting } = await scenes.paid();
    const { reference: toSend } = await scenes.paid('self');
    const { parcels } = (await (await keeper()).get(`/api/organisations/${shop}/parcels`).expect(200))
      .body as ParcelList;
    const references = parcels.map(({ orderReference }) => orderReference);
    expect(references).not.toContain(held);
    expect(references.indexOf(toSend)).toBeLessThan(references.indexOf(waiting));
    const mine = parcels.find(({ orderReference }) => orderReference === toSend);
    const other = await scenes.owner('rigg-suspension');
    await other
      .post(`/api/organisations/rigg-suspension/parcels/${mine?.id}/sent`)
      .send({ tracking: '' })
      .expect(404);
    await other.get(`/api/organisations/${shop}/parcels`).expect(404);
    const { listingId, version } = await row();
    await other
      .patch(`/api/organisations/rigg-suspension/stock/${listingId}`)
      .set('If-Match', `"${version}"`)
      .send({ priceMinor: 1 })
      .expect(404);
  });
});
