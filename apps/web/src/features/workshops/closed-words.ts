import type { ClosureView } from '@linkfell/contracts';
import { formatDay, formatDayShort } from '../../lib/format-date';

const between = ({ firstDay, lastDay }: ClosureView, word: (day: string) => string): string =>
  firstDay === lastDay ? word(firstDay) : `${word(firstDay)} to ${word(lastDay)}`;

/** "Thursday 24 December 2026 to Saturday 2 January 2027", or the one day. */
export const closureDays = (closure: ClosureView): string => between(closure, formatDay);

/** "Thu 24 Dec to Sat 2 Jan": for the next one only, whose year nobody asks. */
export const closureDaysShort = (closure: ClosureView): string => between(closure, formatDayShort);

const soonDays = 30;

/** On now, or within 30 days of `now`. */
export const isNear = ({ firstDay }: ClosureView, now: Date): boolean =>
  Date.parse(`${firstDay}T00:00:00Z`) - now.getTime() < soonDays * 86_400_000;
