import { z } from 'zod';
import { email, isoInstant, minor, slug, verdict } from '../common/primitives.schema.js';
import { lineView, sellerView, slotView } from '../plans/plans.schema.js';
import { fittingRecordView } from '../bookings/bookings.schema.js';

export const orderState = z.enum(['held', 'paid', 'completed', 'released', 'refunding', 'refunded']);
export const bookingState = z.enum([
  'held',
  'requested',
  'accepted',
  'declined',
  'lapsed',
  'cancelled',
  'released',
  'fitted',
]);
export const parcelState = z.enum(['held', 'waiting', 'to-send', 'sent', 'cancelled']);

/** GET /api/orders/:reference */
export const orderView = z.object({
  reference: z.string(),
  state: orderState,
  fit: z.enum(['self', 'workshop']),
  planId: z.string().nullable(),
  measureUpId: z.string().nullable(),
  title: z.string(),
  shockName: z.string(),
  verdict,
  email: z.string(),
  createdAt: isoInstant,
  paidAt: isoInstant.nullable(),
  holdExpiresAt: isoInstant,
  /** While the payment is open: where to pay. */
  paymentUrl: z.string().nullable(),
  /** Why a released order was released: "cancelled", "expired", "stock-gone" … */
  releaseReason: z.string().nullable(),
  lines: z.array(lineView),
  sellers: z.array(sellerView),
  totalMinor: minor,
  vatMinor: minor,
  refundedMinor: minor,
  parcels: z.array(
    z.object({
      shopName: z.string(),
      state: parcelState,
      to: z.array(z.string()),
      dispatchBy: z.string(),
      sentAt: isoInstant.nullable(),
      tracking: z.string().nullable(),
      items: z.array(z.string()),
    }),
  ),
  booking: z
    .object({
      workshopName: z.string(),
      address: z.array(z.string()),
      phone: z.string(),
      timeZone: z.string(),
      start: isoInstant,
      end: isoInstant,
      state: bookingState,
      answerBy: isoInstant.nullable(),
      declineReason: z.string().nullable(),
    })
    .nullable(),
  fitting: fittingRecordView.nullable(),
  /** Past and coming events, oldest first. */
  timeline: z.array(
    z.object({
      at: isoInstant.nullable(),
      done: z.boolean(),
      title: z.string(),
      detail: z.string().nullable(),
    }),
  ),
  /** What happens next, one sentence; and what the rider may do. */
  next: z.string(),
  actions: z.array(z.enum(['pay', 'cancel-payment', 'choose-workshop', 'choose-self-fit', 'refund'])),
  cautions: z.array(z.string()),
});
export type OrderView = z.infer<typeof orderView>;

/** POST /api/orders/find → 204 and the session's grant, or 404 whatever was wrong. */
export const findOrderBody = z.strictObject({
  reference: z
    .string()
    .trim()
    .toUpperCase()
    .regex(/^LF-[A-Z0-9]{6,12}$/, 'A reference looks like LF-7K3QX2AB'),
  email,
});
export type FindOrderBody = z.infer<typeof findOrderBody>;

/** GET /api/orders/:reference/workshops: where else it could be fitted. */
export const rebookOptions = z.object({
  workshops: z.array(
    z.object({
      id: z.string(),
      name: z.string(),
      town: z.string(),
      distanceKm: z.number().nullable(),
      timeZone: z.string(),
      slots: z.array(slotView),
    }),
  ),
  selfFit: z.object({ allowed: z.boolean(), reason: z.string().nullable() }),
});
export type RebookOptions = z.infer<typeof rebookOptions>;
/** POST /api/orders/:reference/workshop (Idempotency-Key): another workshop for what is already paid. */
export const rebookBody = z.strictObject({ workshopId: slug, slotStart: isoInstant });
export type RebookBody = z.infer<typeof rebookBody>;
// POST /api/orders/:reference/self-fit, POST …/refund, POST …/cancel-payment: empty object bodies, answer orderView.
export const emptyBody = z.strictObject({});
