import type { OrderView } from '@linkfell/contracts';

import { currentBooking, needsChoice, type OrderParts } from './timeline.js';

/** What the rider may do now. */
export function actionsOf(
  parts: Pick<OrderParts, 'order' | 'parcels' | 'bookings'>,
  selfFitAllowed: boolean,
): OrderView['actions'] {
  const { order, parcels } = parts;
  if (order.state === 'held') return ['pay', 'cancel-payment'];
  if (order.state !== 'paid') return [];
  const actions: OrderView['actions'] = [];
  if (needsChoice(parts)) {
    actions.push('choose-workshop');
    if (selfFitAllowed) actions.push('choose-self-fit');
  }
  if (parcels.every((parcel) => parcel.state !== 'sent')) actions.push('refund');
  return actions;
}

/** One sentence: what happens next. */
export function nextOf(parts: Pick<OrderParts, 'order' | 'parcels' | 'bookings'>): string {
  const { order, parcels } = parts;
  switch (order.state) {
    case 'held':
      return 'Pay to keep stock and date; both are held for you until then.';
    case 'released':
      return 'Nothing was paid. Your plan and your answers are still there.';
    case 'refunding':
      return 'Your money is on its way back. If your bank cannot take it, we write to you.';
    case 'refunded':
      return 'Your money has gone back to your card.';
    case 'completed':
      return order.fit === 'self'
        ? 'Fit it to the torques printed on bolts, frame or manual, and check sag and bolts after the first rides.'
        : 'Ride, and check sag and bolts after the first rides.';
    case 'paid':
      break;
  }
  if (needsChoice(parts)) {
    return 'Choose another workshop, fit it yourself where that is offered, or have your money back.';
  }
  const current = currentBooking(parts);
  if (!current) return 'The shops send your parts to you.';
  if (current.booking.state === 'requested') {
    return `${current.workshopName} has to accept the fitting; parts are sent when it has.`;
  }
  return parcels.every((parcel) => parcel.state === 'sent')
    ? `Bring the bike to ${current.workshopName} on the day.`
    : `The shops send your parts to ${current.workshopName}.`;
}
