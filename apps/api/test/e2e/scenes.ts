import type { BookingList, JobSheetView, OrderView, ParcelList, PlanView } from '@linkfell/contracts';

import { OutboxMessage } from '../../src/outbox/outbox-message.entity.js';
import type { TestApp } from '../support/app.js';
import type { Client } from '../support/client.js';
import { contact, ownerOf, RiderJourney, usualAnswers, webhooksIdle } from '../support/journey.js';

export const frame = 'ullscar-withen-140';
export const shock = 'vellacott-tarn-210x50';

export interface HeldScene {
  rider: RiderJourney;
  plan: PlanView;
  reference: string;
  sessionId: string;
}

/** Steps that many tests of orders take, on one application. */
export class Scenes {
  private readonly owners = new Map<string, Promise<Client>>();

  constructor(readonly app: TestApp) {}

  /** Makes the payment service misbehave; see its control endpoint. */
  async fault(order: object): Promise<void> {
    const answer = await this.control('', order);
    expect(answer.status).toBe(200);
  }

  control(path: string, body: object = {}): Promise<Response> {
    return fetch(`${this.app.stripe.url}/_control${path}`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(body),
    });
  }

  /** A plan of a rider's own, at the cheapest workshop on its first free date unless it is for self-fit. */
  async plan(
    fit: 'workshop' | 'self' = 'workshop',
    sizeId = shock,
  ): Promise<{ rider: RiderJourney; plan: PlanView }> {
    const rider = new RiderJourney(this.app);
    const plan = await rider.plan(await rider.measureUp(usualAnswers(frame)), sizeId);
    if (fit === 'workshop') return { rider, plan };
    const { body } = await rider.browser
      .put(`/api/plans/${plan.id}/choices`)
      .set('If-Match', `"${plan.revision}"`)
      .send({ fit })
      .expect(200);
    return { rider, plan: body as PlanView };
  }

  async held(fit: 'workshop' | 'self' = 'workshop', sizeId = shock): Promise<HeldScene> {
    const { rider, plan } = await this.plan(fit, sizeId);
    const { body } = await rider.checkout(plan).expect(201);
    const { reference, paymentUrl } = body as { reference: string; paymentUrl: string };
    return { rider, plan, reference, sessionId: sessionOf(paymentUrl) };
  }

  /** The rider's side of the payment page; the webhook is under way when it answers. */
  async card(sessionId: string, number = '4242424242424242'): Promise<boolean> {
    const answer = await this.control(`/sessions/${sessionId}/pay`, { number });
    return answer.ok && ((await answer.json()) as { paid: boolean }).paid;
  }

  /** Until webhooks and outbox have come to rest. */
  async rest(): Promise<void> {
    await webhooksIdle(this.app);
    await this.app.drainOutbox();
    await webhooksIdle(this.app);
  }

  async paid(fit: 'workshop' | 'self' = 'workshop', number?: string): Promise<HeldScene> {
    const scene = await this.held(fit);
    expect(await this.card(scene.sessionId, number)).toBe(true);
    await this.rest();
    return scene;
  }

  owner(organisationId: string): Promise<Client> {
    const known = this.owners.get(organisationId) ?? ownerOf(this.app, organisationId);
    this.owners.set(organisationId, known);
    return known;
  }

  /** The workshop's view of an order: its owner's browser, and the address of its booking there. */
  async desk(reference: string): Promise<{ owner: Client; at: string; sheet: JobSheetView }> {
    const [row] = await this.app.manager.query<{ workshop_id: string }[]>(
      `SELECT b.workshop_id FROM bookings b JOIN orders o ON o.id = b.order_id WHERE o.reference = $1 ORDER BY b.created_at DESC`,
      [reference],
    );
    const list = `/api/organisations/${row?.workshop_id}/bookings`;
    const owner = await this.owner(row?.workshop_id ?? '');
    const { bookings } = (await owner.get(list).expect(200)).body as BookingList;
    const booking = bookings.filter((each) => each.orderReference === reference).at(-1);
    const at = `${list}/${booking?.id}`;
    return { owner, at, sheet: (await owner.get(at).expect(200)).body as JobSheetView };
  }

  async parcels(reference: string): Promise<{ keeper: Client; at: string; shopId: string }[]> {
    const rows = await this.app.manager.query<{ shop_id: string }[]>(
      `SELECT p.shop_id FROM parcels p JOIN orders o ON o.id = p.order_id WHERE o.reference = $1 ORDER BY 1`,
      [reference],
    );
    return Promise.all(
      rows.map(async ({ shop_id: shopId }) => {
        const keeper = await this.owner(shopId);
        const list = `/api/organisations/${shopId}/parcels`;
        const { parcels } = (await keeper.get(list).expect(200)).body as ParcelList;
        const parcel = parcels.find((each) => each.orderReference === reference);
        return { keeper, shopId, at: `${list}/${parcel?.id}/sent` };
      }),
    );
  }

  /** The one parcel of an order, or the first of several. */
  async parcel(reference: string): Promise<{ keeper: Client; at: string; shopId: string }> {
    const [first] = await this.parcels(reference);
    if (!first) throw new Error('no parcel');
    return first;
  }

  async sendAll(reference: string): Promise<void> {
    for (const { keeper, at } of await this.parcels(reference)) {
      await keeper.post(at).send({ tracking: 'AB 12' }).expect(200);
    }
  }

  /** Subjects of the mails about an order to an address, oldest first. */
  subjects(to: string, reference: string): string[] {
    return this.app.mail
      .messages()
      .filter((message) => message.to.includes(to) && `${message.subject}${message.text}`.includes(reference))
      .map(({ subject }) => subject)
      .reverse();
  }

  riderSubjects(reference: string): string[] {
    return this.subjects(contact.email, reference);
  }

  /** On hand at one shop; at every other shop none that is not reserved. The ledger keeps up. */
  async onlyAt(itemId: string, shopId: string, free: number): Promise<void> {
    await this.app.manager.query(
      `WITH wanted AS (
         SELECT id, quantity, reserved + CASE WHEN shop_id = $2 THEN $3::int ELSE 0 END AS want FROM listings WHERE item_id = $1
       ), moved AS (
         INSERT INTO stock_movements (listing_id, kind, quantity_delta, reserved_delta)
         SELECT id, 'set', want - quantity, 0 FROM wanted
       )
       UPDATE listings l SET quantity = w.want FROM wanted w WHERE w.id = l.id`,
      [itemId, shopId, free],
    );
  }

  async orderId(reference: string): Promise<string> {
    const [row] = await this.app.manager.query<{ id: string }[]>(
      `SELECT id FROM orders WHERE reference = $1`,
      [reference],
    );
    return row?.id ?? '';
  }

  /** The outbox message of a topic about an order or booking, to be delivered by hand. */
  async message(topic: string, key: string): Promise<OutboxMessage> {
    return this.app.manager.findOneByOrFail(OutboxMessage, { topic, dedupeKey: `${topic}:${key}` });
  }
}

export const sessionOf = (paymentUrl: string): string => new URL(paymentUrl).pathname.split('/').at(-1) ?? '';

export const actionsOf = ({ actions }: OrderView): string[] => [...actions].sort();
