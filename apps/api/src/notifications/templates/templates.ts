import {
  bookingAccepted,
  bookingCancelled,
  bookingOpenAgain,
  fitted,
  orderPaid,
  orderRefunded,
  orderReleased,
  parcelSent,
  shopOrder,
  workshopRequest,
} from './order-mails.js';
import { passwordChanged } from './password-changed.js';
import { passwordReset } from './password-reset.js';

/** Every mail we send, by name. A template is a pure function of data that survives JSON. */
export const templates = {
  'password-changed': passwordChanged,
  'password-reset': passwordReset,
  'order-paid': orderPaid,
  'order-released': orderReleased,
  'order-refunded': orderRefunded,
  'shop-order': shopOrder,
  'workshop-request': workshopRequest,
  'booking-accepted': bookingAccepted,
  'booking-open-again': bookingOpenAgain,
  'booking-cancelled': bookingCancelled,
  'parcel-sent': parcelSent,
  fitted,
} as const;

export type TemplateName = keyof typeof templates;
export type TemplateData<Name extends TemplateName> = Parameters<(typeof templates)[Name]>[0];
