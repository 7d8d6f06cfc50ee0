import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';

import type { Offer } from '../plans/planning/choose-offers.js';
import type { ShopDispatch } from '../plans/planning/dispatch.js';

/** One listing with what its shop adds: carriage and days. */
export interface ShopOffer extends Offer {
  shopName: string;
  leadDays: number;
  vatRateBp: number;
  dispatch: ShopDispatch;
}

interface Row {
  listing_id: string;
  item_id: string;
  shop_id: string;
  shop_name: string;
  price_minor: number;
  available: number;
  lead_days: number;
  carriage_minor: number;
  carrier_days: number;
  vat_rate_bp: number;
  time_zone: string;
  dispatch_cutoff: string;
  dispatch_weekdays: number[];
}

/** What is to be had of which item, and where. */
@Injectable()
export class OffersService {
  constructor(private readonly dataSource: DataSource) {}

  /**
   * Every listing of these items with at least one unit free, cheapest first, in one statement.
   * @param perItem only that many of the cheapest of each item
   */
  async forItems(
    itemIds: readonly string[],
    manager: EntityManager = this.dataSource.manager,
    perItem = 12,
  ): Promise<ShopOffer[]> {
    if (itemIds.length === 0) return [];
    const rows: Row[] = await manager.query(
      `SELECT l.id AS listing_id, l.item_id, l.shop_id, o.name AS shop_name, l.price_minor,
              l.quantity - l.reserved AS available, l.lead_days, o.carriage_minor, o.carrier_days,
              o.vat_rate_bp, o.time_zone, o.dispatch_cutoff, o.dispatch_weekdays
         FROM unnest($1::text[]) AS wanted(item_id)
        CROSS JOIN LATERAL (
              SELECT * FROM listings
               WHERE listings.item_id = wanted.item_id AND quantity > reserved
               ORDER BY price_minor, id LIMIT $2) l
         JOIN organisations o ON o.id = l.shop_id
        ORDER BY l.item_id, l.price_minor, l.id`,
      [[...new Set(itemIds)], perItem],
    );
    return rows.map(toOffer);
  }
}

const toOffer = (row: Row): ShopOffer => ({
  listingId: row.listing_id,
  itemId: row.item_id,
  shopId: row.shop_id,
  shopName: row.shop_name,
  priceMinor: row.price_minor,
  available: row.available,
  leadDays: row.lead_days,
  carriageMinor: row.carriage_minor,
  vatRateBp: row.vat_rate_bp,
  dispatch: {
    timeZone: row.time_zone,
    cutoff: row.dispatch_cutoff,
    weekdays: row.dispatch_weekdays,
    carrierDays: row.carrier_days,
  },
});
