import type { OrderView } from '@linkfell/contracts';

import type { Booking } from '../fitting-bookings/booking.entity.js';
import type { Order } from './order.entity.js';
import type { Parcel } from './parcel.entity.js';

export interface OrderParts {
  order: Order;
  parcels: Parcel[];
  booking: Booking | null;
  /** Start of the fitting. */
  fittingAt: Date | null;
  workshopName: string | null;
  fittedAt: Date | null;
}

type Event = OrderView['timeline'][number];
const iso = (at: Date | null): string | null => at?.toISOString() ?? null;

/** What has happened and what comes, oldest first; every promise with its date. */
export function timelineOf({
  order,
  parcels,
  booking,
  fittingAt,
  workshopName,
  fittedAt,
}: OrderParts): Event[] {
  const events: Event[] = [{ at: iso(order.createdAt), done: true, title: 'Ordered', detail: null }];
  const add = (at: Date | null, done: boolean, title: string, detail: string | null = null): void =>
    void events.push({ at: iso(at), done, title, detail });
  if (order.state === 'released') {
    add(order.endedAt, true, 'Let go', 'Nothing was paid; stock and date were released.');
    return events;
  }
  add(
    order.paidAt ?? order.holdExpiresAt,
    order.paidAt !== null,
    order.paidAt ? 'Paid' : 'Pay before the hold ends',
  );
  if (order.state === 'refunding' || order.state === 'refunded') {
    add(
      order.endedAt,
      order.state === 'refunded',
      'Refunded',
      'Your money goes back to the card you paid with.',
    );
    return events;
  }
  if (booking && booking.state !== 'held') {
    const answered = booking.state === 'accepted' || booking.state === 'fitted';
    const title = answered
      ? `${workshopName} accepted the fitting`
      : bookingWords(booking.state, workshopName ?? 'The workshop');
    add(
      answered || booking.decidedAt ? booking.decidedAt : booking.answerBy,
      answered || booking.state !== 'requested',
      title,
      booking.declineReason,
    );
  }
  for (const parcel of parcels) {
    if (parcel.state === 'cancelled') continue;
    const sent = parcel.state === 'sent';
    add(
      sent ? parcel.sentAt : new Date(`${parcel.dispatchBy}T12:00:00Z`),
      sent,
      sent ? `${parcel.shop.name} sent a parcel` : `${parcel.shop.name} sends a parcel`,
      `To ${parcel.address.name}`,
    );
  }
  if (fittingAt && booking && booking.state !== 'declined' && booking.state !== 'lapsed') {
    add(
      fittedAt ?? fittingAt,
      fittedAt !== null,
      fittedAt ? 'Fitted and set up' : `Fitting at ${workshopName}`,
    );
  }
  return events;
}

function bookingWords(state: Booking['state'], workshop: string): string {
  switch (state) {
    case 'requested':
      return `${workshop} answers by`;
    case 'declined':
      return `${workshop} declined`;
    case 'lapsed':
      return `${workshop} did not answer in time`;
    case 'cancelled':
      return 'Fitting cancelled';
    case 'held':
    case 'accepted':
    case 'released':
    case 'fitted':
      return workshop;
  }
}

/** Needs a choice by the rider: paid, to be fitted, and no workshop has it. */
export const needsChoice = ({ order, booking }: Pick<OrderParts, 'order' | 'booking'>): boolean =>
  order.state === 'paid' &&
  order.fit === 'workshop' &&
  !(booking && ['requested', 'accepted', 'fitted'].includes(booking.state));

/** What the rider may do now. */
export function actionsOf(parts: OrderParts): OrderView['actions'] {
  const { order, parcels } = parts;
  if (order.state === 'held') return ['pay', 'cancel-payment'];
  if (order.state !== 'paid') return [];
  const actions: OrderView['actions'] = [];
  if (needsChoice(parts)) {
    actions.push('choose-workshop');
    if (order.job.selfFitAllowed) actions.push('choose-self-fit');
  }
  if (parcels.every((parcel) => parcel.state !== 'sent')) actions.push('refund');
  return actions;
}

/** One sentence: what happens next. */
export function nextOf(parts: OrderParts): string {
  const { order, booking, parcels, workshopName } = parts;
  switch (order.state) {
    case 'held':
      return 'Pay to keep stock and date; both are held for you until then.';
    case 'released':
      return 'Nothing was paid. Your plan and your answers are still there.';
    case 'refunding':
      return 'Your money is on its way back.';
    case 'refunded':
      return 'Your money has gone back to your card.';
    case 'completed':
      return 'Ride, and check sag and bolts after the first rides.';
    case 'paid':
      if (needsChoice(parts))
        return 'Choose another workshop, fit it yourself where that is offered, or have your money back.';
      if (booking?.state === 'requested')
        return `${workshopName} has to accept the fitting; parts are sent when it has.`;
      if (booking?.state === 'accepted') {
        return parcels.every((parcel) => parcel.state === 'sent')
          ? `Bring the bike to ${workshopName} on the day.`
          : `The shops send your parts to ${workshopName}.`;
      }
      return 'The shops send your parts to you.';
  }
}
