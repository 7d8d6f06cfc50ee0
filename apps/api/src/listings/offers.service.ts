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
  price_minor: number;
  available: number;
  lead_days: number;
}
interface Shop {
  id: string;
  name: string;
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
   * Every listing of these items with at least one unit free, cheapest first, in two statements.
   * @param perItem only that many of the cheapest of each item
   */
  async forItems(
    itemIds: readonly string[],
    manager: EntityManager = this.dataSource.manager,
    perItem = 12,
  ): Promise<ShopOffer[]> {
    if (itemIds.length === 0) return [];
    const rows: Row[] = await manager.query(
      `SELECT l.id AS listing_id, l.item_id, l.shop_id, l.price_minor, l.quantity - l.reserved AS available,
              l.lead_days
         FROM unnest($1::text[]) AS wanted(item_id)
        CROSS JOIN LATERAL (
              SELECT * FROM listings
               WHERE listings.item_id = wanted.item_id AND quantity > reserved
               ORDER BY price_minor, id LIMIT $2) l
        ORDER BY l.item_id, l.price_minor, l.id`,
      [[...new Set(itemIds)], perItem],
    );
    const shops: Shop[] = await manager.query(
      `SELECT id, name, carriage_minor, carrier_days, vat_rate_bp, time_zone, dispatch_cutoff, dispatch_weekdays
         FROM organisations WHERE id = ANY($1)`,
      [[...new Set(rows.map(({ shop_id }) => shop_id))]],
    );
    const shopOf = new Map(shops.map((shop) => [shop.id, shopFacts(shop)]));
    return rows.flatMap((row) => {
      const shop = shopOf.get(row.shop_id);
      return shop ? [toOffer(row, shop)] : [];
    });
  }
}

type ShopFacts = Pick<ShopOffer, 'shopName' | 'carriageMinor' | 'vatRateBp' | 'dispatch'>;

const shopFacts = (shop: Shop): ShopFacts => ({
  shopName: shop.name,
  carriageMinor: shop.carriage_minor,
  vatRateBp: shop.vat_rate_bp,
  dispatch: {
    timeZone: shop.time_zone,
    cutoff: shop.dispatch_cutoff,
    weekdays: shop.dispatch_weekdays,
    carrierDays: shop.carrier_days,
  },
});

const toOffer = (row: Row, shop: ShopFacts): ShopOffer => ({
  listingId: row.listing_id,
  itemId: row.item_id,
  shopId: row.shop_id,
  priceMinor: row.price_minor,
  available: row.available,
  leadDays: row.lead_days,
  ...shop,
});
