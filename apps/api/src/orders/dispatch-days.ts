import type { EntityManager } from 'typeorm';

import { arrivalDay, dispatchDay } from '../plans/planning/dispatch.js';

export interface ParcelDays {
  parcelId: string;
  /** ISO days in the shop's zone. */
  dispatchBy: string;
  arrivesOn: string;
}

interface Row {
  id: string;
  time_zone: string;
  dispatch_cutoff: string;
  dispatch_weekdays: number[];
  carrier_days: number;
  lead_days: number;
}

/** When the parcels of an order that have not left yet leave and arrive if all are released at one instant. */
export async function dispatchDays(
  manager: EntityManager,
  orderId: string,
  releasedAt: Date,
): Promise<ParcelDays[]> {
  const rows: Row[] = await manager.query(
    `SELECT p.id, o.time_zone, o.dispatch_cutoff, o.dispatch_weekdays, o.carrier_days,
            coalesce((SELECT max(l.lead_days) FROM order_lines ol JOIN listings l ON l.id = ol.listing_id
                       WHERE ol.parcel_id = p.id), 0) AS lead_days
       FROM parcels p JOIN organisations o ON o.id = p.shop_id
      WHERE p.order_id = $1 AND p.state <> 'sent' ORDER BY p.id`,
    [orderId],
  );
  return rows.map((row) => {
    const shop = {
      timeZone: row.time_zone,
      cutoff: row.dispatch_cutoff,
      weekdays: row.dispatch_weekdays,
      carrierDays: row.carrier_days,
    };
    const leaves = dispatchDay(releasedAt, shop, row.lead_days);
    return {
      parcelId: row.id,
      dispatchBy: leaves.toString(),
      arrivesOn: arrivalDay(leaves, row.carrier_days).toString(),
    };
  });
}
