import type { BookingState } from '../fitting-bookings/booking.entity.js';
import type { PaymentState } from '../payments/payment.entity.js';
import type { RefundState } from '../payments/refund.entity.js';
import type { OrderState } from './order.entity.js';
import type { ParcelState } from './parcel.entity.js';

type Table<State extends string> = Readonly<Record<State, readonly State[]>>;

/** The only changes of state there are. A released order lives again when its payment arrives late and all is still there. */
export const orderTransitions: Table<OrderState> = {
  held: ['paid', 'released'],
  paid: ['completed', 'refunding'],
  completed: [],
  released: ['paid', 'refunding'],
  refunding: ['refunded'],
  // A bank may hand a refund back days after it was done.
  refunded: ['refunding'],
};

export const paymentTransitions: Table<PaymentState> = {
  preparing: ['open', 'paid', 'expired'],
  open: ['paid', 'expired'],
  expired: ['paid'],
  paid: [],
};

export const refundTransitions: Table<RefundState> = {
  pending: ['done'],
  done: ['pending'],
};

export const bookingTransitions: Table<BookingState> = {
  held: ['requested', 'released'],
  requested: ['accepted', 'declined', 'lapsed', 'cancelled'],
  accepted: ['fitted', 'cancelled'],
  declined: [],
  lapsed: [],
  cancelled: [],
  released: [],
  fitted: [],
};

export const parcelTransitions: Table<ParcelState> = {
  held: ['waiting', 'to-send', 'cancelled'],
  waiting: ['to-send', 'cancelled'],
  'to-send': ['sent', 'cancelled'],
  sent: [],
  cancelled: ['waiting', 'to-send'],
};

/** @throws Error for a change that the table does not have: a fault of ours, never of the caller's */
export function step<State extends string>(table: Table<State>, from: State, to: State): State {
  if (!table[from].includes(to)) throw new Error(`no way from "${from}" to "${to}"`);
  return to;
}
