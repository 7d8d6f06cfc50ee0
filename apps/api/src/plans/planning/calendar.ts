import { Temporal } from 'temporal-polyfill';

import { Remembered } from './remembered.js';

/** When a workshop works; all days and times of day are meant in its own zone. */
export interface WorkshopCalendar {
  timeZone: string;
  /** ISO weekdays, Monday is 1; times as HH:MM or HH:MM:SS. */
  hours: readonly { weekday: number; opens: string; closes: string }[];
  /** ISO days, both ends closed. */
  closures: readonly { firstDay: string; lastDay: string }[];
}

export interface Span {
  start: Date;
  end: Date;
}

/** How far ahead anything is looked for; a workshop closed for longer has no date to offer. */
export const horizonDays = 60;

export const dayOf = (at: Date, timeZone: string): Temporal.PlainDate =>
  Temporal.Instant.fromEpochMilliseconds(at.getTime()).toZonedDateTimeISO(timeZone).toPlainDate();

const toDate = (zoned: Temporal.ZonedDateTime): Date => new Date(zoned.epochMilliseconds);

/**
 * The spans in which the workshop is open on one day, earliest first; none when it is closed.
 * Times of day that a clock change skips or repeats resolve as Temporal's "compatible" rule does.
 */
export function openSpans(calendar: WorkshopCalendar, day: Temporal.PlainDate): readonly Span[] {
  const iso = day.toString();
  const { timeZone, hours, closures } = calendar;
  return spans.of(`${iso} ${timeZone} ${JSON.stringify([hours, closures])}`, () =>
    spansOn(calendar, day, iso),
  );
}

const spans = new Remembered<readonly Span[]>(5000);

function spansOn(calendar: WorkshopCalendar, day: Temporal.PlainDate, iso: string): Span[] {
  if (calendar.closures.some((closure) => closure.firstDay <= iso && iso <= closure.lastDay)) return [];
  return calendar.hours
    .filter((hours) => hours.weekday === day.dayOfWeek)
    .map((hours) => ({
      start: toDate(day.toZonedDateTime({ timeZone: calendar.timeZone, plainTime: hours.opens })),
      end: toDate(day.toZonedDateTime({ timeZone: calendar.timeZone, plainTime: hours.closes })),
    }))
    .filter((span) => span.start < span.end)
    .sort((a, b) => a.start.getTime() - b.start.getTime());
}

/** The first open day after `day`, or null within the horizon. */
export function nextOpenDay(calendar: WorkshopCalendar, day: Temporal.PlainDate): Temporal.PlainDate | null {
  for (let ahead = 1; ahead <= horizonDays; ahead += 1) {
    const candidate = day.add({ days: ahead });
    if (openSpans(calendar, candidate).length > 0) return candidate;
  }
  return null;
}

/**
 * Until when a workshop may answer a request: the close of its first open day after the day of asking, so that
 * it always has one whole working day however late in the day the rider paid.
 * @returns null when it is closed for the whole horizon
 */
export function answerDeadline(askedAt: Date, calendar: WorkshopCalendar): Date | null {
  const day = nextOpenDay(calendar, dayOf(askedAt, calendar.timeZone));
  return day && (openSpans(calendar, day).at(-1)?.end ?? null);
}
