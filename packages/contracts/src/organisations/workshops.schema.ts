import { z } from 'zod';
import { isoDay, minor, slug, workId } from '../common/primitives.schema.js';

/** GET /api/workshops?from= → all workshops, nearest first where a town is given, else by name */
export const workshopsQuery = z.object({ from: slug.optional() });
export type WorkshopsQuery = z.infer<typeof workshopsQuery>;

export const closureView = z.object({ firstDay: isoDay, lastDay: isoDay, reason: z.string() });
export type ClosureView = z.infer<typeof closureView>;

/** Local times of day, "08:30". Monday is 1. */
export const hoursView = z.object({ weekday: z.int().min(1).max(7), opens: z.string(), closes: z.string() });
export type HoursView = z.infer<typeof hoursView>;

export const workshopRow = z.object({
  id: z.string(),
  name: z.string(),
  town: z.string(),
  about: z.string(),
  latitude: z.number(),
  longitude: z.number(),
  /** As the crow flies from the town asked for. */
  distanceKm: z.number().nullable(),
  /** Taking the old shock out and fitting the new one; VAT included. null where it is not offered. */
  fitMinor: minor.nullable(),
  fitMinutes: z.int().nullable(),
  works: z.array(workId),
  openWeekdays: z.array(z.int()),
  /** The closure that is on or comes next. */
  closure: closureView.nullable(),
});
export type WorkshopRow = z.infer<typeof workshopRow>;

export const workshopList = z.object({
  workshops: z.array(workshopRow),
  /** Towns to measure from, by name. */
  towns: z.array(z.object({ id: z.string(), name: z.string(), latitude: z.number(), longitude: z.number() })),
});
export type WorkshopList = z.infer<typeof workshopList>;

/** GET /api/workshops/:workshopId */
export const workshopPage = workshopRow.omit({ closure: true, distanceKm: true }).extend({
  street: z.string(),
  postcode: z.string(),
  phone: z.string(),
  email: z.string(),
  vatNumber: z.string(),
  timeZone: z.string(),
  stands: z.int(),
  hours: z.array(hoursView),
  /** On now or still to come, soonest first. */
  closures: z.array(closureView),
  services: z.array(z.object({ workId, say: z.string(), minutes: z.int(), priceMinor: minor })),
});
export type WorkshopPage = z.infer<typeof workshopPage>;
