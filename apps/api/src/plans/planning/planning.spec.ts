import { Temporal } from 'temporal-polyfill';

import { answerDeadline, openSpans, type WorkshopCalendar } from './calendar.js';
import { arrivalDay, dispatchDay, type ShopDispatch } from './dispatch.js';
import { freeSlots } from './free-slots.js';

const zone = 'Europe/London';
const shop: ShopDispatch = { timeZone: zone, cutoff: '14:00', weekdays: [1, 2, 3, 4, 5], carrierDays: 1 };
const calendar: WorkshopCalendar = {
  timeZone: zone,
  hours: [1, 2, 3, 4, 5].map((weekday) => ({ weekday, opens: '09:00', closes: '17:00' })),
  closures: [{ firstDay: '2026-12-24', lastDay: '2027-01-02' }],
};
const day = (iso: string) => Temporal.PlainDate.from(iso);

describe('the day a parcel leaves', () => {
  it.each([
    ['on a Tuesday before the cut-off', '2026-12-01T13:59:59Z', 0, '2026-12-01'],
    ['exactly at the cut-off is too late', '2026-12-01T14:00:00Z', 0, '2026-12-02'],
    ['over a weekend', '2026-12-04T15:00:00Z', 0, '2026-12-07'],
    ['on a Saturday', '2026-12-05T09:00:00Z', 0, '2026-12-07'],
    ['with two lead days over a weekend', '2026-12-03T09:00:00Z', 2, '2026-12-07'],
    ['reads the cut-off in summer time', '2026-07-01T12:59:00Z', 0, '2026-07-01'],
    ['and is too late an hour earlier by the world clock', '2026-07-01T13:00:00Z', 0, '2026-07-02'],
  ])('%s', (_, at, lead, expected) => {
    expect(dispatchDay(new Date(at), shop, lead).toString()).toBe(expected);
  });

  it('keeps to a shop that sends three days a week', () => {
    const seldom = { ...shop, cutoff: '12:00:00', weekdays: [1, 3, 5] };
    expect(dispatchDay(new Date('2026-12-01T09:00:00Z'), seldom, 1).toString()).toBe('2026-12-04');
  });

  it('counts carrier days from Monday to Friday', () => {
    expect(arrivalDay(day('2026-12-04'), 1).toString()).toBe('2026-12-07');
    expect(arrivalDay(day('2026-12-04'), 2).toString()).toBe('2026-12-08');
    expect(arrivalDay(day('2026-12-05'), 0).toString()).toBe('2026-12-05');
  });
});

describe('the time a workshop has for its answer', () => {
  it.each([
    ['asked on a Tuesday: Wednesday, close of business', '2026-12-01T16:59:00Z', '2026-12-02T17:00:00.000Z'],
    ['asked on a Friday: Monday', '2026-12-04T10:00:00Z', '2026-12-07T17:00:00.000Z'],
    [
      'asked before the closure: the first open day after it',
      '2026-12-23T10:00:00Z',
      '2027-01-04T17:00:00.000Z',
    ],
    ['across the change to summer time', '2027-03-26T10:00:00Z', '2027-03-29T16:00:00.000Z'],
  ])('%s', (_, at, expected) => {
    expect(answerDeadline(new Date(at), calendar)?.toISOString()).toBe(expected);
  });

  it('is not to be had from a workshop that never opens', () => {
    expect(answerDeadline(new Date('2026-12-01T10:00:00Z'), { ...calendar, hours: [] })).toBeNull();
  });
});

describe('free slots', () => {
  const ask = (afterDay: string, minutes = 60, limit = 1) =>
    freeSlots(calendar, ['a', 'b'], [], { minutes, afterDay, limit });

  it('start on the first open day after the parts arrive, never on that day', () => {
    expect(ask('2026-12-02')[0]?.start.toISOString()).toBe('2026-12-03T09:00:00.000Z');
  });
  it('skip a weekend', () => {
    expect(ask('2026-12-04')[0]?.start.toISOString()).toBe('2026-12-07T09:00:00.000Z');
  });
  it('skip a closure, and both its days', () => {
    expect(ask('2026-12-23')[0]?.start.toISOString()).toBe('2027-01-04T09:00:00.000Z');
  });
  it('keep local opening time across both clock changes', () => {
    expect(ask('2027-03-26')[0]?.start.toISOString()).toBe('2027-03-29T08:00:00.000Z');
    expect(ask('2027-10-29')[0]?.start.toISOString()).toBe('2027-11-01T09:00:00.000Z');
  });
  it('last real minutes on a day whose clock changes during opening hours', () => {
    const sunday = { ...calendar, hours: [{ weekday: 7, opens: '00:00', closes: '04:00' }] };
    const spring = openSpans(sunday, day('2027-03-28'))[0];
    const autumn = openSpans(sunday, day('2027-10-31'))[0];
    const hours = (span?: { start: Date; end: Date }) =>
      span && (span.end.getTime() - span.start.getTime()) / 3_600_000;
    expect(hours(spring)).toBe(3);
    expect(hours(autumn)).toBe(5);
    const slots = freeSlots(sunday, ['a'], [], { minutes: 200, afterDay: '2027-03-27', limit: 50 });
    expect(slots.every((slot) => slot.start >= new Date('2027-04-03T23:00:00Z'))).toBe(true);
  });
  it('fit into opening hours with their whole length', () => {
    const slots = ask('2026-12-02', 470, 10);
    expect(slots.map((slot) => slot.start.toISOString())).toEqual(
      expect.arrayContaining(['2026-12-03T09:00:00.000Z', '2026-12-04T09:00:00.000Z']),
    );
    expect(slots.some((slot) => slot.start.toISOString().includes('T09:30'))).toBe(false);
    expect(ask('2026-12-02', 481)).toEqual([]);
  });
  it('name the stands that are free throughout', () => {
    const busy = [{ standId: 'a', start: new Date('2026-12-03T09:30Z'), end: new Date('2026-12-03T10:00Z') }];
    const slots = freeSlots(calendar, ['a', 'b'], busy, { minutes: 60, afterDay: '2026-12-02', limit: 3 });
    expect(slots.map((slot) => slot.standIds)).toEqual([['b'], ['b'], ['a', 'b']]);
  });
  it('touching bookings do not overlap', () => {
    const busy = [{ standId: 'a', start: new Date('2026-12-03T08:00Z'), end: new Date('2026-12-03T09:00Z') }];
    const [slot] = freeSlots(calendar, ['a'], busy, { minutes: 60, afterDay: '2026-12-02', limit: 1 });
    expect(slot?.start.toISOString()).toBe('2026-12-03T09:00:00.000Z');
  });
});
