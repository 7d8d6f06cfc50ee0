import { Injectable } from '@nestjs/common';
import { In, Not, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { fromRangeText } from '../database/time-range.js';
import { bookStand, type WantedSlot } from '../fitting-bookings/book-stand.js';
import { Booking, type BookingState } from '../fitting-bookings/booking.entity.js';
import { OutboxService } from '../outbox/outbox.service.js';
import { Payment } from '../payments/payment.entity.js';
import { Refund } from '../payments/refund.entity.js';
import { Plan } from '../plans/plan.entity.js';
import { answerDeadline, dayOf } from '../plans/planning/calendar.js';
import { WorkshopsService } from '../workshops/workshops.service.js';
import { dispatchDays } from './dispatch-days.js';
import { freeStock, reserveStock } from './order-stock.js';
import { liveStates, Order, type OrderState } from './order.entity.js';
import { Parcel, type ParcelAddress, type ParcelState } from './parcel.entity.js';
import { RiderMails } from './rider-mails.service.js';
import { TradeMails } from './trade-mails.service.js';
import {
  bookingTransitions,
  orderTransitions,
  parcelTransitions,
  paymentTransitions,
  step,
} from './transitions.js';

export type ReleaseReason = 'cancelled' | 'expired' | 'replaced' | 'payment-unavailable';

/** Every change of an order, its parcels and its booking; each call belongs in one transaction that holds the order's lock. */
@Injectable()
export class OrderLifecycle {
  constructor(
    private readonly clock: Clock,
    private readonly outbox: OutboxService,
    private readonly riderMails: RiderMails,
    private readonly tradeMails: TradeMails,
    private readonly workshops: WorkshopsService,
  ) {}

  /** Reads an order and locks its row: whoever changes it goes through here first. */
  lock(manager: EntityManager, id: string): Promise<Order> {
    return manager.findOneOrFail(Order, { where: { id }, lock: { mode: 'pessimistic_write' } });
  }

  liveBooking(manager: EntityManager, orderId: string): Promise<Booking | null> {
    return manager.findOneBy(Booking, { orderId, state: In(['held', 'requested', 'accepted']) });
  }

  /** Lets stock and slot go; nothing was paid. A reason that was written down before the session ended by call counts. */
  async release(manager: EntityManager, order: Order, reason: ReleaseReason): Promise<void> {
    const releaseReason = order.releaseReason ?? reason;
    await this.setOrder(manager, order, 'released', { releaseReason, endedAt: this.clock.now() });
    await freeStock(manager, order);
    await this.setParcels(manager, order, 'cancelled');
    const booking = await this.liveBooking(manager, order.id);
    if (booking) await this.setBooking(manager, booking, 'released');
    const payment = await manager.findOneByOrFail(Payment, { orderId: order.id });
    payment.state = step(paymentTransitions, payment.state, 'expired');
    await manager.save(payment);
    if (releaseReason === 'expired') await this.riderMails.released(manager, order);
  }

  /** The payment has arrived. After the hold has ended, the order lives again only if all of it is still to be had. */
  async paid(manager: EntityManager, order: Order): Promise<void> {
    const now = this.clock.now();
    const late = order.state === 'released';
    const why = late ? await this.whyNotAgain(manager, order) : null;
    if (why !== null) {
      await this.setOrder(manager, order, 'refunding', { paidAt: now });
      await this.refund(manager, order, order.totalMinor, why);
      return;
    }
    await this.setOrder(manager, order, 'paid', { paidAt: now, releaseReason: null, endedAt: null });
    const booking = await this.liveBooking(manager, order.id);
    // Dates were promised from the moment of ordering; paid in time, they hold.
    if (booking) await this.request(manager, order, booking, late ? now : order.createdAt);
    await this.releaseParcels(manager, order, booking);
    await this.riderMails.paid(manager, order, booking);
    await this.tradeMails.shopOrders(manager, order);
  }

  /** Asks a workshop, and puts the end of its time to answer on the clock. */
  async request(manager: EntityManager, order: Order, booking: Booking, askedAt: Date): Promise<void> {
    const [workshop] = await this.workshops.days(askedAt, manager, booking.workshopId);
    const answerBy =
      (workshop && answerDeadline(askedAt, workshop.calendar)) ?? new Date(askedAt.getTime() + 86_400_000);
    await this.setBooking(manager, booking, 'requested', { answerBy });
    await this.outbox.add(
      manager,
      'booking-unanswered',
      { bookingId: booking.id },
      { dedupeKey: `booking-unanswered:${booking.id}`, runAt: answerBy },
    );
    await this.tradeMails.request(manager, order, booking);
  }

  /** Holds a stand for the order. @returns null when none of the slot's stands is free any more */
  book(manager: EntityManager, order: Order, slot: WantedSlot): Promise<Booking | null> {
    return bookStand(manager, order.id, slot, this.clock.now());
  }

  /** To the workshop once it has accepted, to the rider at once; with the last day on which each has to leave. */
  async releaseParcels(
    manager: EntityManager,
    order: Order,
    booking: Booking | null,
    address?: ParcelAddress,
  ): Promise<void> {
    const releasedAt = booking?.answerBy ?? this.clock.now();
    const days = await dispatchDays(manager, order.id, releasedAt);
    await this.setParcels(manager, order, booking ? 'waiting' : 'to-send', {
      ...(address && { address }),
      dispatchBy: new Map(days.map(({ parcelId, dispatchBy }) => [parcelId, dispatchBy])),
    });
  }

  /** Gives money back on the way it came: the call to the provider follows from the outbox. */
  async refund(manager: EntityManager, order: Order, amountMinor: number, why: string): Promise<void> {
    if (amountMinor <= 0) return;
    const payment = await manager.findOneByOrFail(Payment, { orderId: order.id });
    await manager.increment(Payment, { id: payment.id }, 'refundedMinor', amountMinor);
    const refund = await manager.save(
      manager.create(Refund, {
        paymentId: payment.id,
        amountMinor,
        reason: why,
        state: 'pending',
        createdAt: this.clock.now(),
      }),
    );
    await this.outbox.add(manager, 'refund', { refundId: refund.id }, { dedupeKey: `refund:${refund.id}` });
    await this.riderMails.refunded(manager, order, refund);
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

  /** Why an order that was let go cannot live again, as the rider reads it; null when stock and slot are held anew. */
  private async whyNotAgain(manager: EntityManager, order: Order): Promise<string | null> {
    if (order.planId) {
      // Locked as checkout locks it: a new order of the same plan is either seen here or waits for this one.
      await manager.findOne(Plan, { where: { id: order.planId }, lock: { mode: 'pessimistic_write' } });
      const other = { planId: order.planId, id: Not(order.id), state: In(liveStates) };
      if (await manager.existsBy(Order, other)) {
        return 'this payment arrived after its order had made way for a newer one of the same plan.';
      }
    }
    await manager.query('SAVEPOINT again');
    if ((await reserveStock(manager, order)) && (await this.bookAgain(manager, order))) return null;
    await manager.query('ROLLBACK TO SAVEPOINT again');
    return 'your payment arrived after the hold had ended, and stock or date had gone to somebody else.';
  }

  /** The same time on any stand of the same workshop, if parts can still be there by then. @returns whether the order has what it needs of a workshop */
  private async bookAgain(manager: EntityManager, order: Order): Promise<boolean> {
    const old = await manager.findOne(Booking, {
      where: { orderId: order.id },
      order: { createdAt: 'DESC' },
    });
    if (!old) return true;
    const now = this.clock.now();
    const span = fromRangeText(old.during);
    const [workshop] = await this.workshops.days(now, manager, old.workshopId);
    const answerBy = workshop && answerDeadline(now, workshop.calendar);
    if (!workshop || !answerBy) return false;
    const day = dayOf(span.start, workshop.calendar.timeZone).toString();
    const days = await dispatchDays(manager, order.id, answerBy);
    if (answerBy >= span.start || days.some(({ arrivesOn }) => arrivesOn >= day)) return false;
    const standIds = [...new Set([old.standId, ...workshop.stands])];
    return (await this.book(manager, order, { workshopId: old.workshopId, standIds, ...span })) !== null;
  }
}
