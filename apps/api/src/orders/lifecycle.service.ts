import { randomUUID } from 'node:crypto';

import { Injectable } from '@nestjs/common';
import { In, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { sqlState } from '../database/in-transaction.js';
import { fromRangeText, toRangeText } from '../database/time-range.js';
import { Booking, type BookingState } from '../fitting-bookings/booking.entity.js';
import { OutboxService } from '../outbox/outbox.service.js';
import { Payment } from '../payments/payment.entity.js';
import { Refund } from '../payments/refund.entity.js';
import { answerDeadline } from '../plans/planning/calendar.js';
import { moveStock } from '../stock/move-stock.js';
import { WorkshopsService } from '../workshops/workshops.service.js';
import { OrderLine } from './order-line.entity.js';
import { OrderMails } from './order-mails.service.js';
import { Order, type OrderState } from './order.entity.js';
import { Parcel, type ParcelAddress, type ParcelState } from './parcel.entity.js';
import { bookingTransitions, orderTransitions, parcelTransitions, step } from './transitions.js';

export type ReleaseReason = 'cancelled' | 'expired' | 'payment-unavailable';

/** Every change of an order, its parcels and its booking; each call belongs in one transaction that holds the order's lock. */
@Injectable()
export class OrderLifecycle {
  constructor(
    private readonly clock: Clock,
    private readonly outbox: OutboxService,
    private readonly mails: OrderMails,
    private readonly workshops: WorkshopsService,
  ) {}

  /** Reads an order and locks its row: whoever changes it goes through here first. */
  lock(manager: EntityManager, id: string): Promise<Order> {
    return manager.findOneOrFail(Order, { where: { id }, lock: { mode: 'pessimistic_write' } });
  }

  liveBooking(manager: EntityManager, orderId: string): Promise<Booking | null> {
    return manager.findOneBy(Booking, { orderId, state: In(['held', 'requested', 'accepted']) });
  }

  /** Lets stock and slot go; nothing was paid. */
  async release(manager: EntityManager, order: Order, reason: ReleaseReason): Promise<void> {
    await this.setOrder(manager, order, 'released', { releaseReason: reason, endedAt: this.clock.now() });
    await this.freeStock(manager, order);
    await this.setParcels(manager, order, 'cancelled');
    const booking = await this.liveBooking(manager, order.id);
    if (booking) await this.setBooking(manager, booking, 'released');
    await manager.update(Payment, { orderId: order.id }, { state: 'expired' });
    if (reason === 'expired') {
      await this.mails.released(manager, order, 'the time to pay ran out, so stock and date were let go.');
    }
  }

  /** The payment has arrived. @returns false when the hold had ended and stock or slot are gone: the money goes back */
  async paid(manager: EntityManager, order: Order): Promise<boolean> {
    if (order.state === 'released' && !(await this.holdAgain(manager, order))) {
      await this.setOrder(manager, order, 'refunding', { paidAt: this.clock.now() });
      const why =
        'your payment arrived after the hold had ended, and stock or date had gone to somebody else.';
      await this.refund(manager, order, order.totalMinor, why);
      return false;
    }
    const now = this.clock.now();
    await this.setOrder(manager, order, 'paid', { paidAt: now, releaseReason: null, endedAt: null });
    const booking = await this.liveBooking(manager, order.id);
    await this.setParcels(manager, order, booking ? 'waiting' : 'to-send');
    if (booking) await this.request(manager, order, booking);
    await this.mails.paid(
      manager,
      order,
      booking
        ? 'The workshop now has one working day to accept the fitting; parts are sent when it has.'
        : 'The shops now send your parts.',
    );
    await this.mails.shops(manager, order, booking !== null);
    return true;
  }

  /** Asks a workshop, and puts the end of its time to answer on the clock. */
  async request(manager: EntityManager, order: Order, booking: Booking): Promise<void> {
    const now = this.clock.now();
    const [workshop] = await this.workshops.days(now, manager, booking.workshopId);
    const answerBy =
      (workshop && answerDeadline(now, workshop.calendar)) ?? new Date(now.getTime() + 86_400_000);
    await this.setBooking(manager, booking, 'requested', { answerBy });
    await this.outbox.add(
      manager,
      'booking-unanswered',
      { bookingId: booking.id },
      { dedupeKey: `booking-unanswered:${booking.id}`, runAt: answerBy },
    );
    await this.mails.request(manager, order, booking);
  }

  /** Puts a booking on the first of the stands that is still free. @returns null when none is */
  async book(
    manager: EntityManager,
    order: Order,
    slot: { workshopId: string; standIds: readonly string[]; start: Date; end: Date },
    state: BookingState = 'held',
  ): Promise<Booking | null> {
    for (const standId of slot.standIds) {
      await manager.query('SAVEPOINT stand');
      try {
        const booking = await manager.save(
          manager.create(Booking, {
            orderId: order.id,
            workshopId: slot.workshopId,
            standId,
            during: toRangeText(slot),
            state,
            calendarUid: `${randomUUID()}@linkfell`,
            createdAt: this.clock.now(),
          }),
        );
        await manager.query('RELEASE SAVEPOINT stand');
        return booking;
      } catch (error) {
        if (sqlState(error) !== '23P01') throw error;
        await manager.query('ROLLBACK TO SAVEPOINT stand');
      }
    }
    return null;
  }

  /** Gives money back on the way it came: the call to the provider follows from the outbox. */
  async refund(manager: EntityManager, order: Order, amountMinor: number, why: string): Promise<void> {
    if (amountMinor <= 0) return;
    const payment = await manager.findOneByOrFail(Payment, { orderId: order.id });
    await manager.increment(Payment, { id: payment.id }, 'refundedMinor', amountMinor);
    const refund = await manager.save(Refund, {
      paymentId: payment.id,
      amountMinor,
      reason: why,
      state: 'pending' as const,
      createdAt: this.clock.now(),
    });
    await this.outbox.add(manager, 'refund', { refundId: refund.id }, { dedupeKey: `refund:${refund.id}` });
    await this.mails.refunded(manager, order, amountMinor, why, refund.id);
  }

  async setOrder(
    manager: EntityManager,
    order: Order,
    to: OrderState,
    rest: Partial<Order> = {},
  ): Promise<void> {
    order.state = step(orderTransitions, order.state, to);
    Object.assign(order, rest);
    order.version += 1;
    await manager.save(order);
  }

  async setBooking(
    manager: EntityManager,
    booking: Booking,
    to: BookingState,
    rest: Partial<Booking> = {},
  ): Promise<void> {
    booking.state = step(bookingTransitions, booking.state, to);
    Object.assign(booking, rest);
    booking.version += 1;
    await manager.save(booking);
  }

  /** All parcels of the order that can go there; those already sent stay as they are. */
  async setParcels(
    manager: EntityManager,
    order: Order,
    to: ParcelState,
    { address, dispatchBy }: { address?: ParcelAddress; dispatchBy?: Map<string, string> } = {},
  ): Promise<void> {
    const parcels = await manager.findBy(Parcel, { orderId: order.id });
    for (const parcel of parcels) {
      if (parcel.state === 'sent') continue;
      if (parcel.state !== to) parcel.state = step(parcelTransitions, parcel.state, to);
      if (address) parcel.address = address;
      parcel.dispatchBy = dispatchBy?.get(parcel.id) ?? parcel.dispatchBy;
      parcel.version += 1;
      await manager.save(parcel);
    }
  }

  async freeStock(manager: EntityManager, order: Order): Promise<void> {
    for (const line of await this.stockLines(manager, order)) {
      const listingId = line.listingId as string;
      await moveStock(manager, {
        listingId,
        kind: 'release',
        quantity: 0,
        reserved: -line.quantity,
        orderId: order.id,
      });
    }
  }

  /** Item lines in the order of their listings, so that two orders never wait for each other in a circle. */
  async stockLines(manager: EntityManager, order: Order): Promise<OrderLine[]> {
    return manager.find(OrderLine, {
      where: { orderId: order.id, kind: 'item' },
      order: { listingId: 'ASC' },
    });
  }

  private async holdAgain(manager: EntityManager, order: Order): Promise<boolean> {
    await manager.query('SAVEPOINT again');
    for (const line of await this.stockLines(manager, order)) {
      const listingId = line.listingId as string;
      const taken = await moveStock(manager, {
        listingId,
        kind: 'reserve',
        quantity: 0,
        reserved: line.quantity,
        orderId: order.id,
      });
      if (!taken) {
        await manager.query('ROLLBACK TO SAVEPOINT again');
        return false;
      }
    }
    const [old] = await manager.find(Booking, {
      where: { orderId: order.id },
      order: { createdAt: 'DESC' },
      take: 1,
    });
    if (!old) return true;
    const { start, end } = fromRangeText(old.during);
    const again = await this.book(manager, order, {
      workshopId: old.workshopId,
      standIds: [old.standId],
      start,
      end,
    });
    if (again) return true;
    await manager.query('ROLLBACK TO SAVEPOINT again');
    return false;
  }
}
