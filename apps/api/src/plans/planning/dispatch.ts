import { Temporal } from 'temporal-polyfill';

/** How a shop sends; days and times of day in its own zone. */
export interface ShopDispatch {
  timeZone: string;
  /** HH:MM or HH:MM:SS; released before it on a dispatch day leaves that day. */
  cutoff: string;
  /** ISO weekdays, Monday is 1. */
  weekdays: readonly number[];
  carrierDays: number;
}

const step = (
  from: Temporal.PlainDate,
  days: number,
  counts: (day: Temporal.PlainDate) => boolean,
): Temporal.PlainDate => {
  let day = from;
  for (let left = days; left > 0;) {
    day = day.add({ days: 1 });
    if (counts(day)) left -= 1;
  }
  return day;
};

/**
 * The day on which a parcel leaves. `leadDays` are dispatch days the shop needs before the parcel is ready.
 * A release exactly at the cut-off is too late.
 */
export function dispatchDay(releasedAt: Date, shop: ShopDispatch, leadDays: number): Temporal.PlainDate {
  if (shop.weekdays.length === 0) throw new RangeError('a shop needs at least one dispatch day a week');
  const sends = (day: Temporal.PlainDate): boolean => shop.weekdays.includes(day.dayOfWeek);
  const local = Temporal.Instant.fromEpochMilliseconds(releasedAt.getTime()).toZonedDateTimeISO(
    shop.timeZone,
  );
  const today = local.toPlainDate();
  const inTime =
    sends(today) && Temporal.PlainTime.compare(local.toPlainTime(), Temporal.PlainTime.from(shop.cutoff)) < 0;
  return step(inTime ? today : step(today, 1, sends), leadDays, sends);
}

/** The day of arrival; carriers work from Monday to Friday. */
export function arrivalDay(dispatched: Temporal.PlainDate, carrierDays: number): Temporal.PlainDate {
  return step(dispatched, carrierDays, (day) => day.dayOfWeek <= 5);
}
