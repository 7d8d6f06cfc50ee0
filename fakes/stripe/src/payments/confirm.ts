import type { FakeContext } from '../context.js';
import { completeSession } from '../checkout/complete.js';
import { newCharge } from '../objects/new-charge.js';
import type { IntentDetail, StoredIntent } from '../objects/stored.js';
import { newId } from '../store/ids.js';
import { cardFor } from './test-cards.js';

export interface CardInPlay {
  number: string;
  cardholder?: string | null;
  email?: string | null;
}

const AUTHENTICATION_FAILED =
  'We are unable to authenticate your payment method. Please choose a different payment method and try again.';

function detailOf(fake: FakeContext, intent: StoredIntent): IntentDetail {
  const known = fake.store.intentDetails.get(intent.id);
  const empty = { sessionId: null, cardNumber: null, cardholder: null, email: null, returnUrl: null };
  return known ?? fake.store.intentDetails.set(intent.id, empty);
}

/** Tries a card. Afterwards the intent's status says how it went: succeeded, requires_action or requires_payment_method. */
export function confirmIntent(fake: FakeContext, intent: StoredIntent, card: CardInPlay): void {
  const detail = detailOf(fake, intent);
  detail.cardNumber = card.number;
  detail.cardholder = card.cardholder ?? null;
  detail.email = card.email ?? intent.receipt_email;
  intent.payment_method = newId('pm');
  intent.last_payment_error = null;
  if (cardFor(card.number).authenticate) {
    intent.status = 'requires_action';
    intent.next_action = {
      type: 'redirect_to_url',
      redirect_to_url: { url: `${fake.url}/authenticate/${intent.id}`, return_url: detail.returnUrl },
    };
    fake.events.emit('payment_intent.requires_action', intent);
    return;
  }
  settle(fake, intent, detail);
}

/** The customer's answer on the confirmation page. Only for an intent that is waiting for one. */
export function answerAuthentication(
  fake: FakeContext,
  intent: StoredIntent,
  outcome: 'complete' | 'refuse',
): void {
  intent.next_action = null;
  if (outcome === 'complete') return settle(fake, intent, detailOf(fake, intent));
  intent.status = 'requires_payment_method';
  intent.payment_method = null;
  intent.last_payment_error = {
    type: 'invalid_request_error',
    code: 'payment_intent_authentication_failure',
    message: AUTHENTICATION_FAILED,
  };
  fake.events.emit('payment_intent.payment_failed', intent);
}

/** Gives the intent up. `reason` as the API names it. */
export function cancelIntent(
  fake: FakeContext,
  intent: StoredIntent,
  reason: StoredIntent['cancellation_reason'],
  at: number,
): void {
  intent.status = 'canceled';
  intent.canceled_at = at;
  intent.cancellation_reason = reason;
  intent.next_action = null;
  fake.events.emit('payment_intent.canceled', intent);
}

function settle(fake: FakeContext, intent: StoredIntent, detail: IntentDetail): void {
  const card = cardFor(detail.cardNumber ?? '');
  const charge = newCharge(intent, detail, card);
  fake.store.charges.set(charge.id, charge);
  intent.latest_charge = charge.id;
  if (card.decline) {
    intent.status = 'requires_payment_method';
    intent.payment_method = null;
    intent.last_payment_error = {
      type: 'card_error',
      charge: charge.id,
      code: card.decline.code,
      decline_code: card.decline.declineCode,
      message: card.decline.message,
    };
    fake.events.emit('charge.failed', charge);
    fake.events.emit('payment_intent.payment_failed', intent);
    return;
  }
  intent.status = 'succeeded';
  intent.amount_received = intent.amount;
  fake.events.emit('charge.succeeded', charge);
  fake.events.emit('payment_intent.succeeded', intent);
  if (detail.sessionId) completeSession(fake, detail.sessionId, detail);
}
