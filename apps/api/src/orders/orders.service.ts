import type { FindOrderBody, OrderView, RebookBody, RebookOptions } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { inTransaction } from '../database/in-transaction.js';
import { Payment } from '../payments/payment.entity.js';
import { PaymentsService } from '../payments/payments.service.js';
import { freeStock } from './order-stock.js';
import { OrderLifecycle } from './lifecycle.service.js';
import { OrderLine } from './order-line.entity.js';
import { OrderViews } from './order-view.service.js';
import { Order } from './order.entity.js';
import { OrdersException } from './orders.exception.js';
import { OtherWorkshops, type WorkshopOption } from './other-workshops.service.js';
import { Parcel } from './parcel.entity.js';
import { RiderMails } from './rider-mails.service.js';
import { TradeMails } from './trade-mails.service.js';

const slotView = ({ start, end }: { start: Date; end: Date }) => ({
  start: start.toISOString(),
  end: end.toISOString(),
});

/** What the rider does with an order. */
@Injectable()
export class OrdersService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    private readonly riderMails: RiderMails,
    private readonly tradeMails: TradeMails,
    private readonly payments: PaymentsService,
    private readonly others: OtherWorkshops,
    private readonly views: OrderViews,
  ) {}

  /** The order's id for reference and e-mail together. @throws CommonException "not-found" whatever was wrong */
  async find({ reference, email }: FindOrderBody): Promise<string> {
    const order = await this.dataSource.manager.findOneBy(Order, { reference, email });
    if (!order) throw new CommonException('not-found');
    return order.id;
  }

  view(reference: string): Promise<OrderView> {
    return this.views.view(reference);
  }

  /** The rider came back from the payment page without paying. */
  async cancelPayment(reference: string): Promise<OrderView> {
    const order = await this.views.byReference(this.dataSource.manager, reference);
    if (order.state === 'held') await this.payments.giveUp(order.id, 'cancelled');
    return this.view(reference);
  }

  async rebookOptions(reference: string): Promise<RebookOptions> {
    const { manager } = this.dataSource;
    const order = await this.views.byReference(manager, reference);
    const options = await this.others.optionsFor(order, manager);
    return {
      workshops: options.map(({ workshop, slots }) => ({
        id: workshop.id,
        name: workshop.name,
        town: workshop.town,
        distanceKm: null,
        timeZone: workshop.calendar.timeZone,
        slots: slots.map(slotView),
      })),
      selfFit: { allowed: order.job.selfFitAllowed, reason: order.job.selfFitReason },
    };
  }

  /** Another workshop for what is paid already. @throws OrdersException "not-now", "no-such-workshop", "slot-taken" */
  rebook(reference: string, { workshopId, slotStart }: RebookBody): Promise<OrderView> {
    return this.change(reference, async (manager, order) => {
      await this.needChoice(manager, order);
      const options = await this.others.optionsFor(order, manager);
      const option = options.find(({ workshop }) => workshop.id === workshopId);
      if (!option) throw new OrdersException('no-such-workshop');
      const wanted = new Date(slotStart).getTime();
      const slot = option.slots.find(({ start }) => start.getTime() === wanted);
      const booking = slot && (await this.lifecycle.book(manager, order, { workshopId, ...slot }));
      if (!booking) {
        throw new OrdersException('slot-taken', {
          detail: 'Choose another date; nothing has changed.',
          extensions: {
            slots: option.slots
              .filter((other) => other !== slot)
              .slice(0, 6)
              .map(slotView),
          },
        });
      }
      await this.moveWork(manager, order, option);
      await this.lifecycle.request(manager, order, booking, this.clock.now());
      const { name, street, town, postcode } = option.workshop;
      const address = { name, lines: [street, town, postcode] };
      await this.lifecycle.releaseParcels(manager, order, booking, address);
      await this.riderMails.asked(manager, order, booking);
    });
  }

  /** The parts go to the rider, the price of the work goes back. @throws OrdersException "not-now", "self-fit-not-offered" */
  selfFit(reference: string): Promise<OrderView> {
    return this.change(reference, async (manager, order) => {
      await this.needChoice(manager, order);
      if (!order.job.selfFitAllowed) {
        throw new OrdersException('self-fit-not-offered', { detail: order.job.selfFitReason ?? '' });
      }
      const { name, street, town, postcode } = order.contact;
      order.fit = 'self';
      order.version += 1;
      await manager.save(order);
      const address = { name, lines: [street, town, postcode] };
      await this.lifecycle.releaseParcels(manager, order, null, address);
      const work = await manager.findOneBy(OrderLine, { orderId: order.id, kind: 'work' });
      const why = 'you fit it yourself, so the price of the work goes back to you.';
      await this.lifecycle.refund(manager, order, work?.unitMinor ?? 0, why);
      await this.tradeMails.shopOrders(manager, order);
    });
  }

  /** All the money back, while nothing has been sent. @throws OrdersException "not-now", "already-sent" */
  refund(reference: string): Promise<OrderView> {
    return this.change(reference, async (manager, order) => {
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
      await this.callOffFitting(manager, order);
      await this.tradeMails.shopsCancelled(manager, order);
      await freeStock(manager, order);
      await this.lifecycle.setParcels(manager, order, 'cancelled');
      await this.lifecycle.setOrder(manager, order, 'refunding');
      const payment = await manager.findOneByOrFail(Payment, { orderId: order.id });
      const left = payment.amountMinor - payment.refundedMinor;
      const why = 'you asked for your money back before anything was sent.';
      await this.lifecycle.refund(manager, order, left, why);
    });
  }

  private async callOffFitting(manager: EntityManager, order: Order): Promise<void> {
    const booking = await this.lifecycle.liveBooking(manager, order.id);
    if (!booking) return;
    const now = this.clock.now();
    const invited = booking.state === 'accepted';
    const calendarSequence = booking.calendarSequence + (invited ? 1 : 0);
    await this.lifecycle.setBooking(manager, booking, 'cancelled', { decidedAt: now, calendarSequence });
    await this.riderMails.cancelled(manager, order, booking, { invited, now });
    await this.tradeMails.cancelled(manager, order, booking);
  }

  /** The work line goes to the new workshop at its price; what was paid above it goes back. */
  private async moveWork(
    manager: EntityManager,
    order: Order,
    { workshop, minutes, priceMinor }: WorkshopOption,
  ): Promise<void> {
    const line = await manager.findOneByOrFail(OrderLine, { orderId: order.id, kind: 'work' });
    const above = line.unitMinor - priceMinor;
    await manager.update(
      OrderLine,
      { id: line.id },
      {
        sellerId: workshop.id,
        unitMinor: priceMinor,
        vatRateBp: workshop.vatRateBp,
        description: `Fitting, ${minutes} minutes`,
      },
    );
    // The job sheet is for the new workshop: its own minutes and prices.
    const work = order.job.work.map((item) => ({ ...item, ...workshop.services.get(item.id) }));
    order.job = { ...order.job, work };
    await manager.save(order);
    const why = `${workshop.name} asks less for the work than you paid; the difference goes back to you.`;
    await this.lifecycle.refund(manager, order, above, why);
  }

  private async needChoice(manager: EntityManager, order: Order): Promise<void> {
    const booked = await this.lifecycle.liveBooking(manager, order.id);
    if (order.state !== 'paid' || order.fit !== 'workshop' || booked) throw new OrdersException('not-now');
  }

  private async change(
    reference: string,
    work: (manager: EntityManager, order: Order) => Promise<void>,
  ): Promise<OrderView> {
    await inTransaction(this.dataSource, async (manager) => {
      const { id } = await this.views.byReference(manager, reference);
      await work(manager, await this.lifecycle.lock(manager, id));
    });
    return this.view(reference);
  }
}
