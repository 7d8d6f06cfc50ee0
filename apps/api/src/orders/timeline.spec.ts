import type { BookingState } from '../fitting-bookings/booking.entity.js';
import { actionsOf, nextOf } from './next-steps.js';
import type { OrderState } from './order.entity.js';
import type { ParcelState } from './parcel.entity.js';
import { currentBooking, needsChoice, timelineOf, type OrderParts } from './timeline.js';

const at = (day: number, hour = 9) => new Date(Date.UTC(2026, 2, day, hour));
const order = (state: OrderState, rest: Partial<OrderParts['order']> = {}): OrderParts['order'] => ({
  state,
  fit: 'workshop',
  createdAt: at(2),
  paidAt: state === 'held' || state === 'released' ? null : at(2, 10),
  holdExpiresAt: at(2, 11),
  endedAt: null,
  ...rest,
});
const booking = (
  state: BookingState,
  workshopName: string,
  day: number,
  rest: Partial<OrderParts['bookings'][number]['booking']> = {},
): OrderParts['bookings'][number] => ({
  booking: { state, answerBy: at(3, 17), decidedAt: null, declineReason: null, ...rest },
  workshopName,
  start: at(day),
});
const parcel = (state: ParcelState): OrderParts['parcels'][number] =>
  ({
    state,
    dispatchBy: '2026-03-04',
    sentAt: state === 'sent' ? at(4, 15) : null,
    address: { name: 'Tin Shed', lines: [] },
    shop: { name: 'Fellside' },
  }) as unknown as OrderParts['parcels'][number];
const parts = (rest: Partial<OrderParts>): OrderParts => ({
  order: order('paid'),
  parcels: [],
  bookings: [],
  refunds: [],
  fittedAt: null,
  ...rest,
});
const lines = (given: OrderParts) =>
  timelineOf(given).map(({ done, title }) => `${done ? 'done' : 'then'}: ${title}`);

describe('timeline', () => {
  it('tells what was done, oldest first, and then what comes, soonest first', () => {
    const declined = booking('declined', 'Tin Shed', 9, { decidedAt: at(3, 9), declineReason: 'Press away' });
    const refund = { state: 'done' as const, amountMinor: 500, reason: 'cheaper', doneAt: at(3, 11) };
    const given = parts({
      bookings: [booking('accepted', 'Beckside', 10, { decidedAt: at(3, 12) }), declined],
      refunds: [refund],
      parcels: [parcel('to-send')],
    });
    expect(lines(given)).toEqual([
      'done: Ordered',
      'done: Paid',
      'done: Tin Shed declined',
      'done: £5.00 went back to your card',
      'done: Beckside accepted the fitting',
      'then: Fellside sends a parcel',
      'then: Fitting at Beckside',
    ]);
  });

  it('promises nothing any more once the money goes back', () => {
    const given = parts({
      order: order('refunding'),
      bookings: [booking('cancelled', 'Tin Shed', 9, { decidedAt: at(3) })],
      parcels: [parcel('cancelled')],
      refunds: [{ state: 'pending', amountMinor: 9_900, reason: 'asked', doneAt: null }],
    });
    expect(lines(given)).toEqual([
      'done: Ordered',
      'done: Paid',
      'done: Fitting at Tin Shed cancelled',
      'then: £99.00 goes back to your card',
    ]);
  });

  it('ends a released order there, and asks for payment while it is held', () => {
    const bookings = [booking('held', 'Tin Shed', 9)];
    expect(lines(parts({ order: order('released', { endedAt: at(2, 12) }), bookings }))).toEqual([
      'done: Ordered',
      'done: Let go',
    ]);
    expect(lines(parts({ order: order('held'), bookings }))).toEqual([
      'done: Ordered',
      'then: Pay before the hold ends',
    ]);
  });
});

describe('the fitting that counts', () => {
  it('is the live one, whichever came last', () => {
    const live = booking('requested', 'Beckside', 10);
    const gone = booking('lapsed', 'Tin Shed', 9);
    expect(currentBooking({ order: order('paid'), bookings: [gone, live] })).toBe(live);
    expect(currentBooking({ order: order('paid'), bookings: [gone] })).toBe(gone);
    expect(currentBooking({ order: order('paid', { fit: 'self' }), bookings: [gone] })).toBeNull();
  });

  it.each<[BookingState, boolean]>([
    ['requested', false],
    ['accepted', false],
    ['fitted', false],
    ['declined', true],
    ['lapsed', true],
  ])('of state %s needs a choice: %s', (state, expected) => {
    expect(needsChoice({ order: order('paid'), bookings: [booking(state, 'Tin Shed', 9)] })).toBe(expected);
  });
});

describe('what the rider may do', () => {
  const declined = [booking('declined', 'Tin Shed', 9)];

  it.each<[string, Partial<OrderParts>, boolean, string[]]>([
    ['held', { order: order('held') }, true, ['pay', 'cancel-payment']],
    ['declined', { bookings: declined }, true, ['choose-workshop', 'choose-self-fit', 'refund']],
    ['declined, workshop-only work', { bookings: declined }, false, ['choose-workshop', 'refund']],
    [
      'accepted',
      { bookings: [booking('accepted', 'Tin Shed', 9)], parcels: [parcel('to-send')] },
      true,
      ['refund'],
    ],
    ['parcel sent', { bookings: [booking('accepted', 'Tin Shed', 9)], parcels: [parcel('sent')] }, true, []],
    ['refunding', { order: order('refunding') }, true, []],
    ['completed', { order: order('completed') }, true, []],
  ])('%s', (_name, rest, selfFit, actions) => {
    expect(actionsOf(parts(rest), selfFit)).toEqual(actions);
  });

  it('is told in one sentence with the workshop’s name', () => {
    const accepted = [booking('accepted', 'Tin Shed', 9)];
    expect(nextOf(parts({ bookings: [booking('requested', 'Tin Shed', 9)] }))).toContain(
      'Tin Shed has to accept',
    );
    expect(nextOf(parts({ bookings: accepted, parcels: [parcel('to-send')] }))).toContain('to Tin Shed');
    expect(nextOf(parts({ bookings: accepted, parcels: [parcel('sent')] }))).toContain('Bring the bike');
    expect(nextOf(parts({ bookings: declined }))).toContain('another workshop');
    expect(nextOf(parts({ order: order('paid', { fit: 'self' }), bookings: declined }))).toContain('to you');
  });
});
