import type { Stripe } from 'stripe';

/** The SDK's own type with its expandable fields as plain ids: the form in which objects are kept. */
type Flat<T, K extends keyof T> = Omit<T, K> & { [P in K]: string | null };

export type StoredSession = Flat<Stripe.Checkout.Session, 'payment_intent' | 'customer'>;
export type StoredIntent = Flat<Stripe.PaymentIntent, 'latest_charge' | 'customer' | 'payment_method'>;
export type StoredCharge = Flat<Stripe.Charge, 'payment_intent' | 'customer'>;
export type StoredRefund = Flat<Stripe.Refund, 'payment_intent' | 'charge'>;
export type StoredCustomer = Stripe.Customer;
export type StoredAccount = Stripe.Account;
export type StoredTransfer = Flat<Omit<Stripe.Transfer, 'reversals'>, 'destination' | 'source_transaction'>;
export type StoredReversal = Omit<Stripe.TransferReversal, 'transfer'> & { transfer: string };
export type StoredPrice = Omit<Stripe.Price, 'unit_amount_decimal'> & { unit_amount_decimal: string };
export type StoredLine = Omit<Stripe.LineItem, 'price'> & { price: StoredPrice };

export interface StoredEvent {
  id: string;
  object: 'event';
  api_version: string;
  created: number;
  data: { object: Record<string, unknown>; previous_attributes?: Record<string, unknown> };
  livemode: false;
  pending_webhooks: number;
  request: { id: string | null; idempotency_key: string | null } | null;
  type: string;
}

/** What belongs to a session but is shown only on request, or never. */
export interface SessionDetail {
  lines: StoredLine[];
  intentMetadata: Record<string, string>;
  intentDescription: string | null;
  transferGroup: string | null;
}

/** What belongs to a payment intent but is never shown: the card in play and the page it came from. */
export interface IntentDetail {
  sessionId: string | null;
  cardNumber: string | null;
  cardholder: string | null;
  email: string | null;
  returnUrl: string | null;
}

export interface ApiList<T> {
  object: 'list';
  data: T[];
  has_more: boolean;
  url: string;
}
