export const homeZone = 'Europe/London';

const formatter = (options: Intl.DateTimeFormatOptions, timeZone: string) =>
  new Intl.DateTimeFormat('en-GB', { ...options, timeZone });

/** A calendar day as YYYY-MM-DD has no zone: it is read as noon UTC, so that no zone shifts it. */
const asInstant = (day: string): Date => new Date(`${day}T12:00:00Z`);

/** "Thu 10 Dec" from 2026-12-10. */
export const formatDayShort = (day: string): string =>
  formatter({ weekday: 'short', day: 'numeric', month: 'short' }, 'UTC')
    .format(asInstant(day))
    .replace(',', '');

/** "10 Dec 2026" from 2026-12-10, never broken over two lines. */
export const formatDayPlain = (day: string): string =>
  formatter({ day: 'numeric', month: 'short', year: 'numeric' }, 'UTC')
    .format(asInstant(day))
    .replace('Sept', 'Sep')
    .replaceAll(' ', '\u00a0');

/** "Thursday 10 December 2026" from 2026-12-10. */
export const formatDay = (day: string): string =>
  formatter({ weekday: 'long', day: 'numeric', month: 'long', year: 'numeric' }, 'UTC')
    .format(asInstant(day))
    .replace(',', '');

/** "14:30" of an ISO instant, in the given zone. */
export const formatTime = (instant: string, zone = homeZone): string =>
  formatter({ hour: '2-digit', minute: '2-digit', hourCycle: 'h23' }, zone).format(new Date(instant));

/** "Thursday 10 December 2026 at 14:30" of an ISO instant, in the given zone. */
export function formatDateTime(instant: string, zone = homeZone): string {
  const day = formatter({ weekday: 'long', day: 'numeric', month: 'long', year: 'numeric' }, zone)
    .format(new Date(instant))
    .replace(',', '');
  return `${day} at ${formatTime(instant, zone)}`;
}
