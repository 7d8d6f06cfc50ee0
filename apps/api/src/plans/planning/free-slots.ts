import { Temporal } from 'temporal-polyfill';

import { horizonDays, openSpans, type WorkshopCalendar } from './calendar.js';

export interface BusyStand {
  standId: string;
  start: Date;
  end: Date;
}

/** `standIds` are free for the whole slot. */
export interface FreeSlot {
  start: Date;
  end: Date;
  standIds: string[];
}

/** Starts are offered every half hour, counted from the opening of each span. */
const gridMinutes = 30;

/**
 * Free slots, earliest first: on open days after `afterDay`, within one span of opening hours, long enough for
 * the minutes of the work, with at least one stand free throughout.
 */
export function freeSlots(
  calendar: WorkshopCalendar,
  stands: readonly string[],
  busy: readonly BusyStand[],
  { minutes, afterDay, limit }: { minutes: number; afterDay: string; limit: number },
): FreeSlot[] {
  if (!(minutes > 0)) throw new RangeError('a slot needs a positive number of minutes');
  const found: FreeSlot[] = [];
  const first = Temporal.PlainDate.from(afterDay);
  for (let ahead = 1; ahead <= horizonDays && found.length < limit; ahead += 1) {
    for (const span of openSpans(calendar, first.add({ days: ahead }))) {
      const last = span.end.getTime() - minutes * 60_000;
      for (let at = span.start.getTime(); at <= last && found.length < limit; at += gridMinutes * 60_000) {
        const start = new Date(at);
        const end = new Date(at + minutes * 60_000);
        const standIds = stands.filter(
          (stand) => !busy.some((b) => b.standId === stand && b.start < end && start < b.end),
        );
        if (standIds.length > 0) found.push({ start, end, standIds });
      }
    }
  }
  return found;
}
