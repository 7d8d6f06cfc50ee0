import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

import { fromRangeText } from '../database/time-range.js';
import type { Booking } from '../fitting-bookings/booking.entity.js';
import { calendarText } from '../fitting-bookings/calendar.js';
import type { CalendarPart } from '../notifications/mail.js';
import { MailService } from '../notifications/mail.service.js';
import type { Organisation } from '../organisations/organisation.entity.js';
import type { Refund } from '../payments/refund.entity.js';
import { addressOf, MailFacts } from './mail-facts.service.js';
import { poundsText } from './money-text.js';
import { OrderLine } from './order-line.entity.js';
import type { Order } from './order.entity.js';
import type { Parcel } from './parcel.entity.js';

/** All mails to the rider about an order, queued in the transaction that gives rise to them. */
@Injectable()
export class RiderMails {
  constructor(
    private readonly mail: MailService,
    private readonly facts: MailFacts,
  ) {}

  async paid(manager: EntityManager, order: Order, booking: Booking | null): Promise<void> {
    const lines = await manager.find(OrderLine, { where: { orderId: order.id }, order: { position: 'ASC' } });
    const workshop = booking && (await this.facts.place(manager, booking.workshopId));
    await this.mail.queue(manager, {
      template: 'order-paid',
      to: order.email,
      dedupeKey: `order-paid:${order.id}`,
      data: {
        ...this.toRider(order),
        total: poundsText(order.totalMinor),
        lines: lines.map((line) => `${line.description}: ${poundsText(line.unitMinor * line.quantity)}`),
        fitting: booking && workshop && `${workshop.name}\n${this.facts.when(booking, workshop)}`,
        next:
          booking && workshop
            ? `${workshop.name} has until ${this.facts.answerBy(booking, workshop)} to accept the fitting; parts are sent when it has, and we write to you either way.`
            : 'The shops now send your parts; we write to you as each parcel leaves.',
      },
    });
  }

  async released(manager: EntityManager, order: Order): Promise<void> {
    await this.mail.queue(manager, {
      template: 'order-released',
      to: order.email,
      dedupeKey: `order-released:${order.id}`,
      data: {
        ...this.toRider(order),
        why: 'the time to pay ran out, so stock and date were let go.',
        planUrl: order.planId && this.facts.url(`/plans/${order.planId}`),
      },
    });
  }

  async refunded(manager: EntityManager, order: Order, refund: Refund): Promise<void> {
    await this.mail.queue(manager, {
      template: 'order-refunded',
      to: order.email,
      dedupeKey: `order-refunded:${refund.id}`,
      data: { ...this.toRider(order), amount: poundsText(refund.amountMinor), why: refund.reason },
    });
  }

  async refundFailed(manager: EntityManager, order: Order, refund: Refund): Promise<void> {
    await this.mail.queue(manager, {
      template: 'refund-failed',
      to: order.email,
      dedupeKey: `refund-failed:${refund.id}`,
      data: { ...this.toRider(order), amount: poundsText(refund.amountMinor) },
    });
  }

  async sent(manager: EntityManager, order: Order, parcel: Parcel): Promise<void> {
    const shop = await this.facts.place(manager, parcel.shopId);
    await this.mail.queue(manager, {
      template: 'parcel-sent',
      to: order.email,
      dedupeKey: `parcel-sent:${parcel.id}`,
      data: {
        ...this.toRider(order),
        shop: shop.name,
        to: parcel.address.name,
        items: await this.facts.itemsIn(manager, parcel.id),
        tracking: parcel.tracking ?? '',
        next:
          order.fit === 'self'
            ? 'Fit it to the torques printed on bolts, frame or manual; if unsure, have a qualified mechanic do it.'
            : 'The workshop keeps it for your fitting.',
      },
    });
  }

  async asked(manager: EntityManager, order: Order, booking: Booking): Promise<void> {
    const workshop = await this.facts.place(manager, booking.workshopId);
    await this.mail.queue(manager, {
      template: 'booking-asked',
      to: order.email,
      dedupeKey: `booking-asked:${booking.id}`,
      data: {
        ...this.toRider(order),
        workshop: workshop.name,
        when: this.facts.when(booking, workshop),
        answerBy: this.facts.answerBy(booking, workshop),
      },
    });
  }

  async accepted(manager: EntityManager, order: Order, booking: Booking, now: Date): Promise<void> {
    const workshop = await this.facts.place(manager, booking.workshopId);
    await this.mail.queue(manager, {
      template: 'booking-accepted',
      to: order.email,
      dedupeKey: `booking-accepted:${booking.id}`,
      calendar: this.calendar('REQUEST', order, booking, workshop, now),
      data: {
        ...this.toRider(order),
        workshop: workshop.name,
        address: addressOf(workshop),
        phone: workshop.phone,
        when: this.facts.when(booking, workshop),
      },
    });
  }

  /** Declined or not answered: the rider chooses again. */
  async openAgain(manager: EntityManager, order: Order, booking: Booking, why: string): Promise<void> {
    const workshop = await this.facts.place(manager, booking.workshopId);
    await this.mail.queue(manager, {
      template: 'booking-open-again',
      to: order.email,
      dedupeKey: `booking-open-again:${booking.id}`,
      data: {
        ...this.toRider(order),
        workshop: workshop.name,
        why,
        selfFit: order.job.selfFitAllowed,
      },
    });
  }

  /** @param invited an invitation went out, so the calendar has to take it out again */
  async cancelled(
    manager: EntityManager,
    order: Order,
    booking: Booking,
    { invited, now }: { invited: boolean; now: Date },
  ): Promise<void> {
    const workshop = await this.facts.place(manager, booking.workshopId);
    await this.mail.queue(manager, {
      template: 'booking-cancelled',
      to: order.email,
      dedupeKey: `booking-cancelled:${booking.id}:rider`,
      ...(invited && { calendar: this.calendar('CANCEL', order, booking, workshop, now) }),
      data: {
        ...this.toRider(order),
        workshop: workshop.name,
        when: this.facts.when(booking, workshop),
        invited,
      },
    });
  }

  async fitted(
    manager: EntityManager,
    order: Order,
    booking: Booking,
    { mechanic, rows }: { mechanic: string; rows: [string, string][] },
  ): Promise<void> {
    const workshop = await this.facts.place(manager, booking.workshopId);
    await this.mail.queue(manager, {
      template: 'fitted',
      to: order.email,
      dedupeKey: `fitted:${booking.id}`,
      data: {
        ...this.toRider(order),
        workshop: workshop.name,
        mechanic,
        rows,
        cautions: ['Stop riding if something knocks, leaks or comes loose.'],
      },
    });
  }

  private toRider(order: Order) {
    return { ...this.facts.about(order), name: order.contact.name };
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
}
