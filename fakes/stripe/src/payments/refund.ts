import type { FakeContext } from '../context.js';
import { invalidParam, missing, refused } from '../http/api-error.js';
import type { Params } from '../http/params.js';
import { formatMoney } from '../objects/money.js';
import type { StoredCharge, StoredRefund } from '../objects/stored.js';
import { newId, nowSeconds } from '../store/ids.js';
import { cardFor } from './test-cards.js';

const REASONS = ['duplicate', 'fraudulent', 'requested_by_customer'] as const;
/** How long the two slow test cards take, ms; hours or days at the real service. */
const SLOW_REFUND_MS = 500;

function chargeOf(fake: FakeContext, params: Params): StoredCharge {
  const intentId = params.text('payment_intent');
  const chargeId = params.text('charge');
  if (!intentId && !chargeId) {
    throw invalidParam(
      'One of the following params should be provided for this request: payment_intent or charge.',
      undefined,
      'parameter_missing',
    );
  }
  const intent = intentId ? fake.store.intents.get(intentId) : undefined;
  if (intentId && !intent) throw missing('payment_intent', intentId, 'payment_intent');
  if (intent && intent.status !== 'succeeded') {
    throw refused(`This PaymentIntent (${intent.id}) does not have a successful charge to refund.`, {
      param: 'payment_intent',
    });
  }
  const id = chargeId ?? intent?.latest_charge ?? '';
  const charge = fake.store.charges.get(id);
  if (!charge) throw missing('charge', id, 'charge');
  if (!charge.paid)
    throw refused(`Charge ${charge.id} was not paid and cannot be refunded.`, { param: 'charge' });
  return charge;
}

/** Never more than what is left of the charge. */
function readAmount(params: Params, charge: StoredCharge): number {
  const left = charge.amount_captured - charge.amount_refunded;
  if (left === 0) {
    throw refused(`Charge ${charge.id} has already been refunded.`, { code: 'charge_already_refunded' });
  }
  const amount = params.whole('amount') ?? left;
  if (amount < 1) throw invalidParam('Invalid positive integer', 'amount', 'parameter_invalid_integer');
  if (amount > left) {
    const against = charge.amount_refunded > 0 ? 'unrefunded amount on charge' : 'charge amount';
    throw refused(
      `Refund amount (${formatMoney(amount, charge.currency)}) is greater than ${against} (${formatMoney(left, charge.currency)})`,
      { param: 'amount' },
    );
  }
  return amount;
}

/** Sends money of a paid charge back, all that is left unless told. */
export function createRefund(fake: FakeContext, params: Params): StoredRefund {
  params.only('payment_intent', 'charge', 'amount', 'reason', 'metadata');
  const reason = params.oneOf('reason', REASONS) ?? null;
  const metadata = params.metadata();
  const charge = chargeOf(fake, params);
  const amount = readAmount(params, charge);
  const cardNumber = charge.payment_intent
    ? fake.store.intentDetails.get(charge.payment_intent)?.cardNumber
    : null;
  const fate = cardFor(cardNumber ?? '').refund;
  const refund: StoredRefund = {
    id: newId('re'),
    object: 'refund',
    amount,
    balance_transaction: null,
    charge: charge.id,
    created: nowSeconds(),
    currency: charge.currency,
    customer: charge.customer,
    customer_account: null,
    metadata,
    payment_intent: charge.payment_intent,
    payment_method: charge.payment_method,
    reason,
    receipt_number: null,
    source_transfer_reversal: null,
    status: fate === 'later' ? 'pending' : 'succeeded',
    transfer_reversal: null,
  };
  const before = { amount_refunded: charge.amount_refunded, refunded: charge.refunded };
  fake.store.refunds.set(refund.id, refund);
  charge.amount_refunded += amount;
  charge.refunded = charge.amount_refunded === charge.amount_captured;
  fake.events.emit('refund.created', refund);
  fake.events.emit('charge.refunded', charge, before);
  if (fate) setTimeout(() => finishRefund(fake, refund.id, fate), SLOW_REFUND_MS).unref();
  return refund;
}

/** The later end of a refund to one of the slow test cards. A failed one gives the amount back to the charge. */
export function finishRefund(fake: FakeContext, refundId: string, fate: 'later' | 'fails'): void {
  const refund = fake.store.refunds.get(refundId);
  if (!refund || refund.status === 'failed') return;
  const previous = { status: refund.status };
  if (fate === 'later') {
    refund.status = 'succeeded';
    fake.events.emit('refund.updated', refund, previous);
    return;
  }
  refund.status = 'failed';
  refund.failure_reason = 'expired_or_canceled_card';
  const charge = fake.store.charges.get(refund.charge ?? '');
  if (charge) {
    charge.amount_refunded -= refund.amount;
    charge.refunded = false;
  }
  fake.events.emit('refund.updated', refund, previous);
  fake.events.emit('refund.failed', refund, previous);
}
