const day = { weekday: 'short', day: 'numeric', month: 'short', year: 'numeric' } as const;

/** "Thu, 10 Dec 2026, 09:30" in a zone. */
export const whenText = (at: Date, timeZone: string): string =>
  new Intl.DateTimeFormat('en-GB', { timeZone, ...day, hour: '2-digit', minute: '2-digit' }).format(at);

/** "Thu, 10 Dec 2026" for an ISO day; a day has no zone. */
export const dayText = (isoDay: string): string =>
  new Intl.DateTimeFormat('en-GB', { timeZone: 'UTC', ...day }).format(new Date(`${isoDay}T12:00:00Z`));
