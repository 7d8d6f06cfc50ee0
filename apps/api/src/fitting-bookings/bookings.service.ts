import type { FittingRecordBody, JobSheetView } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { needVersion } from '../common/http/etag.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { inTransaction } from '../database/in-transaction.js';
import { OrderLifecycle } from '../orders/lifecycle.service.js';
import type { Order } from '../orders/order.entity.js';
import { Parcel } from '../orders/parcel.entity.js';
import { RiderMails } from '../orders/rider-mails.service.js';
import { TradeMails } from '../orders/trade-mails.service.js';
import { OutboxHandler, type OutboxDelivery } from '../outbox/outbox-handler.js';
import { Booking } from './booking.entity.js';
import { BookingsException } from './bookings.exception.js';
import { FittingRecord } from './fitting-record.entity.js';
import { JobSheets } from './job-sheets.service.js';
import { missing } from './missing.js';
import { setRows } from './set-rows.js';

/** Which booking, of which workshop, and who acts. */
export interface BookingActor {
  organisationId: string;
  accountId: string;
  bookingId: string;
}

/** A workshop's side of a fitting: answering, recording, done. */
@Injectable()
export class BookingsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    private readonly riderMails: RiderMails,
    private readonly tradeMails: TradeMails,
    private readonly sheets: JobSheets,
  ) {}

  /** Parts are released for dispatch from here on. @throws BookingsException "not-now" */
  accept(actor: BookingActor): Promise<JobSheetView> {
    return this.change(actor, async (manager, booking, order) => {
      if (booking.state !== 'requested') throw new BookingsException('not-now');
      const now = this.clock.now();
      const decided = { decidedAt: now, decidedBy: actor.accountId };
      await this.lifecycle.setBooking(manager, booking, 'accepted', decided);
      await this.lifecycle.setParcels(manager, order, 'to-send');
      await this.riderMails.accepted(manager, order, booking, now);
      await this.tradeMails.shopOrders(manager, order);
    });
  }

  /** @throws BookingsException "not-now" */
  decline(actor: BookingActor, reason: string): Promise<JobSheetView> {
    return this.change(actor, async (manager, booking, order) => {
      if (booking.state !== 'requested') throw new BookingsException('not-now');
      await this.lifecycle.setBooking(manager, booking, 'declined', {
        decidedAt: this.clock.now(),
        decidedBy: actor.accountId,
        declineReason: reason,
      });
      const why = `the workshop cannot take the job: “${reason}”.`;
      await this.riderMails.openAgain(manager, order, booking, why);
    });
  }

  /** The workshop's time to answer is over. */
  @OutboxHandler('booking-unanswered')
  async lapse({ bookingId }: { bookingId: string }, _: OutboxDelivery): Promise<void> {
    const found = await this.dataSource.manager.findOneBy(Booking, { id: bookingId });
    if (!found) return;
    await inTransaction(this.dataSource, async (manager) => {
      const order = await this.lifecycle.lock(manager, found.orderId);
      const booking = await manager.findOneByOrFail(Booking, { id: bookingId });
      if (booking.state !== 'requested') return;
      await this.lifecycle.setBooking(manager, booking, 'lapsed', { decidedAt: this.clock.now() });
      const why = 'the workshop did not answer within its working day.';
      await this.riderMails.openAgain(manager, order, booking, why);
      await this.tradeMails.lapsed(manager, order, booking);
    });
  }

  /** @throws BookingsException "not-now"; CommonException "precondition-failed", "invalid" for another kind of spring */
  record(actor: BookingActor, version: number, record: FittingRecordBody): Promise<JobSheetView> {
    const { bookingId, accountId } = actor;
    return this.change(actor, async (manager, booking, order) => {
      if (booking.state !== 'accepted') throw new BookingsException('not-now');
      needVersion(booking.version, version);
      const { kind } = order.job.spring;
      if (record.spring.kind !== kind) {
        const detail = kind === 'air' ? 'This shock has an air spring' : 'This shock has a coil spring';
        throw new CommonException('invalid', { errors: [{ pointer: '/spring/kind', detail }] });
      }
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
  }

  /** @throws BookingsException "not-now", "not-complete" with what is missing */
  fitted(actor: BookingActor): Promise<JobSheetView> {
    const { bookingId } = actor;
    return this.change(actor, async (manager, booking, order) => {
      if (booking.state !== 'accepted') throw new BookingsException('not-now');
      const found = await manager.findOne(FittingRecord, {
        where: { bookingId },
        relations: { mechanic: true },
      });
      const parcels = await manager.findBy(Parcel, { orderId: order.id });
      const open = missing(booking.state, parcels, found?.record ?? null);
      if (open.length > 0 || !found) throw new BookingsException('not-complete', { detail: open.join(' ') });
      const now = this.clock.now();
      await manager.update(FittingRecord, { bookingId }, { fittedAt: now });
      await this.lifecycle.setBooking(manager, booking, 'fitted');
      await this.lifecycle.setOrder(manager, order, 'completed', { endedAt: now });
      await this.riderMails.fitted(manager, order, booking, {
        mechanic: found.mechanic.displayName,
        rows: setRows(found.record, order.job.drawing.strokeMm),
      });
    });
  }

  /** The order is locked first, always: accepting and lapsing at once, one of them finds it done. */
  private async change(
    { organisationId, bookingId }: BookingActor,
    work: (manager: EntityManager, booking: Booking, order: Order) => Promise<void>,
  ): Promise<JobSheetView> {
    const { orderId } = await this.sheets.find(this.dataSource.manager, organisationId, bookingId);
    await inTransaction(this.dataSource, async (manager) => {
      const order = await this.lifecycle.lock(manager, orderId);
      await work(manager, await manager.findOneByOrFail(Booking, { id: bookingId }), order);
    });
    return this.sheets.jobSheet(organisationId, bookingId);
  }
}
