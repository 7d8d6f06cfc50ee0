/** A span of time, start included, end excluded. */
export interface TimeRange {
  start: Date;
  end: Date;
}

/** The range as a tstzrange literal. */
export function toRangeText({ start, end }: TimeRange): string {
  return `[${start.toISOString()},${end.toISOString()})`;
}

const printed = /^\[("?)([^",]+)\1,("?)([^",]+)\3\)$/;

/**
 * Reads a bounded tstzrange as PostgreSQL prints it, such as `["2026-03-02 09:00:00+00","2026-03-02 10:30:00+00")`.
 * @throws Error when the text is not a bounded range with an included start and an excluded end
 */
export function fromRangeText(text: string): TimeRange {
  const match = printed.exec(text);
  const start = new Date(match?.[2]?.replace(/([+-]\d\d)$/, '$1:00') ?? NaN);
  const end = new Date(match?.[4]?.replace(/([+-]\d\d)$/, '$1:00') ?? NaN);
  if (Number.isNaN(start.getTime()) || Number.isNaN(end.getTime())) {
    throw new Error(`not a bounded time range: ${text}`);
  }
  return { start, end };
}
