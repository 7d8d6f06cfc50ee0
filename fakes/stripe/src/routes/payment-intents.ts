import { Router } from 'express';
import type { FakeContext } from '../context.js';
import { ApiError, invalidParam, missing, refused } from '../http/api-error.js';
import { endpoint, type Call } from '../http/endpoint.js';
import { createdWithin, LIST_PARAMS, page } from '../http/list.js';
import type { Params } from '../http/params.js';
import { isCurrency } from '../objects/money.js';
import { newIntent } from '../objects/new-intent.js';
import type { StoredIntent } from '../objects/stored.js';
import { cancelIntent, confirmIntent } from '../payments/confirm.js';
import { numberOfMethod } from '../payments/test-cards.js';
import { nowSeconds } from '../store/ids.js';

// prettier-ignore
const CREATE = [
  'amount', 'currency', 'customer', 'description', 'metadata', 'receipt_email', 'transfer_group', 'confirm',
  'payment_method', 'payment_method_data', 'payment_method_types', 'automatic_payment_methods', 'return_url', 'off_session',
];
const CONFIRM = ['payment_method', 'payment_method_data', 'return_url', 'receipt_email', 'off_session'];
const REASONS = ['duplicate', 'fraudulent', 'requested_by_customer', 'abandoned'] as const;

/** The card number that the parameters name: a public test payment method, or a card sent in full. */
function readCardNumber(params: Params): string | undefined {
  const method = params.text('payment_method');
  if (method) {
    const number = numberOfMethod(method);
    if (!number) throw missing('PaymentMethod', method, 'payment_method');
    return number;
  }
  return params.child('payment_method_data').child('card').text('number');
}

function create(fake: FakeContext, params: Params): StoredIntent {
  params.only(...CREATE);
  const amount = params.needWhole('amount');
  if (amount < 1) throw invalidParam('Invalid positive integer', 'amount', 'parameter_invalid_integer');
  const currency = params.needText('currency').toLowerCase();
  if (!isCurrency(currency)) throw invalidParam(`Invalid currency: ${currency}.`, 'currency');
  const customer = params.text('customer') ?? null;
  if (customer && !fake.store.customers.get(customer)) throw missing('customer', customer, 'customer');
  const cardNumber = readCardNumber(params) ?? null;
  const intent = newIntent({
    amount,
    currency,
    customer,
    description: params.text('description'),
    metadata: params.metadata(),
    receiptEmail: params.text('receipt_email'),
    transferGroup: params.text('transfer_group'),
  });
  if (cardNumber) intent.status = 'requires_confirmation';
  fake.store.intents.set(intent.id, intent);
  const returnUrl = params.text('return_url') ?? null;
  fake.store.intentDetails.set(intent.id, {
    sessionId: null,
    cardNumber,
    cardholder: null,
    email: null,
    returnUrl,
  });
  fake.events.emit('payment_intent.created', intent);
  return params.flag('confirm') ? confirm(fake, intent, cardNumber) : intent;
}

/** Tries the card; a declined one answers 402 with the intent inside the error. */
function confirm(fake: FakeContext, intent: StoredIntent, cardNumber: string | null): StoredIntent {
  if (!cardNumber) {
    throw refused(
      "You cannot confirm this PaymentIntent because it's missing a payment method. Update the PaymentIntent with a payment method and then confirm it again.",
      { code: 'payment_intent_unexpected_state', payment_intent: intent },
    );
  }
  confirmIntent(fake, intent, { number: cardNumber });
  const error = intent.last_payment_error;
  if (!error) return intent;
  throw new ApiError(402, {
    type: 'card_error',
    code: error.code,
    decline_code: error.decline_code,
    message: error.message ?? 'Your card was declined.',
    charge: error.charge,
    payment_intent: structuredClone(intent),
  });
}

function needState(
  fake: FakeContext,
  intent: StoredIntent,
  action: 'confirm' | 'cancel',
  allowed: string[],
): void {
  if (fake.store.intentDetails.get(intent.id)?.sessionId) {
    throw refused(
      `You cannot ${action} this PaymentIntent because it was created by Checkout. Expire the Checkout Session instead.`,
    );
  }
  if (!allowed.includes(intent.status)) {
    throw refused(`You cannot ${action} this PaymentIntent because it has a status of ${intent.status}.`, {
      code: 'payment_intent_unexpected_state',
      payment_intent: structuredClone(intent),
    });
  }
}

export function paymentIntentRoutes(fake: FakeContext): Router {
  const find = ({ path }: Call): StoredIntent => {
    const intent = fake.store.intents.get(path('id'));
    if (!intent) throw missing('payment_intent', path('id'));
    return intent;
  };
  const router = Router();
  router.post(
    '/',
    endpoint(fake, ({ params }) => create(fake, params)),
  );
  router.get(
    '/',
    endpoint(fake, ({ params }) => {
      const within = createdWithin(params.only(...LIST_PARAMS, 'customer'));
      const customer = params.text('customer');
      const rows = fake.store.intents.newest(
        (intent) => within(intent) && (!customer || intent.customer === customer),
      );
      return page(rows, '/v1/payment_intents', params);
    }),
  );
  router.get('/:id', endpoint(fake, find));
  router.post(
    '/:id',
    endpoint(fake, (call) => {
      const intent = find(call);
      call.params.only('metadata', 'description', 'transfer_group');
      intent.metadata = call.params.mergeMetadata(intent.metadata);
      intent.description = call.params.text('description') ?? intent.description;
      intent.transfer_group = call.params.text('transfer_group') ?? intent.transfer_group;
      return intent;
    }),
  );
  router.post(
    '/:id/confirm',
    endpoint(fake, (call) => {
      const intent = find(call);
      needState(fake, intent, 'confirm', ['requires_payment_method', 'requires_confirmation']);
      const detail = fake.store.intentDetails.get(intent.id);
      const number =
        readCardNumber(call.params.only(...CONFIRM)) ??
        (intent.status === 'requires_confirmation' ? detail?.cardNumber : null);
      if (detail) detail.returnUrl = call.params.text('return_url') ?? detail.returnUrl;
      return confirm(fake, intent, number ?? null);
    }),
  );
  router.post(
    '/:id/cancel',
    endpoint(fake, (call) => {
      const intent = find(call);
      needState(fake, intent, 'cancel', [
        'requires_payment_method',
        'requires_confirmation',
        'requires_action',
      ]);
      const reason = call.params.only('cancellation_reason').oneOf('cancellation_reason', REASONS) ?? null;
      cancelIntent(fake, intent, reason, nowSeconds());
      return intent;
    }),
  );
  return router;
}
