import type { ParcelList, ParcelRow } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource, In, IsNull, Not, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { inTransaction } from '../database/in-transaction.js';
import { dayText } from '../orders/date-text.js';
import { OrderLifecycle } from '../orders/lifecycle.service.js';
import { OrderLine } from '../orders/order-line.entity.js';
import type { Order } from '../orders/order.entity.js';
import { Parcel, type ParcelState } from '../orders/parcel.entity.js';
import { RiderMails } from '../orders/rider-mails.service.js';
import { TradeMails } from '../orders/trade-mails.service.js';
import { parcelTransitions, step } from '../orders/transitions.js';
import { moveStock } from './move-stock.js';
import { StockException } from './stock.exception.js';

const states: ParcelRow['state'][] = ['to-send', 'waiting', 'sent', 'cancelled'];

/** What a shop has to send, and what it has sent. */
@Injectable()
export class ParcelsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    private readonly riderMails: RiderMails,
    private readonly tradeMails: TradeMails,
  ) {}

  /** Parcels of orders that were never paid are nobody's business. */
  async list(shopId: string): Promise<ParcelList> {
    const { manager } = this.dataSource;
    const parcels = await manager.find(Parcel, {
      where: { shopId, state: In<ParcelState>(states), order: { paidAt: Not(IsNull()) } },
      relations: { order: true },
    });
    const lines = await manager.find(OrderLine, {
      where: { parcelId: In(parcels.map(({ id }) => id)), kind: 'item' },
      order: { position: 'ASC' },
    });
    const rows = parcels.map((parcel) =>
      parcelRow(
        parcel,
        lines.filter(({ parcelId }) => parcelId === parcel.id),
      ),
    );
    return {
      parcels: rows.sort(
        (a, b) =>
          states.indexOf(a.state) - states.indexOf(b.state) || a.dispatchBy.localeCompare(b.dispatchBy),
      ),
    };
  }

  /**
   * Marked sent: stock and reservation fall together, rider and workshop are told.
   * @throws StockException "not-now"; CommonException "not-found" for another shop's parcel
   */
  async sent(
    shopId: string,
    parcelId: string,
    { accountId, tracking }: { accountId: string; tracking: string },
  ): Promise<ParcelRow> {
    const { manager } = this.dataSource;
    const known = await manager.findOneBy(Parcel, { id: parcelId, shopId });
    if (!known) throw new CommonException('not-found');
    await inTransaction(this.dataSource, async (inside) => {
      const order = await this.lifecycle.lock(inside, known.orderId);
      const parcel = await inside.findOneOrFail(Parcel, {
        where: { id: parcelId },
        lock: { mode: 'pessimistic_write' },
      });
      if (parcel.state !== 'to-send') {
        throw new StockException('not-now', { detail: parcelSays(parcel) });
      }
      parcel.state = step(parcelTransitions, parcel.state, 'sent');
      parcel.sentAt = this.clock.now();
      parcel.tracking = tracking || null;
      parcel.version += 1;
      await inside.save(parcel);
      await this.takeFromStock(inside, order, parcelId, accountId);
      await this.tell(inside, order, parcel);
      await this.endSelfFit(inside, order);
    });
    const parcel = await manager.findOneOrFail(Parcel, {
      where: { id: parcelId },
      relations: { order: true },
    });
    const lines = await manager.find(OrderLine, {
      where: { parcelId, kind: 'item' },
      order: { position: 'ASC' },
    });
    return parcelRow(parcel, lines);
  }

  private async takeFromStock(
    manager: EntityManager,
    order: Order,
    parcelId: string,
    accountId: string,
  ): Promise<void> {
    const lines = await manager.find(OrderLine, {
      where: { parcelId, kind: 'item' },
      order: { listingId: 'ASC' },
    });
    for (const line of lines) {
      const moved = await moveStock(manager, {
        listingId: line.listingId as string,
        kind: 'dispatch',
        quantity: -line.quantity,
        reserved: -line.quantity,
        orderId: order.id,
        accountId,
      });
      if (!moved) throw new Error('a reserved unit is not on hand');
    }
  }

  private async tell(manager: EntityManager, order: Order, parcel: Parcel): Promise<void> {
    await this.riderMails.sent(manager, order, parcel);
    const booking = await this.lifecycle.liveBooking(manager, order.id);
    if (booking) await this.tradeMails.parcelSent(manager, order, booking, parcel);
  }

  /** Nobody else has anything to do for a rider who fits it himself. */
  private async endSelfFit(manager: EntityManager, order: Order): Promise<void> {
    if (order.fit !== 'self' || order.state !== 'paid') return;
    const left = { orderId: order.id, state: Not(In<ParcelState>(['sent', 'cancelled'])) };
    if ((await manager.countBy(Parcel, left)) > 0) return;
    await this.lifecycle.setOrder(manager, order, 'completed', { endedAt: this.clock.now() });
  }
}

function parcelRow(parcel: Parcel, lines: readonly OrderLine[]): ParcelRow {
  return {
    id: parcel.id,
    version: parcel.version,
    orderReference: parcel.order.reference,
    state: parcel.state as ParcelRow['state'],
    to: [parcel.address.name, ...parcel.address.lines],
    items: lines.map(({ description, quantity }) => ({ name: description, quantity })),
    dispatchBy: parcel.dispatchBy,
    paidAt: parcel.order.paidAt?.toISOString() ?? null,
    sentAt: parcel.sentAt?.toISOString() ?? null,
    tracking: parcel.tracking,
    say: parcelSays(parcel),
  };
}

function parcelSays({ state, dispatchBy, address }: Parcel): string {
  switch (state) {
    case 'to-send':
      return `Send by ${dayText(dispatchBy)}.`;
    case 'waiting':
      return `Wait: ${address.name} has not accepted the fitting yet.`;
    case 'sent':
      return 'Sent.';
    case 'cancelled':
      return 'Cancelled: nothing to send.';
    case 'held':
      return 'Not paid yet.';
  }
}
