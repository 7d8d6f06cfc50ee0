import { z } from 'zod';
import { minor } from '../common/primitives.schema.js';
import { drawnShock, sourceView } from './catalogue.schema.js';

/** What narrows the storefront; nothing here is checked against anybody's bike. */
export const storefrontQuery = z.object({
  spring: z.enum(['air', 'coil', 'either']).default('either'),
  reservoir: z.enum(['with', 'without', 'either']).default('either'),
});
export type StorefrontQuery = z.infer<typeof storefrontQuery>;

/** GET /api/shocks/sizes?spring=&reservoir= → every size that a catalogue shock has, shortest first */
export const shockSizeRow = z.object({
  sizeKey: z.string(),
  /** The label in inches, "7.875 x 2.25", for sizes that come from inches. */
  inches: z.string().nullable(),
  family: z.enum(['eyelet', 'trunnion', 'inch']),
  eyeToEyeMm: z.number(),
  strokeMm: z.number(),
  shocks: z.int(),
  /** The cheapest free unit of any of them, VAT included; null when no shop has one. */
  fromMinor: minor.nullable(),
});
export type ShockSizeRow = z.infer<typeof shockSizeRow>;
export const shockSizeList = z.object({ sizes: z.array(shockSizeRow) });
export type ShockSizeList = z.infer<typeof shockSizeList>;

/** GET /api/shocks?size=&q=&spring=&reservoir= → shocks of one size, or by name; at most 60, cheapest first */
export const shockListQuery = storefrontQuery.extend({
  size: z.string().max(20).optional(),
  q: z.string().trim().max(80).optional(),
});
export type ShockListQuery = z.infer<typeof shockListQuery>;

export const shockRow = z.object({
  sizeId: z.string(),
  makerName: z.string(),
  modelName: z.string(),
  sizeKey: z.string(),
  spring: z.enum(['air', 'coil']),
  massG: z.number(),
  diameterMm: z.number(),
  bodyEnd: z.string(),
  shaftEnd: z.string(),
  reservoir: z.boolean(),
  remote: z.enum(['pull-to-lock', 'pull-to-open']).nullable(),
  drawing: drawnShock,
  fromMinor: minor.nullable(),
  /** Shops with a free unit. */
  shops: z.int(),
});
export type ShockRow = z.infer<typeof shockRow>;
export const shockList = z.object({
  /** The size asked for by whatever label; null when no size was asked for, or when it is none. */
  size: shockSizeRow.omit({ shocks: true, fromMinor: true }).nullable(),
  shocks: z.array(shockRow),
  /** All that were found, of which `shocks` are the first. */
  total: z.int(),
});
export type ShockList = z.infer<typeof shockList>;

/** One line of a specification. */
export const specFigure = z.object({
  label: z.string(),
  value: z.string(),
  unit: z.string().nullable(),
  /** Where it differs from the source of the whole sheet. */
  source: sourceView.nullable(),
});
export type SpecFigure = z.infer<typeof specFigure>;

export const shopOffer = z.object({
  shopId: z.string(),
  shopName: z.string(),
  town: z.string(),
  /** One piece, VAT included. */
  priceMinor: minor,
  /** A parcel, VAT included. */
  carriageMinor: minor,
  available: z.int(),
  /** Working days the shop needs before it sends. */
  leadDays: z.int(),
  carrierDays: z.int(),
});
export type ShopOffer = z.infer<typeof shopOffer>;

/** GET /api/shocks/:sizeId */
export const shockPage = shockRow.extend({
  summary: z.string(),
  groups: z.array(z.object({ title: z.string(), figures: z.array(specFigure) })),
  source: sourceView,
  inTheBox: z.array(z.string()),
  /** What most buyers need besides, and will not find in the box. */
  notInTheBox: z.array(z.string()),
  warrantyMonths: z.int().nullable(),
  notices: z.array(z.object({ title: z.string(), effect: z.enum(['stop', 'remark']), source: sourceView })),
  offers: z.array(shopOffer),
  /** The same model in its other sizes, shortest first. */
  otherSizes: z.array(
    z.object({
      sizeId: z.string(),
      sizeKey: z.string(),
      eyeToEyeMm: z.number(),
      strokeMm: z.number(),
      fromMinor: minor.nullable(),
    }),
  ),
});
export type ShockPage = z.infer<typeof shockPage>;
