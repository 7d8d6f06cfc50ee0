import type { IntentDetail, StoredCharge, StoredIntent } from './stored.js';
import type { TestCard } from '../payments/test-cards.js';
import { newId, nowSeconds } from '../store/ids.js';

/** The record of one try to take the money: paid in full, or failed with the card's reason. */
export function newCharge(intent: StoredIntent, detail: IntentDetail, card: TestCard): StoredCharge {
  const { decline } = card;
  const paid = !decline;
  return {
    id: newId('ch'),
    object: 'charge',
    amount: intent.amount,
    amount_captured: paid ? intent.amount : 0,
    amount_refunded: 0,
    application: null,
    application_fee: null,
    application_fee_amount: null,
    balance_transaction: null,
    billing_details: {
      address: null,
      email: detail.email,
      name: detail.cardholder,
      phone: null,
      tax_id: null,
    },
    calculated_statement_descriptor: null,
    captured: paid,
    created: nowSeconds(),
    currency: intent.currency,
    customer: intent.customer,
    description: intent.description,
    disputed: false,
    failure_balance_transaction: null,
    failure_code: decline?.code ?? null,
    failure_message: decline?.message ?? null,
    fraud_details: {},
    livemode: false,
    metadata: { ...intent.metadata },
    on_behalf_of: null,
    outcome: {
      advice_code: null,
      network_advice_code: null,
      network_decline_code: null,
      network_status: paid ? 'approved_by_network' : 'declined_by_network',
      reason: decline?.declineCode ?? null,
      risk_level: 'normal',
      seller_message: paid
        ? 'Payment complete.'
        : 'The bank did not return any further details with this decline.',
      type: paid ? 'authorized' : 'issuer_declined',
    },
    paid,
    payment_intent: intent.id,
    payment_method: intent.payment_method,
    payment_method_details: null,
    receipt_email: intent.receipt_email,
    receipt_number: null,
    receipt_url: null,
    refunded: false,
    review: null,
    shipping: null,
    source: null,
    source_transfer: null,
    statement_descriptor: null,
    statement_descriptor_suffix: null,
    status: paid ? 'succeeded' : 'failed',
    transfer_data: null,
    transfer_group: intent.transfer_group,
  };
}
