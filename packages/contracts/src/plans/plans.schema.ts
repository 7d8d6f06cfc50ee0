import { z } from 'zod';
import { drawnShock } from '../catalogue/catalogue.schema.js';
import {
  email,
  isoDay,
  isoInstant,
  line,
  minor,
  slug,
  uuid,
  verdict,
  workId,
} from '../common/primitives.schema.js';

/** POST /api/measure-ups/:id/plans */
export const createPlanBody = z.strictObject({ sizeId: slug });
export type CreatePlanBody = z.infer<typeof createPlanBody>;

export const planChoices = z.strictObject({
  fit: z.enum(['self', 'workshop']),
  /** Which listing is bought for each item id. */
  listings: z.record(slug, uuid),
  workshopId: slug.nullable(),
  slotStart: isoInstant.nullable(),
});
export type PlanChoices = z.infer<typeof planChoices>;

/** PUT /api/plans/:id/choices; needs If-Match with the plan's ETag (its revision). */
export const putChoicesBody = planChoices.partial();
export type PutChoicesBody = z.infer<typeof putChoicesBody>;

export const sellerView = z.object({
  id: z.string(),
  name: z.string(),
  address: z.array(z.string()),
  vatNumber: z.string(),
  email: z.string(),
  phone: z.string(),
});
export type SellerView = z.infer<typeof sellerView>;

export const lineView = z.object({
  kind: z.enum(['item', 'carriage', 'work']),
  sellerId: z.string(),
  description: z.string(),
  /** For item lines: why it is needed, e.g. "Link end, 30 mm across for an 8 mm bolt". */
  note: z.string().nullable(),
  quantity: z.int(),
  unitMinor: minor,
  totalMinor: minor,
  vatMinor: minor,
});
export type LineView = z.infer<typeof lineView>;

export const slotView = z.object({ start: isoInstant, end: isoInstant });

export const planView = z.object({
  id: uuid,
  revision: z.int(),
  measureUpId: uuid,
  title: z.string(),
  shock: z.object({
    sizeId: z.string(),
    makerName: z.string(),
    modelName: z.string(),
    sizeKey: z.string(),
    drawing: drawnShock,
  }),
  verdict,
  reason: z.string().nullable(),
  spring: z.string(),
  choices: planChoices,
  /** One entry for each item that has to be bought, with every shop that has it. */
  items: z.array(
    z.object({
      itemId: z.string(),
      name: z.string(),
      note: z.string().nullable(),
      quantity: z.int(),
      offers: z.array(
        z.object({
          listingId: uuid,
          shopId: z.string(),
          shopName: z.string(),
          priceMinor: minor,
          carriageMinor: minor,
          available: z.int(),
          dispatchDay: isoDay,
          arrivalDay: isoDay,
        }),
      ),
    }),
  ),
  work: z.array(z.object({ id: workId, say: z.string(), workshopOnly: z.boolean() })),
  selfFit: z.object({ allowed: z.boolean(), reason: z.string().nullable() }),
  /** Workshops that can do the named work, earliest first. */
  workshops: z.array(
    z.object({
      id: z.string(),
      name: z.string(),
      town: z.string(),
      distanceKm: z.number().nullable(),
      priceMinor: minor,
      minutes: z.int(),
      timeZone: z.string(),
      earliest: isoInstant.nullable(),
    }),
  ),
  /** Free starts at the chosen workshop, earliest first. */
  slots: z.array(slotView),
  /** Earliest start of work the chosen parts allow, as a day in the workshop's zone. */
  partsArriveDay: isoDay.nullable(),
  lines: z.array(lineView),
  sellers: z.array(sellerView),
  totalMinor: minor,
  vatMinor: minor,
  cautions: z.array(z.string()),
  /** What still stands between this plan and paying. Empty = ready. */
  missing: z.array(
    z.object({
      code: z.enum([
        'not-judged-fit',
        'stock-gone',
        'choose-workshop',
        'choose-slot',
        'slot-gone',
        'self-fit-not-offered',
        'answers-changed',
      ]),
      say: z.string(),
    }),
  ),
  /** The live order of this plan if it is held or paid. */
  orderReference: z.string().nullable(),
});
export type PlanView = z.infer<typeof planView>;

export const contactBody = z.strictObject({
  name: line(80, 'your name'),
  email,
  phone: z
    .string()
    .trim()
    .regex(/^[+0-9][0-9 ()-]{6,19}$/, 'Enter a telephone number, such as 01632 960123'),
  street: line(120, 'a street and number'),
  town: line(60, 'a town'),
  postcode: line(12, 'a postcode'),
});
export type ContactBody = z.infer<typeof contactBody>;

/** POST /api/plans/:id/checkout; needs Idempotency-Key. */
export const checkoutBody = z.strictObject({
  contact: contactBody,
  acceptTerms: z.literal(true, 'Tick the box to accept the terms'),
  /** What the rider saw; a different total is refused with code "price-changed". */
  totalMinor: minor,
});
export type CheckoutBody = z.infer<typeof checkoutBody>;
export const checkoutView = z.object({ reference: z.string(), paymentUrl: z.string() });
export type CheckoutView = z.infer<typeof checkoutView>;
