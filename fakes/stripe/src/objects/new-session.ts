import type { StoredLine, StoredSession } from './stored.js';
import { newId } from '../store/ids.js';

export interface SessionInput {
  created: number;
  expiresAt: number;
  lines: StoredLine[];
  currency: string;
  total: number;
  customer: string | null;
  customerEmail: string | null;
  customerCreation: 'always' | 'if_required';
  clientReferenceId: string | null;
  metadata: Record<string, string>;
  successUrl: string;
  cancelUrl: string | null;
  locale: string | null;
  submitType: string | null;
}

/** An open session in mode payment. Its address is added when it is shown. */
export function newSession(input: SessionInput): StoredSession {
  return {
    id: newId('cs_test', 58),
    object: 'checkout.session',
    adaptive_pricing: { enabled: false },
    after_expiration: null,
    allow_promotion_codes: null,
    allowed_payment_method_types: null,
    amount_subtotal: input.total,
    amount_total: input.total,
    automatic_tax: { enabled: false, liability: null, provider: null, status: null },
    billing_address_collection: null,
    cancel_url: input.cancelUrl,
    client_reference_id: input.clientReferenceId,
    client_secret: null,
    collected_information: null,
    consent: null,
    consent_collection: null,
    created: input.created,
    currency: input.currency,
    currency_conversion: null,
    custom_fields: [],
    custom_text: {
      after_submit: null,
      shipping_address: null,
      submit: null,
      terms_of_service_acceptance: null,
    },
    customer: input.customer,
    customer_account: null,
    customer_creation: input.customer ? null : input.customerCreation,
    customer_details: null,
    customer_email: input.customerEmail,
    discounts: [],
    expires_at: input.expiresAt,
    integration_identifier: null,
    invoice: null,
    invoice_creation: null,
    livemode: false,
    locale: input.locale,
    managed_payments: null,
    metadata: input.metadata,
    mode: 'payment',
    origin_context: null,
    payment_intent: null,
    payment_link: null,
    payment_method_collection: 'if_required',
    payment_method_configuration_details: null,
    payment_method_options: {},
    payment_method_types: ['card'],
    payment_status: 'unpaid',
    permissions: null,
    phone_number_collection: { enabled: false },
    recovered_from: null,
    saved_payment_method_options: null,
    setup_intent: null,
    shipping_address_collection: null,
    shipping_cost: null,
    shipping_options: [],
    status: 'open',
    submit_type: input.submitType,
    subscription: null,
    success_url: input.successUrl,
    total_details: { amount_discount: 0, amount_shipping: 0, amount_tax: 0 },
    ui_mode: 'hosted',
    url: null,
    wallet_options: null,
  };
}
