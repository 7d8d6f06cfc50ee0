import type { FindOrderBody, OrderView, RebookBody, RebookOptions } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource, In, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { inTransaction } from '../database/in-transaction.js';
import { fromRangeText } from '../database/time-range.js';
import { Booking } from '../fitting-bookings/booking.entity.js';
import { recordView } from '../fitting-bookings/record-view.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { Payment } from '../payments/payment.entity.js';
import { PaymentsService } from '../payments/payments.service.js';
import { jobAt } from '../plans/planning/job-cost.js';
import { answerDeadline, dayOf } from '../plans/planning/calendar.js';
import { freeSlots } from '../plans/planning/free-slots.js';
import { arrivalDay, dispatchDay } from '../plans/planning/dispatch.js';
import { sellerView } from '../plans/plans.service.js';
import { vatWithin } from '../plans/vat.js';
import { WorkshopsService, type WorkshopDay } from '../workshops/workshops.service.js';
import { OrderLifecycle } from './lifecycle.service.js';
import { OrderLine } from './order-line.entity.js';
import { OrderMails } from './order-mails.service.js';
import { Order } from './order.entity.js';
import { OrdersException } from './orders.exception.js';
import { Parcel } from './parcel.entity.js';
import { actionsOf, needsChoice, nextOf, timelineOf } from './timeline.js';

/** Slots offered per workshop when the rider chooses again. */
const slotsOffered = 40;

@Injectable()
export class OrdersService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    private readonly mails: OrderMails,
    private readonly payments: PaymentsService,
    private readonly workshops: WorkshopsService,
  ) {}

  /** The order's id for reference and e-mail together. @throws CommonException "not-found" whatever was wrong */
  async find({ reference, email }: FindOrderBody): Promise<string> {
    const order = await this.dataSource.manager.findOneBy(Order, { reference, email });
    if (!order) throw new CommonException('not-found');
    return order.id;
  }

  async view(reference: string): Promise<OrderView> {
    const { manager } = this.dataSource;
    const order = await this.byReference(manager, reference);
    const [lines, parcels, payment, bookings] = await Promise.all([
      manager.find(OrderLine, { where: { orderId: order.id }, order: { position: 'ASC' } }),
      manager.find(Parcel, { where: { orderId: order.id }, relations: { shop: true } }),
      manager.findOneBy(Payment, { orderId: order.id }),
      manager.find(Booking, { where: { orderId: order.id }, order: { createdAt: 'DESC' } }),
    ]);
    const sellers = await manager.find(Organisation, {
      where: { id: In([...new Set(lines.map((line) => line.sellerId))]) },
      relations: { town: true },
      order: { name: 'ASC' },
    });
    // A fitting that was given up for self-fit is history, not this order's booking.
    const current = bookings.find(({ state }) => ['requested', 'accepted', 'fitted'].includes(state));
    const booking = order.fit === 'workshop' ? (current ?? bookings[0] ?? null) : null;
    const workshop = booking
      ? await manager.findOneOrFail(Organisation, {
          where: { id: booking.workshopId },
          relations: { town: true },
        })
      : null;
    const fitting = booking && (await recordView(manager, booking.id));
    const span = booking && fromRangeText(booking.during);
    const parts = {
      order,
      parcels,
      booking,
      fittingAt: span?.start ?? null,
      workshopName: workshop?.name ?? null,
      fittedAt: fitting?.fittedAt ? new Date(fitting.fittedAt) : null,
    };
    const lineViews = lines.map((line) => {
      const totalMinor = line.unitMinor * line.quantity;
      return {
        kind: line.kind,
        sellerId: line.sellerId,
        description: line.description,
        note: null,
        quantity: line.quantity,
        unitMinor: line.unitMinor,
        totalMinor,
        vatMinor: vatWithin(totalMinor, line.vatRateBp),
      };
    });
    return {
      reference,
      state: order.state,
      fit: order.fit,
      planId: order.planId,
      measureUpId: order.measureUpId,
      title: order.job.title,
      shockName: order.job.shockName,
      verdict: order.job.verdict,
      email: order.email,
      createdAt: order.createdAt.toISOString(),
      paidAt: order.paidAt?.toISOString() ?? null,
      holdExpiresAt: order.holdExpiresAt.toISOString(),
      paymentUrl: order.state === 'held' ? (payment?.url ?? null) : null,
      releaseReason: order.releaseReason,
      lines: lineViews,
      sellers: sellers.map(sellerView),
      totalMinor: order.totalMinor,
      vatMinor: lineViews.reduce((sum, line) => sum + line.vatMinor, 0),
      refundedMinor: payment?.refundedMinor ?? 0,
      parcels: parcels.map((parcel) => ({
        shopName: parcel.shop.name,
        state: parcel.state,
        to: [parcel.address.name, ...parcel.address.lines],
        dispatchBy: parcel.dispatchBy,
        sentAt: parcel.sentAt?.toISOString() ?? null,
        tracking: parcel.tracking,
        items: lines
          .filter((line) => line.parcelId === parcel.id && line.kind === 'item')
          .map((line) => `${line.quantity} x ${line.description}`),
      })),
      booking:
        booking && workshop && span
          ? {
              workshopName: workshop.name,
              address: [workshop.street, workshop.town.name, workshop.postcode],
              phone: workshop.phone,
              timeZone: workshop.timeZone,
              start: span.start.toISOString(),
              end: span.end.toISOString(),
              state: booking.state,
              answerBy: booking.answerBy?.toISOString() ?? null,
              declineReason: booking.declineReason,
            }
          : null,
      fitting,
      timeline: timelineOf(parts),
      next: nextOf(parts),
      actions: actionsOf(parts),
      cautions: order.job.cautions,
    };
  }

  /** The rider came back from the payment page without paying. */
  async cancelPayment(reference: string): Promise<OrderView> {
    const order = await this.byReference(this.dataSource.manager, reference);
    if (order.state === 'held') await this.payments.giveUp(order.id, 'cancelled');
    return this.view(reference);
  }

  /** Where else what is paid for could be fitted: only workshops whose price is at most what was paid for the work. */
  async rebookOptions(reference: string): Promise<RebookOptions> {
    const order = await this.byReference(this.dataSource.manager, reference);
    const options = await this.optionsFor(order, this.dataSource.manager);
    return {
      workshops: options.map(({ workshop, slots }) => ({
        id: workshop.id,
        name: workshop.name,
        town: workshop.town,
        distanceKm: null,
        timeZone: workshop.calendar.timeZone,
        slots: slots.map(({ start, end }) => ({ start: start.toISOString(), end: end.toISOString() })),
      })),
      selfFit: { allowed: order.job.selfFitAllowed, reason: order.job.selfFitReason },
    };
  }

  async rebook(reference: string, { workshopId, slotStart }: RebookBody): Promise<OrderView> {
    await this.change(reference, async (manager, order) => {
      if (!(await this.open(manager, order))) throw new OrdersException('not-now');
      const option = (await this.optionsFor(order, manager)).find(
        ({ workshop }) => workshop.id === workshopId,
      );
      if (!option) throw new OrdersException('no-such-workshop');
      const wanted = new Date(slotStart).getTime();
      const slot = option.slots.find(({ start }) => start.getTime() === wanted);
      const booking = slot && (await this.lifecycle.book(manager, order, { workshopId, ...slot }));
      if (!booking)
        throw new OrdersException('slot-taken', { detail: 'Choose another date; nothing has changed.' });
      await this.moveWork(manager, order, option.workshop, option.priceMinor);
      const { town, ...place } = option.workshop;
      await this.lifecycle.setParcels(manager, order, 'waiting', {
        address: { name: place.name, lines: [place.street, town, place.postcode] },
      });
      await this.lifecycle.request(manager, order, booking);
    });
    return this.view(reference);
  }

  async selfFit(reference: string): Promise<OrderView> {
    await this.change(reference, async (manager, order) => {
      if (!(await this.open(manager, order))) throw new OrdersException('not-now');
      if (!order.job.selfFitAllowed) {
        throw new OrdersException('self-fit-not-offered', { detail: order.job.selfFitReason ?? '' });
      }
      const { name, street, town, postcode } = order.contact;
      order.fit = 'self';
      order.version += 1;
      await manager.save(order);
      await this.lifecycle.setParcels(manager, order, 'to-send', {
        address: { name, lines: [street, town, postcode] },
      });
      const work = await manager.findOneBy(OrderLine, { orderId: order.id, kind: 'work' });
      if (work) {
        await this.lifecycle.refund(
          manager,
          order,
          work.unitMinor,
          'You fit it yourself, so the price of the work goes back to you.',
        );
      }
      await this.mails.shops(manager, order, false);
    });
    return this.view(reference);
  }

  /** All the money back, while nothing has been sent. */
  async refund(reference: string): Promise<OrderView> {
    await this.change(reference, async (manager, order) => {
      if (order.state !== 'paid') throw new OrdersException('not-now');
      // Locked before they are looked at: a shop that marks one sent at this moment waits, or has won.
      const parcels = await manager.find(Parcel, {
        where: { orderId: order.id },
        lock: { mode: 'pessimistic_write' },
      });
      if (parcels.some((parcel) => parcel.state === 'sent')) {
        throw new OrdersException('already-sent', {
          detail: 'A parcel is on its way; see our returns page for what to do now.',
        });
      }
      const payment = await manager.findOneByOrFail(Payment, { orderId: order.id });
      const now = this.clock.now();
      const booking = await this.lifecycle.liveBooking(manager, order.id);
      if (booking) {
        const invited = booking.state === 'accepted';
        if (invited) booking.calendarSequence += 1;
        await this.lifecycle.setBooking(manager, booking, 'cancelled', { decidedAt: now });
        await this.mails.cancelled(manager, order, booking, invited, now);
      }
      await this.lifecycle.freeStock(manager, order);
      await this.lifecycle.setParcels(manager, order, 'cancelled');
      await this.lifecycle.setOrder(manager, order, 'refunding');
      await this.lifecycle.refund(
        manager,
        order,
        payment.amountMinor - payment.refundedMinor,
        'You asked for your money back before anything was sent.',
      );
    });
    return this.view(reference);
  }

  private async change(
    reference: string,
    work: (manager: EntityManager, order: Order) => Promise<void>,
  ): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const { id } = await this.byReference(manager, reference);
      await work(manager, await this.lifecycle.lock(manager, id));
    });
  }

  private async byReference(manager: EntityManager, reference: string): Promise<Order> {
    const order = await manager.findOneBy(Order, { reference });
    if (!order) throw new CommonException('not-found');
    return order;
  }

  private async open(manager: EntityManager, order: Order): Promise<boolean> {
    return needsChoice({ order, booking: await this.lifecycle.liveBooking(manager, order.id) });
  }

  private async optionsFor(order: Order, manager: EntityManager) {
    const now = this.clock.now();
    const paid = await manager.findOneBy(OrderLine, { orderId: order.id, kind: 'work' });
    const parcels = await manager.find(Parcel, { where: { orderId: order.id }, relations: { shop: true } });
    const workshops = await this.workshops.days(now, manager);
    return workshops.flatMap((workshop) => {
      const job = jobAt(
        workshop,
        order.job.work.map(({ id }) => id),
      );
      const released = answerDeadline(now, workshop.calendar);
      if (!job || !released || job.priceMinor > (paid?.unitMinor ?? 0)) return [];
      const arrivals = parcels.map(({ shop }) => {
        const dispatch = {
          timeZone: shop.timeZone,
          cutoff: shop.dispatchCutoff,
          weekdays: shop.dispatchWeekdays,
          carrierDays: shop.carrierDays,
        };
        return arrivalDay(dispatchDay(released, dispatch, 0), shop.carrierDays).toString();
      });
      const afterDay = arrivals.sort().at(-1) ?? dayOf(released, workshop.calendar.timeZone).toString();
      const slots = freeSlots(workshop.calendar, workshop.stands, workshop.busy, {
        minutes: job.minutes,
        afterDay,
        limit: slotsOffered,
      });
      return slots.length > 0 ? [{ workshop, slots, priceMinor: job.priceMinor }] : [];
    });
  }

  /** The work line goes to the new workshop at its price; what was paid above it goes back. */
  private async moveWork(
    manager: EntityManager,
    order: Order,
    workshop: WorkshopDay,
    priceMinor: number,
  ): Promise<void> {
    const line = await manager.findOneByOrFail(OrderLine, { orderId: order.id, kind: 'work' });
    const above = line.unitMinor - priceMinor;
    await manager.update(
      OrderLine,
      { id: line.id },
      { sellerId: workshop.id, unitMinor: priceMinor, vatRateBp: workshop.vatRateBp },
    );
    await this.lifecycle.refund(
      manager,
      order,
      above,
      `${workshop.name} asks less for the work than you paid; the difference goes back to you.`,
    );
  }
}
