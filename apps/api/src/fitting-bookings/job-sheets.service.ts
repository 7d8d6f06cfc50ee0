import type { BookingList, JobSheetView } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource, In, Not, type EntityManager } from 'typeorm';

import { CommonException } from '../common/problems/problem.exception.js';
import { fromRangeText } from '../database/time-range.js';
import { dayText } from '../orders/date-text.js';
import { OrderLine } from '../orders/order-line.entity.js';
import { Parcel } from '../orders/parcel.entity.js';
import { Booking } from './booking.entity.js';
import { missing } from './missing.js';
import { recordView } from './record-view.js';
import { torqueRemarks } from './torque-remarks.js';

type Summary = BookingList['bookings'][number];

/** What a workshop sees of its fittings. */
@Injectable()
export class JobSheets {
  constructor(private readonly dataSource: DataSource) {}

  async list(workshopId: string): Promise<BookingList> {
    const bookings = await this.dataSource.manager.find(Booking, {
      where: { workshopId, state: Not(In(['held', 'released'])) },
      relations: { order: true, stand: true, workshop: true },
    });
    return { bookings: bookings.map(summary).sort((a, b) => a.start.localeCompare(b.start)) };
  }

  /** @throws CommonException "not-found" for a booking that is another workshop's, or not paid */
  async find(manager: EntityManager, workshopId: string, id: string): Promise<Booking> {
    const booking = await manager.findOne(Booking, {
      where: { id, workshopId, state: Not(In(['held', 'released'])) },
      relations: { order: true, stand: true, workshop: true },
    });
    if (!booking) throw new CommonException('not-found');
    return booking;
  }

  async jobSheet(workshopId: string, bookingId: string): Promise<JobSheetView> {
    const { manager } = this.dataSource;
    const booking = await this.find(manager, workshopId, bookingId);
    const { order } = booking;
    const { job } = order;
    const parcels = await manager.find(Parcel, { where: { orderId: order.id }, relations: { shop: true } });
    const lines = await manager.find(OrderLine, {
      where: { orderId: order.id, kind: 'item' },
      order: { position: 'ASC' },
    });
    const record = await recordView(manager, booking.id);
    return {
      booking: summary(booking),
      version: booking.version,
      rider: {
        name: order.contact.name,
        phone: order.contact.phone,
        email: order.email,
        weight: job.riderWeight,
      },
      frameSheet: job.frameSheet,
      entry: job.entry,
      oldShock: job.oldShock,
      newShock: job.newShock,
      wayRound: job.wayRound,
      ends: job.ends,
      spring: job.spring,
      parts: lines.map((line) => {
        const parcel = parcels.find(({ id }) => id === line.parcelId);
        return {
          name: `${line.quantity} x ${line.description}`,
          from: parcel?.shop.name ?? '',
          parcel: parcel ? parcelWords(parcel, booking) : '',
        };
      }),
      work: job.work.map(({ say, minutes }) => ({ say, minutes })),
      tools: job.tools,
      cautions: [...job.cautions, ...(record ? torqueRemarks(record.record.torques, job.ends) : [])],
      record,
      missing: missing(booking.state, parcels, record?.record ?? null),
    };
  }
}

function summary(booking: Booking): Summary {
  const { start, end } = fromRangeText(booking.during);
  return {
    id: booking.id,
    orderReference: booking.order.reference,
    state: booking.state as Summary['state'],
    start: start.toISOString(),
    end: end.toISOString(),
    timeZone: booking.workshop.timeZone,
    stand: booking.stand.name,
    riderName: booking.order.contact.name,
    bike: booking.order.job.bike,
    shock: booking.order.job.shockName,
    answerBy: booking.answerBy?.toISOString() ?? null,
  };
}

/** Where a parcel is, for this booking: after a refusal it goes elsewhere, which is not this workshop's business. */
function parcelWords(parcel: Parcel, { state }: Booking): string {
  if (!['requested', 'accepted', 'fitted'].includes(state)) return 'does not come to you';
  switch (parcel.state) {
    case 'sent':
      return parcel.tracking ? `sent, ${parcel.tracking}` : 'sent';
    case 'to-send':
      return `to be sent by ${dayText(parcel.dispatchBy)}`;
    case 'waiting':
      return 'waits for your answer';
    case 'held':
    case 'cancelled':
      return parcel.state;
  }
}
