import { z } from 'zod';
import { isoInstant, minor } from '../common/primitives.schema.js';

export const stockRow = z.object({
  listingId: z.string(),
  itemId: z.string(),
  kind: z.enum(['shock', 'coil', 'kit', 'remote', 'hold-open']),
  name: z.string(),
  priceMinor: minor,
  quantity: z.int(),
  reserved: z.int(),
  leadDays: z.int(),
  version: z.int(),
});
export type StockRow = z.infer<typeof stockRow>;
/** GET /api/organisations/:orgId/stock */
export const stockList = z.object({ rows: z.array(stockRow) });
export type StockList = z.infer<typeof stockList>;
/** PATCH /api/organisations/:orgId/stock/:listingId, If-Match with the row's version; answers stockRow. */
export const patchStockBody = z.strictObject({
  priceMinor: minor.min(1, 'Enter a price above zero').optional(),
  quantity: z.int().min(0, 'Enter 0 or more').max(10_000).optional(),
  leadDays: z.int().min(0).max(60).optional(),
});
export type PatchStockBody = z.infer<typeof patchStockBody>;

/** GET /api/organisations/:orgId/parcels: orders to send and sent. */
export const parcelRow = z.object({
  id: z.string(),
  version: z.int(),
  orderReference: z.string(),
  state: z.enum(['waiting', 'to-send', 'sent', 'cancelled']),
  to: z.array(z.string()),
  items: z.array(z.object({ name: z.string(), quantity: z.int() })),
  dispatchBy: z.string(),
  paidAt: isoInstant.nullable(),
  sentAt: isoInstant.nullable(),
  tracking: z.string().nullable(),
  /** Why it waits, one sentence. */
  say: z.string(),
});
export type ParcelRow = z.infer<typeof parcelRow>;
export const parcelList = z.object({ parcels: z.array(parcelRow) });
export type ParcelList = z.infer<typeof parcelList>;
/** POST /api/organisations/:orgId/parcels/:parcelId/sent; answers parcelRow. */
export const sentBody = z.strictObject({
  tracking: z
    .string()
    .trim()
    .max(40)
    .regex(/^[\w -]*$/, 'Use letters, digits, spaces and hyphens'),
});
export type SentBody = z.infer<typeof sentBody>;
