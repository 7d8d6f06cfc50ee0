import {
  bookingAccepted,
  bookingAsked,
  bookingCancelled,
  bookingOpenAgain,
  fitted,
} from './fitting-mails.js';
import { orderPaid, orderRefunded, orderReleased, parcelSent, refundFailed } from './order-mails.js';
import { passwordChanged } from './password-changed.js';
import { passwordReset } from './password-reset.js';
import {
  shopCancelled,
  shopOrder,
  workshopCancelled,
  workshopLapsed,
  workshopParcel,
  workshopRequest,
} from './trade-mails.js';

/** Every mail we send, by name. A template is a pure function of data that survives JSON. */
export const templates = {
  'password-changed': passwordChanged,
  'password-reset': passwordReset,
  'order-paid': orderPaid,
  'order-released': orderReleased,
  'order-refunded': orderRefunded,
  'refund-failed': refundFailed,
  'parcel-sent': parcelSent,
  'booking-accepted': bookingAccepted,
  'booking-asked': bookingAsked,
  'booking-open-again': bookingOpenAgain,
  'booking-cancelled': bookingCancelled,
  fitted,
  'shop-order': shopOrder,
  'shop-cancelled': shopCancelled,
  'workshop-request': workshopRequest,
  'workshop-cancelled': workshopCancelled,
  'workshop-lapsed': workshopLapsed,
  'workshop-parcel': workshopParcel,
} as const;

export type TemplateName = keyof typeof templates;
export type TemplateData<Name extends TemplateName> = Parameters<(typeof templates)[Name]>[0];
