import { z } from 'zod';
import { isoInstant, line } from '../common/primitives.schema.js';

export const torqueEntry = z.strictObject({
  bolt: line(60, 'which bolt'),
  /** As printed on bolt, frame or manual; null where nothing was printed and found. */
  printedNm: z.number().min(0.5).max(120).nullable(),
  setNm: z.number().min(0.5, 'Enter a torque in N m').max(120, 'Enter a torque in N m'),
});

/** What the mechanic records on the day. */
export const fittingRecordBody = z.strictObject({
  serialNumber: line(40, 'the serial number stamped on the shock'),
  spring: z.discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('air'), gaugePsi: z.number().min(10).max(400) }),
    z.strictObject({
      kind: z.literal('coil'),
      rateLbPerIn: z.number().min(100).max(1200),
      preloadTurns: z.number().min(0).max(10),
    }),
  ]),
  sagMm: z.number().min(1).max(60),
  torques: z.array(torqueEntry).min(1, 'Record at least one bolt').max(12),
  /** Moved through its whole travel without air or spring, no contact. */
  travelChecked: z.boolean(),
  noticesChecked: z.boolean(),
  notes: z.string().max(1000),
});
export type FittingRecordBody = z.infer<typeof fittingRecordBody>;
export const fittingRecordView = z.object({
  record: fittingRecordBody,
  mechanic: z.string(),
  savedAt: isoInstant,
  fittedAt: isoInstant.nullable(),
  version: z.int(),
});
export type FittingRecordView = z.infer<typeof fittingRecordView>;

export const bookingSummary = z.object({
  id: z.string(),
  orderReference: z.string(),
  state: z.enum(['requested', 'accepted', 'declined', 'lapsed', 'cancelled', 'fitted']),
  start: isoInstant,
  end: isoInstant,
  timeZone: z.string(),
  stand: z.string(),
  riderName: z.string(),
  bike: z.string(),
  shock: z.string(),
  answerBy: isoInstant.nullable(),
});
/** GET /api/organisations/:orgId/bookings */
export const bookingList = z.object({ bookings: z.array(bookingSummary) });
export type BookingList = z.infer<typeof bookingList>;

/** GET /api/organisations/:orgId/bookings/:bookingId: the job sheet; ETag = version. */
export const jobSheetView = z.object({
  booking: bookingSummary,
  version: z.int(),
  rider: z.object({ name: z.string(), phone: z.string(), email: z.string(), weight: z.string() }),
  frameSheet: z.string(),
  entry: z.string(),
  oldShock: z.string(),
  newShock: z.string(),
  wayRound: z.string(),
  ends: z.array(
    z.object({
      end: z.enum(['frame', 'link']),
      what: z.string(),
      thread: z.string().nullable(),
      torqueNm: z.number().nullable(),
    }),
  ),
  spring: z.object({
    kind: z.enum(['air', 'coil']),
    say: z.string(),
    gaugePsi: z.number().nullable(),
    rateLbPerIn: z.number().nullable(),
    sag: z.string(),
  }),
  parts: z.array(z.object({ name: z.string(), from: z.string(), parcel: z.string() })),
  work: z.array(z.object({ say: z.string(), minutes: z.int() })),
  tools: z.array(z.string()),
  cautions: z.array(z.string()),
  record: fittingRecordView.nullable(),
  /** What keeps it from being marked fitted; empty = nothing. */
  missing: z.array(z.string()),
});
export type JobSheetView = z.infer<typeof jobSheetView>;
// POST …/accept {}  · POST …/decline {reason}  · PUT …/record (If-Match) · POST …/fitted {} ; each answers jobSheetView
export const declineBody = z.strictObject({ reason: line(300, 'a reason the rider will read') });
export type DeclineBody = z.infer<typeof declineBody>;
