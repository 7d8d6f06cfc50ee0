import type { ParcelList, ParcelRow, PatchStockBody, StockList, StockRow } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource, In, Not, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { needVersion } from '../common/http/etag.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { inTransaction } from '../database/in-transaction.js';
import { Listing } from '../listings/listing.entity.js';
import { StockMovement } from '../listings/stock-movement.entity.js';
import { OrderLifecycle } from '../orders/lifecycle.service.js';
import { OrderLine } from '../orders/order-line.entity.js';
import { OrderMails } from '../orders/order-mails.service.js';
import { Parcel, type ParcelState } from '../orders/parcel.entity.js';
import { parcelTransitions, step } from '../orders/transitions.js';
import { moveStock } from './move-stock.js';
import { StockException } from './stock.exception.js';

/** A shop's stock and its parcels. */
@Injectable()
export class StockService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    private readonly mails: OrderMails,
  ) {}

  async stock(shopId: string): Promise<StockList> {
    const listings = await this.dataSource.manager.find(Listing, {
      where: { shopId },
      relations: { item: true },
    });
    const kinds = ['shock', 'coil', 'kit', 'remote', 'hold-open'];
    return {
      rows: listings
        .map(stockRow)
        .sort((a, b) => kinds.indexOf(a.kind) - kinds.indexOf(b.kind) || a.name.localeCompare(b.name)),
    };
  }

  async patch(
    shopId: string,
    listingId: string,
    accountId: string,
    version: number,
    change: PatchStockBody,
  ): Promise<StockRow> {
    await inTransaction(this.dataSource, async (manager) => {
      const listing = await manager.findOne(Listing, {
        where: { id: listingId, shopId },
        lock: { mode: 'pessimistic_write' },
      });
      if (!listing) throw new CommonException('not-found');
      needVersion(listing.version, version);
      const { quantity = listing.quantity } = change;
      if (quantity < listing.reserved) {
        throw new StockException('held-for-orders', {
          detail: `${listing.reserved} are held for orders, so there must be at least that many.`,
          errors: [
            { pointer: '/quantity', detail: `Enter ${listing.reserved} or more: they are held for orders` },
          ],
        });
      }
      const now = this.clock.now();
      await manager.update(
        Listing,
        { id: listingId },
        { ...change, version: listing.version + 1, updatedAt: now },
      );
      if (quantity !== listing.quantity) {
        await manager.insert(StockMovement, {
          listingId,
          accountId,
          kind: 'set',
          quantityDelta: quantity - listing.quantity,
          reservedDelta: 0,
          at: now,
        });
      }
    });
    const listing = await this.dataSource.manager.findOneOrFail(Listing, {
      where: { id: listingId },
      relations: { item: true },
    });
    return stockRow(listing);
  }

  async parcels(shopId: string): Promise<ParcelList> {
    const { manager } = this.dataSource;
    const found = await manager.find(Parcel, {
      where: { shopId, state: Not(In<ParcelState>(['held'])) },
      relations: { order: true },
    });
    // Parcels of orders that were never paid are nobody's business.
    const paid = found.filter(({ order }) => order.paidAt !== null);
    const rows = await Promise.all(paid.map((parcel) => this.row(manager, parcel)));
    const states = ['to-send', 'waiting', 'sent', 'cancelled'];
    return {
      parcels: rows.sort(
        (a, b) =>
          states.indexOf(a.state) - states.indexOf(b.state) || a.dispatchBy.localeCompare(b.dispatchBy),
      ),
    };
  }

  /** Marked sent: stock and reservation fall together, the rider is told. */
  async sent(shopId: string, parcelId: string, accountId: string, tracking: string): Promise<ParcelRow> {
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
        throw new StockException('not-now', {
          detail: parcel.state === 'waiting' ? 'The workshop has not accepted the fitting yet.' : '',
        });
      }
      parcel.state = step(parcelTransitions, parcel.state, 'sent');
      Object.assign(parcel, {
        sentAt: this.clock.now(),
        tracking: tracking || null,
        version: parcel.version + 1,
      });
      await inside.save(parcel);
      const lines = await inside.find(OrderLine, {
        where: { parcelId, kind: 'item' },
        order: { listingId: 'ASC' },
      });
      for (const line of lines) {
        const moved = await moveStock(inside, {
          listingId: line.listingId as string,
          kind: 'dispatch',
          quantity: -line.quantity,
          reserved: -line.quantity,
          orderId: order.id,
          accountId,
        });
        if (!moved) throw new Error('a reserved unit is not on hand');
      }
      await this.mails.sent(inside, order, parcel);
      // Nobody else has anything to do for a rider who fits it himself.
      const left = await inside.countBy(Parcel, {
        orderId: order.id,
        state: Not(In<ParcelState>(['sent', 'cancelled'])),
      });
      if (order.fit === 'self' && order.state === 'paid' && left === 0) {
        await this.lifecycle.setOrder(inside, order, 'completed', { endedAt: this.clock.now() });
      }
    });
    const parcel = await manager.findOneOrFail(Parcel, {
      where: { id: parcelId },
      relations: { order: true },
    });
    return this.row(manager, parcel);
  }

  private async row(manager: EntityManager, parcel: Parcel): Promise<ParcelRow> {
    const lines = await manager.find(OrderLine, {
      where: { parcelId: parcel.id, kind: 'item' },
      order: { position: 'ASC' },
    });
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
}

const stockRow = (listing: Listing): StockRow => ({
  listingId: listing.id,
  itemId: listing.itemId,
  kind: listing.item.kind,
  name: listing.item.name,
  priceMinor: listing.priceMinor,
  quantity: listing.quantity,
  reserved: listing.reserved,
  leadDays: listing.leadDays,
  version: listing.version,
});

function parcelSays({ state, dispatchBy, address }: Parcel): string {
  switch (state) {
    case 'to-send':
      return `Send by ${dispatchBy}.`;
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
