import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

import { fromRangeText } from '../database/time-range.js';
import type { Booking } from '../fitting-bookings/booking.entity.js';
import { MailService } from '../notifications/mail.service.js';
import { dayText } from './date-text.js';
import { MailFacts } from './mail-facts.service.js';
import type { Order } from './order.entity.js';
import { Parcel } from './parcel.entity.js';

/** All mails to shops and workshops about an order, queued in the transaction that gives rise to them. */
@Injectable()
export class TradeMails {
  constructor(
    private readonly mail: MailService,
    private readonly facts: MailFacts,
  ) {}

  /** To every shop of the order, by the state of its parcel: send, or wait for the workshop. */
  async shopOrders(manager: EntityManager, order: Order): Promise<void> {
    for (const parcel of await this.parcelsOf(manager, order, ['waiting', 'to-send'])) {
      await this.mail.queue(manager, {
        template: 'shop-order',
        to: parcel.shop.email,
        dedupeKey: `shop-order:${parcel.id}:${parcel.version}`,
        data: {
          ...(await this.toShop(manager, order, parcel)),
          to: [parcel.address.name, ...parcel.address.lines].join(', '),
          dispatchBy: dayText(parcel.dispatchBy),
          waitsFor: parcel.state === 'waiting' ? parcel.address.name : null,
        },
      });
    }
  }

  /** To every shop that knows of the order; call it before the parcels are cancelled. */
  async shopsCancelled(manager: EntityManager, order: Order): Promise<void> {
    for (const parcel of await this.parcelsOf(manager, order, ['waiting', 'to-send'])) {
      await this.mail.queue(manager, {
        template: 'shop-cancelled',
        to: parcel.shop.email,
        dedupeKey: `shop-cancelled:${parcel.id}:${parcel.version}`,
        data: await this.toShop(manager, order, parcel),
      });
    }
  }

  async request(manager: EntityManager, order: Order, booking: Booking): Promise<void> {
    const { to, place, data } = await this.toWorkshop(manager, order, booking);
    const { start, end } = fromRangeText(booking.during);
    await this.mail.queue(manager, {
      template: 'workshop-request',
      to,
      dedupeKey: `workshop-request:${booking.id}`,
      data: {
        ...data,
        minutes: Math.round((end.getTime() - start.getTime()) / 60_000),
        answerBy: this.facts.answerBy(booking, place),
        work: order.job.work.map(({ say }) => say),
      },
    });
  }

  async cancelled(manager: EntityManager, order: Order, booking: Booking): Promise<void> {
    const { to, data } = await this.toWorkshop(manager, order, booking);
    await this.mail.queue(manager, {
      template: 'workshop-cancelled',
      to,
      dedupeKey: `workshop-cancelled:${booking.id}`,
      data,
    });
  }

  async lapsed(manager: EntityManager, order: Order, booking: Booking): Promise<void> {
    const { to, data } = await this.toWorkshop(manager, order, booking);
    await this.mail.queue(manager, {
      template: 'workshop-lapsed',
      to,
      dedupeKey: `workshop-lapsed:${booking.id}`,
      data,
    });
  }

  /** Parts for a fitting have left. */
  async parcelSent(manager: EntityManager, order: Order, booking: Booking, parcel: Parcel): Promise<void> {
    const { to, data } = await this.toWorkshop(manager, order, booking);
    const shop = await this.facts.place(manager, parcel.shopId);
    await this.mail.queue(manager, {
      template: 'workshop-parcel',
      to,
      dedupeKey: `workshop-parcel:${parcel.id}`,
      data: {
        ...data,
        shop: shop.name,
        items: await this.facts.itemsIn(manager, parcel.id),
        tracking: parcel.tracking ?? '',
      },
    });
  }

  private async parcelsOf(
    manager: EntityManager,
    order: Order,
    states: readonly Parcel['state'][],
  ): Promise<Parcel[]> {
    const parcels = await manager.find(Parcel, { where: { orderId: order.id }, relations: { shop: true } });
    return parcels.filter(({ state }) => states.includes(state));
  }

  private async toShop(manager: EntityManager, order: Order, parcel: Parcel) {
    return {
      ...this.facts.about(order, `/desk/${parcel.shopId}/parcels`),
      shop: parcel.shop.name,
      items: await this.facts.itemsIn(manager, parcel.id),
    };
  }

  private async toWorkshop(manager: EntityManager, order: Order, booking: Booking) {
    const place = await this.facts.place(manager, booking.workshopId);
    return {
      to: place.email,
      place,
      data: {
        ...this.facts.about(order, `/desk/${place.id}/bookings/${booking.id}`),
        workshop: place.name,
        when: this.facts.when(booking, place),
      },
    };
  }
}
