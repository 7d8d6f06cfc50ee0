import type { StoredIntent } from './stored.js';
import { newId, nowSeconds } from '../store/ids.js';

export interface IntentInput {
  amount: number;
  currency: string;
  customer?: string | null;
  description?: string | null;
  metadata?: Record<string, string>;
  receiptEmail?: string | null;
  transferGroup?: string | null;
}

/** A payment intent before any card was tried. */
export function newIntent(input: IntentInput): StoredIntent {
  const id = newId('pi');
  return {
    id,
    object: 'payment_intent',
    allowed_payment_method_types: null,
    amount: input.amount,
    amount_capturable: 0,
    amount_received: 0,
    application: null,
    application_fee_amount: null,
    automatic_payment_methods: null,
    canceled_at: null,
    cancellation_reason: null,
    capture_method: 'automatic',
    client_secret: `${id}_secret_${newId('x', 25).slice(2)}`,
    confirmation_method: 'automatic',
    created: nowSeconds(),
    currency: input.currency,
    customer: input.customer ?? null,
    customer_account: null,
    description: input.description ?? null,
    excluded_payment_method_types: null,
    last_payment_error: null,
    latest_charge: null,
    livemode: false,
    managed_payments: null,
    metadata: input.metadata ?? {},
    next_action: null,
    on_behalf_of: null,
    payment_method: null,
    payment_method_configuration_details: null,
    payment_method_options: {},
    payment_method_types: ['card'],
    payment_record: null,
    processing: null,
    receipt_email: input.receiptEmail ?? null,
    review: null,
    setup_future_usage: null,
    shipping: null,
    source: null,
    statement_descriptor: null,
    statement_descriptor_suffix: null,
    status: 'requires_payment_method',
    transfer_data: null,
    transfer_group: input.transferGroup ?? null,
  };
}
