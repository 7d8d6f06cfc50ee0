import type { PatchStockBody, StockList, StockRow } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';

import { Clock } from '../common/clock.js';
import { needVersion } from '../common/http/etag.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { inTransaction } from '../database/in-transaction.js';
import { Listing } from '../listings/listing.entity.js';
import { StockMovement } from '../listings/stock-movement.entity.js';
import { StockException } from './stock.exception.js';

/** A shop's stock. */
@Injectable()
export class StockService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
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
