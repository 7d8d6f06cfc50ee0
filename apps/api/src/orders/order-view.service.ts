import type { OrderView } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource, In, Not, type EntityManager } from 'typeorm';

import { CommonException } from '../common/problems/problem.exception.js';
import { fromRangeText } from '../database/time-range.js';
import { Booking } from '../fitting-bookings/booking.entity.js';
import { recordView } from '../fitting-bookings/record-view.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { Payment } from '../payments/payment.entity.js';
import { Refund } from '../payments/refund.entity.js';
import { sellerView } from '../plans/plans.service.js';
import { vatWithin } from '../plans/vat.js';
import { actionsOf, nextOf } from './next-steps.js';
import { OrderLine } from './order-line.entity.js';
import { Order } from './order.entity.js';
import { Parcel } from './parcel.entity.js';
import { currentBooking, timelineOf } from './timeline.js';

/** What the rider sees of an order. */
@Injectable()
export class OrderViews {
  constructor(private readonly dataSource: DataSource) {}

  /** @throws CommonException "not-found" */
  async byReference(manager: EntityManager, reference: string): Promise<Order> {
    const order = await manager.findOneBy(Order, { reference });
    if (!order) throw new CommonException('not-found');
    return order;
  }

  async view(reference: string): Promise<OrderView> {
    const { manager } = this.dataSource;
    const order = await this.byReference(manager, reference);
    const { lines, parcels, payment, refunds, bookings, sellers } = await this.rowsOf(order);
    const placed = bookings.map((booking) => ({
      booking,
      workshopName: booking.workshop.name,
      ...fromRangeText(booking.during),
    }));
    const current = currentBooking({ order, bookings: placed });
    const row = current && placed.find(({ booking }) => booking === current.booking);
    const fitting = row ? await recordView(manager, row.booking.id) : null;
    const fittedAt = fitting?.fittedAt ? new Date(fitting.fittedAt) : null;
    const parts = { order, parcels, bookings: placed, refunds, fittedAt };
    const lineViews = lines.map(lineView);
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
      releaseReason: order.state === 'released' ? order.releaseReason : null,
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
      booking: row ? bookingView(row.booking) : null,
      fitting,
      timeline: timelineOf(parts),
      next: nextOf(parts),
      actions: actionsOf(parts, order.job.selfFitAllowed),
      cautions: order.job.cautions,
    };
  }

  private async rowsOf(order: Order) {
    const { manager } = this.dataSource;
    const orderId = order.id;
    const [lines, parcels, payment, bookings] = await Promise.all([
      manager.find(OrderLine, { where: { orderId }, order: { position: 'ASC' } }),
      manager.find(Parcel, { where: { orderId }, relations: { shop: true }, order: { shopId: 'ASC' } }),
      manager.findOneBy(Payment, { orderId }),
      manager.find(Booking, {
        // One that was let go before it was paid was never asked for.
        where: { orderId, ...(order.paidAt && { state: Not('released') }) },
        relations: { workshop: { town: true } },
        order: { createdAt: 'DESC' },
      }),
    ]);
    const refunds = payment
      ? await manager.find(Refund, { where: { paymentId: payment.id }, order: { createdAt: 'ASC' } })
      : [];
    const sellers = await manager.find(Organisation, {
      where: { id: In([...new Set(lines.map((line) => line.sellerId))]) },
      relations: { town: true },
      order: { name: 'ASC' },
    });
    return { lines, parcels, payment, refunds, bookings, sellers };
  }
}

function lineView({
  kind,
  sellerId,
  description,
  quantity,
  unitMinor,
  vatRateBp,
}: OrderLine): OrderView['lines'][number] {
  const totalMinor = unitMinor * quantity;
  const vatMinor = vatWithin(totalMinor, vatRateBp);
  return { kind, sellerId, description, note: null, quantity, unitMinor, totalMinor, vatMinor };
}

function bookingView(booking: Booking): NonNullable<OrderView['booking']> {
  const { workshop } = booking;
  const { start, end } = fromRangeText(booking.during);
  return {
    workshopName: workshop.name,
    address: [workshop.street, workshop.town.name, workshop.postcode],
    phone: workshop.phone,
    timeZone: workshop.timeZone,
    start: start.toISOString(),
    end: end.toISOString(),
    state: booking.state,
    answerBy: booking.answerBy?.toISOString() ?? null,
    declineReason: booking.declineReason,
  };
}
