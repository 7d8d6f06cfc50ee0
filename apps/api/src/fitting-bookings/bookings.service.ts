import type { BookingList, FittingRecordBody, JobSheetView } from '@linkfell/contracts';
import { torqueSlipRange } from '@linkfell/fit-engine';
import { Injectable } from '@nestjs/common';
import { DataSource, In, Not, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { needVersion } from '../common/http/etag.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { inTransaction } from '../database/in-transaction.js';
import { fromRangeText } from '../database/time-range.js';
import { OrderLifecycle } from '../orders/lifecycle.service.js';
import { OrderMails } from '../orders/order-mails.service.js';
import { Order } from '../orders/order.entity.js';
import { Parcel } from '../orders/parcel.entity.js';
import { OrderLine } from '../orders/order-line.entity.js';
import { OutboxHandler, type OutboxDelivery } from '../outbox/outbox-handler.js';
import { Booking } from './booking.entity.js';
import { BookingsException } from './bookings.exception.js';
import { FittingRecord } from './fitting-record.entity.js';
import { recordView } from './record-view.js';

type Summary = BookingList['bookings'][number];

/** A workshop's side of a fitting: answering, working, recording. */
@Injectable()
export class BookingsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    private readonly mails: OrderMails,
  ) {}

  async list(workshopId: string): Promise<BookingList> {
    const bookings = await this.dataSource.manager.find(Booking, {
      where: { workshopId, state: Not(In(['held', 'released'])) },
      relations: { order: true, stand: true, workshop: true },
    });
    return {
      bookings: bookings.map(summary).sort((a, b) => a.start.localeCompare(b.start)),
    };
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
          parcel: parcel ? parcelWords(parcel) : '',
        };
      }),
      work: job.work.map(({ say, minutes }) => ({ say, minutes })),
      tools: job.tools,
      cautions: [
        ...job.cautions,
        ...(record
          ? torqueRemarks(
              record.record,
              job.ends.map(({ thread }) => thread),
            )
          : []),
      ],
      record,
      missing: missing(booking, parcels, record?.record ?? null),
    };
  }

  async accept(workshopId: string, bookingId: string, accountId: string): Promise<JobSheetView> {
    await this.change(workshopId, bookingId, async (manager, booking, order) => {
      if (booking.state !== 'requested') throw new BookingsException('not-now');
      const now = this.clock.now();
      await this.lifecycle.setBooking(manager, booking, 'accepted', { decidedAt: now, decidedBy: accountId });
      await this.lifecycle.setParcels(manager, order, 'to-send');
      await this.mails.accepted(manager, order, booking, now);
      await this.mails.shops(manager, order, false);
    });
    return this.jobSheet(workshopId, bookingId);
  }

  async decline(
    workshopId: string,
    bookingId: string,
    accountId: string,
    reason: string,
  ): Promise<JobSheetView> {
    await this.change(workshopId, bookingId, async (manager, booking, order) => {
      if (booking.state !== 'requested') throw new BookingsException('not-now');
      await this.lifecycle.setBooking(manager, booking, 'declined', {
        decidedAt: this.clock.now(),
        decidedBy: accountId,
        declineReason: reason,
      });
      await this.mails.openAgain(manager, order, booking, `the workshop cannot take the job: “${reason}”`);
    });
    return this.jobSheet(workshopId, bookingId);
  }

  /** The workshop's time to answer is over. */
  @OutboxHandler('booking-unanswered')
  async lapse({ bookingId }: { bookingId: string }, _: OutboxDelivery): Promise<void> {
    const { manager } = this.dataSource;
    const found = await manager.findOneBy(Booking, { id: bookingId });
    if (!found) return;
    await inTransaction(this.dataSource, async (inside) => {
      const order = await this.lifecycle.lock(inside, found.orderId);
      const booking = await inside.findOneByOrFail(Booking, { id: bookingId });
      if (booking.state !== 'requested') return;
      await this.lifecycle.setBooking(inside, booking, 'lapsed', { decidedAt: this.clock.now() });
      await this.mails.openAgain(
        inside,
        order,
        booking,
        'the workshop did not answer within its working day.',
      );
    });
  }

  async record(
    workshopId: string,
    bookingId: string,
    accountId: string,
    version: number,
    record: FittingRecordBody,
  ): Promise<JobSheetView> {
    await this.change(workshopId, bookingId, async (manager, booking) => {
      if (booking.state !== 'accepted') throw new BookingsException('not-now');
      needVersion(booking.version, version);
      const old = await manager.findOneBy(FittingRecord, { bookingId });
      await manager.save(FittingRecord, {
        bookingId,
        record,
        mechanicId: accountId,
        savedAt: this.clock.now(),
        fittedAt: null,
        version: (old?.version ?? 0) + 1,
      });
      booking.version += 1;
      await manager.save(booking);
    });
    return this.jobSheet(workshopId, bookingId);
  }

  async fitted(workshopId: string, bookingId: string): Promise<JobSheetView> {
    await this.change(workshopId, bookingId, async (manager, booking, order) => {
      if (booking.state !== 'accepted') throw new BookingsException('not-now');
      const found = await manager.findOne(FittingRecord, {
        where: { bookingId },
        relations: { mechanic: true },
      });
      const parcels = await manager.findBy(Parcel, { orderId: order.id });
      const open = missing(booking, parcels, found?.record ?? null);
      if (open.length > 0 || !found) throw new BookingsException('not-complete', { detail: open.join(' ') });
      const now = this.clock.now();
      await manager.update(FittingRecord, { bookingId }, { fittedAt: now });
      await this.lifecycle.setBooking(manager, booking, 'fitted');
      await this.lifecycle.setOrder(manager, order, 'completed', { endedAt: now });
      await this.mails.fitted(manager, order, booking, found.mechanic.displayName, setRows(found.record));
    });
    return this.jobSheet(workshopId, bookingId);
  }

  /** The order is locked first, always: accepting and lapsing at once, one of them finds it done. */
  private async change(
    workshopId: string,
    bookingId: string,
    work: (manager: EntityManager, booking: Booking, order: Order) => Promise<void>,
  ): Promise<void> {
    const { orderId } = await this.find(this.dataSource.manager, workshopId, bookingId);
    await inTransaction(this.dataSource, async (manager) => {
      const order = await this.lifecycle.lock(manager, orderId);
      await work(manager, await manager.findOneByOrFail(Booking, { id: bookingId }), order);
    });
  }

  private async find(manager: EntityManager, workshopId: string, id: string): Promise<Booking> {
    const booking = await manager.findOne(Booking, {
      where: { id, workshopId, state: Not(In(['held', 'released'])) },
      relations: { order: true, stand: true, workshop: true },
    });
    if (!booking) throw new CommonException('not-found');
    return booking;
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

function parcelWords(parcel: Parcel): string {
  switch (parcel.state) {
    case 'sent':
      return parcel.tracking ? `sent, ${parcel.tracking}` : 'sent';
    case 'to-send':
      return `to be sent by ${parcel.dispatchBy}`;
    case 'waiting':
      return 'waits for your answer';
    case 'held':
    case 'cancelled':
      return parcel.state;
  }
}

/** What keeps a fitting from being marked done, in words. */
function missing(booking: Booking, parcels: readonly Parcel[], record: FittingRecordBody | null): string[] {
  if (booking.state !== 'accepted') return [];
  return [
    ...(parcels.every(({ state }) => state === 'sent') ? [] : ['Not all parcels are sent yet.']),
    ...(record ? [] : ['The record of the fitting is not filled in.']),
    ...(record && !record.travelChecked ? ['Move the suspension through its whole travel and say so.'] : []),
    ...(record && !record.noticesChecked ? ['Check for recalls and say so.'] : []),
  ];
}

/** Against slips of the pen only; never a figure to torque to. */
function torqueRemarks(record: FittingRecordBody, threads: readonly (string | null)[]): string[] {
  const ranges = threads.map(torqueSlipRange).filter((range) => range !== null);
  if (ranges.length === 0) return [];
  const low = Math.min(...ranges.map(({ lowNm }) => lowNm));
  const high = Math.max(...ranges.map(({ highNm }) => highNm));
  return record.torques
    .filter(({ setNm }) => setNm < low || setNm > high)
    .map(
      ({ bolt, setNm }) => `${bolt}: ${setNm} N m is unusual for the threads of this frame. Is it a slip?`,
    );
}

function setRows(record: FittingRecordBody): [string, string][] {
  return [
    ['Serial number', record.serialNumber],
    record.spring.kind === 'air'
      ? ['Air pressure', `${record.spring.gaugePsi} psi`]
      : ['Spring', `${record.spring.rateLbPerIn} lb/in, ${record.spring.preloadTurns} turns of preload`],
    ['Sag at the shock', `${record.sagMm} mm`],
    ...record.torques.map(({ bolt, setNm }): [string, string] => [bolt, `${setNm} N m`]),
    ...(record.notes ? [['Notes', record.notes] as [string, string]] : []),
  ];
}
