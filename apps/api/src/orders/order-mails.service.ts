import { Inject, Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

import { CONFIG, type Config } from '../config/config.js';
import { fromRangeText } from '../database/time-range.js';
import { Booking } from '../fitting-bookings/booking.entity.js';
import { calendarText } from '../fitting-bookings/calendar.js';
import { MailService } from '../notifications/mail.service.js';
import type { CalendarPart } from '../notifications/mail.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { poundsText, whenText } from './money-text.js';
import { OrderLine } from './order-line.entity.js';
import type { Order } from './order.entity.js';
import { Parcel } from './parcel.entity.js';

const addressOf = (place: Organisation): string => `${place.street}, ${place.town.name} ${place.postcode}`;

/** All mails about orders, queued in the transaction that gives rise to them. */
@Injectable()
export class OrderMails {
  constructor(
    private readonly mail: MailService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async paid(manager: EntityManager, order: Order, next: string): Promise<void> {
    const lines = await manager.find(OrderLine, { where: { orderId: order.id }, order: { position: 'ASC' } });
    await this.mail.queue(manager, {
      template: 'order-paid',
      to: order.email,
      dedupeKey: `order-paid:${order.id}`,
      data: {
        ...this.about(order),
        name: order.contact.name,
        total: poundsText(order.totalMinor),
        lines: lines.map((line) => `${line.description}: ${poundsText(line.unitMinor * line.quantity)}`),
        next,
      },
    });
  }

  async released(manager: EntityManager, order: Order, why: string): Promise<void> {
    await this.mail.queue(manager, {
      template: 'order-released',
      to: order.email,
      dedupeKey: `order-released:${order.id}`,
      data: {
        ...this.about(order),
        name: order.contact.name,
        why,
        planUrl: `${this.config.PUBLIC_URL}/plans/${order.planId ?? ''}`,
      },
    });
  }

  async refunded(
    manager: EntityManager,
    order: Order,
    amountMinor: number,
    why: string,
    key: string,
  ): Promise<void> {
    await this.mail.queue(manager, {
      template: 'order-refunded',
      to: order.email,
      dedupeKey: `order-refunded:${key}`,
      data: { ...this.about(order), name: order.contact.name, amount: poundsText(amountMinor), why },
    });
  }

  /** To every shop of the order: wait for the workshop, or send. */
  async shops(manager: EntityManager, order: Order, waits: boolean): Promise<void> {
    const parcels = await manager.find(Parcel, { where: { orderId: order.id }, relations: { shop: true } });
    for (const parcel of parcels) {
      if (parcel.state === 'cancelled' || parcel.state === 'sent') continue;
      const items = await this.itemsIn(manager, parcel.id);
      await this.mail.queue(manager, {
        template: 'shop-order',
        to: parcel.shop.email,
        dedupeKey: `shop-order:${parcel.id}:${parcel.version}:${waits ? 'waits' : 'send'}`,
        data: {
          ...this.about(order),
          url: `${this.config.PUBLIC_URL}/desk/${parcel.shopId}/parcels`,
          shop: parcel.shop.name,
          items,
          to: `${parcel.address.name}, ${parcel.address.lines.join(', ')}`,
          dispatchBy: parcel.dispatchBy,
          waits,
        },
      });
    }
  }

  async request(manager: EntityManager, order: Order, booking: Booking): Promise<void> {
    const workshop = await this.place(manager, booking.workshopId);
    const { start, end } = fromRangeText(booking.during);
    await this.mail.queue(manager, {
      template: 'workshop-request',
      to: workshop.email,
      dedupeKey: `workshop-request:${booking.id}`,
      data: {
        ...this.about(order),
        url: `${this.config.PUBLIC_URL}/desk/${workshop.id}/bookings/${booking.id}`,
        workshop: workshop.name,
        when: whenText(start, workshop.timeZone),
        minutes: Math.round((end.getTime() - start.getTime()) / 60_000),
        answerBy: booking.answerBy ? whenText(booking.answerBy, workshop.timeZone) : 'the next working day',
        work: order.job.work.map(({ say }) => say),
      },
    });
  }

  async accepted(manager: EntityManager, order: Order, booking: Booking, now: Date): Promise<void> {
    const workshop = await this.place(manager, booking.workshopId);
    await this.mail.queue(manager, {
      template: 'booking-accepted',
      to: order.email,
      dedupeKey: `booking-accepted:${booking.id}`,
      calendar: this.calendar('REQUEST', order, booking, workshop, now),
      data: {
        ...this.about(order),
        name: order.contact.name,
        workshop: workshop.name,
        address: addressOf(workshop),
        phone: workshop.phone,
        when: whenText(fromRangeText(booking.during).start, workshop.timeZone),
      },
    });
  }

  /** Declined or not answered: the rider chooses again. */
  async openAgain(manager: EntityManager, order: Order, booking: Booking, why: string): Promise<void> {
    const workshop = await this.place(manager, booking.workshopId);
    await this.mail.queue(manager, {
      template: 'booking-open-again',
      to: order.email,
      dedupeKey: `booking-open-again:${booking.id}`,
      data: {
        ...this.about(order),
        name: order.contact.name,
        workshop: workshop.name,
        why,
        selfFit: order.job.selfFitAllowed,
      },
    });
  }

  /** To rider and workshop, with the calendar's cancellation where there was an invitation. */
  async cancelled(
    manager: EntityManager,
    order: Order,
    booking: Booking,
    invited: boolean,
    now: Date,
  ): Promise<void> {
    const workshop = await this.place(manager, booking.workshopId);
    const people = [
      { to: order.email, name: order.contact.name },
      { to: workshop.email, name: workshop.name },
    ];
    for (const { to, name } of people) {
      await this.mail.queue(manager, {
        template: 'booking-cancelled',
        to,
        dedupeKey: `booking-cancelled:${booking.id}:${to}`,
        ...(invited && to === order.email
          ? { calendar: this.calendar('CANCEL', order, booking, workshop, now) }
          : {}),
        data: {
          ...this.about(order),
          name,
          workshop: workshop.name,
          when: whenText(fromRangeText(booking.during).start, workshop.timeZone),
        },
      });
    }
  }

  async sent(manager: EntityManager, order: Order, parcel: Parcel): Promise<void> {
    const shop = await this.place(manager, parcel.shopId);
    const items = await this.itemsIn(manager, parcel.id);
    await this.mail.queue(manager, {
      template: 'parcel-sent',
      to: order.email,
      dedupeKey: `parcel-sent:${parcel.id}`,
      data: {
        ...this.about(order),
        name: order.contact.name,
        shop: shop.name,
        to: parcel.address.name,
        items,
        tracking: parcel.tracking ?? '',
      },
    });
  }

  async fitted(
    manager: EntityManager,
    order: Order,
    booking: Booking,
    mechanic: string,
    rows: [string, string][],
  ): Promise<void> {
    const workshop = await this.place(manager, booking.workshopId);
    await this.mail.queue(manager, {
      template: 'fitted',
      to: order.email,
      dedupeKey: `fitted:${booking.id}`,
      data: {
        ...this.about(order),
        name: order.contact.name,
        workshop: workshop.name,
        mechanic,
        rows,
        cautions: ['Stop riding if something knocks, leaks or comes loose.'],
      },
    });
  }

  private about(order: Order) {
    return {
      reference: order.reference,
      title: order.job.title,
      shockName: order.job.shockName,
      url: `${this.config.PUBLIC_URL}/orders/${order.reference}`,
    };
  }

  private calendar(
    method: CalendarPart['method'],
    order: Order,
    booking: Booking,
    workshop: Organisation,
    now: Date,
  ): CalendarPart {
    const content = calendarText({
      uid: booking.calendarUid,
      sequence: booking.calendarSequence,
      method,
      stampedAt: now,
      ...fromRangeText(booking.during),
      summary: `Shock fitting at ${workshop.name}`,
      description: `${order.job.shockName} into ${order.job.title}. Order ${order.reference}. Telephone ${workshop.phone}.`,
      location: `${workshop.name}, ${addressOf(workshop)}`,
      organizer: { name: workshop.name, email: workshop.email },
      attendee: { name: order.contact.name, email: order.email },
    });
    return { method, content };
  }

  private async itemsIn(manager: EntityManager, parcelId: string): Promise<string[]> {
    const lines = await manager.find(OrderLine, {
      where: { parcelId, kind: 'item' },
      order: { position: 'ASC' },
    });
    return lines.map((line) => `${line.quantity} x ${line.description}`);
  }

  private place(manager: EntityManager, id: string): Promise<Organisation> {
    return manager.findOneOrFail(Organisation, { where: { id }, relations: { town: true } });
  }
}
