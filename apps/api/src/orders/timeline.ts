import type { OrderView } from '@linkfell/contracts';

import type { Booking } from '../fitting-bookings/booking.entity.js';
import type { Refund } from '../payments/refund.entity.js';
import { poundsText } from './money-text.js';
import type { Order } from './order.entity.js';
import type { Parcel } from './parcel.entity.js';

/** A fitting that was asked for, with what its row does not tell. */
export interface PlacedBooking {
  booking: Pick<Booking, 'state' | 'answerBy' | 'decidedAt' | 'declineReason'>;
  workshopName: string;
  start: Date;
}

export interface OrderParts {
  order: Pick<Order, 'state' | 'fit' | 'createdAt' | 'paidAt' | 'holdExpiresAt' | 'endedAt'>;
  parcels: Pick<Parcel, 'state' | 'sentAt' | 'dispatchBy' | 'address' | 'shop'>[];
  /** All that were ever asked for, latest first. */
  bookings: PlacedBooking[];
  refunds: Pick<Refund, 'state' | 'amountMinor' | 'reason' | 'doneAt'>[];
  fittedAt: Date | null;
}

type Event = OrderView['timeline'][number];
const done = (at: Date | null, title: string, detail: string | null = null): Event => ({
  at: at?.toISOString() ?? null,
  done: true,
  title,
  detail,
});
const coming = (at: Date | null, title: string, detail: string | null = null): Event => ({
  ...done(at, title, detail),
  done: false,
});

/** What has happened, oldest first, then what comes, soonest first; what has no date yet stands last. */
export function timelineOf(parts: OrderParts): Event[] {
  const { order } = parts;
  const events = [done(order.createdAt, 'Ordered')];
  if (order.state === 'released') {
    events.push(done(order.endedAt, 'Let go', 'Nothing was paid; stock and date were released.'));
  } else if (order.paidAt) {
    events.push(done(order.paidAt, 'Paid'), ...parts.refunds.map(refundEvent));
    events.push(...parts.bookings.flatMap(answerEvents));
    const goingBack = order.state === 'refunding' || order.state === 'refunded';
    events.push(...parts.parcels.flatMap((parcel) => parcelEvents(parcel, goingBack)));
    events.push(...fittingEvents(parts, goingBack));
  } else {
    events.push(coming(order.holdExpiresAt, 'Pay before the hold ends'));
  }
  const last = '9';
  return events.sort((a, b) => Number(b.done) - Number(a.done) || (a.at ?? last).localeCompare(b.at ?? last));
}

function refundEvent({ state, amountMinor, reason, doneAt }: OrderParts['refunds'][number]): Event {
  return state === 'done'
    ? done(doneAt, `${poundsText(amountMinor)} went back to your card`, reason)
    : coming(null, `${poundsText(amountMinor)} goes back to your card`, reason);
}

function answerEvents({ booking, workshopName }: PlacedBooking): Event[] {
  const { state, answerBy, decidedAt, declineReason } = booking;
  switch (state) {
    case 'requested':
      return [coming(answerBy, `${workshopName} answers by`)];
    case 'accepted':
    case 'fitted':
      return [done(decidedAt, `${workshopName} accepted the fitting`)];
    case 'declined':
      return [done(decidedAt, `${workshopName} declined`, declineReason)];
    case 'lapsed':
      return [done(decidedAt, `${workshopName} did not answer in time`)];
    case 'cancelled':
      return [done(decidedAt, `Fitting at ${workshopName} cancelled`)];
    case 'held':
    case 'released':
      return [];
  }
}

function parcelEvents(parcel: OrderParts['parcels'][number], goingBack: boolean): Event[] {
  const to = `To ${parcel.address.name}`;
  if (parcel.state === 'sent') return [done(parcel.sentAt, `${parcel.shop.name} sent a parcel`, to)];
  if (parcel.state === 'cancelled' || goingBack) return [];
  return [coming(new Date(`${parcel.dispatchBy}T12:00:00Z`), `${parcel.shop.name} sends a parcel`, to)];
}

function fittingEvents(parts: OrderParts, goingBack: boolean): Event[] {
  const current = currentBooking(parts);
  if (!current) return [];
  if (parts.fittedAt) return [done(parts.fittedAt, 'Fitted and set up')];
  if (goingBack || needsChoice(parts)) return [];
  return [coming(current.start, `Fitting at ${current.workshopName}`)];
}

const alive = new Set<Booking['state']>(['held', 'requested', 'accepted', 'fitted']);

/** The fitting that counts: the live one, else the latest. One given up for self-fit is history. */
export function currentBooking({
  order,
  bookings,
}: Pick<OrderParts, 'order' | 'bookings'>): PlacedBooking | null {
  if (order.fit !== 'workshop') return null;
  return bookings.find(({ booking }) => alive.has(booking.state)) ?? bookings[0] ?? null;
}

/** Needs a choice by the rider: paid, to be fitted, and no workshop has it. */
export const needsChoice = ({ order, bookings }: Pick<OrderParts, 'order' | 'bookings'>): boolean =>
  order.state === 'paid' &&
  order.fit === 'workshop' &&
  !bookings.some(({ booking }) => alive.has(booking.state));
