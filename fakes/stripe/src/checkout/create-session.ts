import type { FakeContext } from '../context.js';
import { invalidParam, missing } from '../http/api-error.js';
import type { Params } from '../http/params.js';
import { formatMoney, MINIMUM_CHARGE } from '../objects/money.js';
import { newSession } from '../objects/new-session.js';
import type { StoredSession } from '../objects/stored.js';
import { nowSeconds } from '../store/ids.js';
import { readLines } from './line-items.js';

const MIN_LIFE_S = 30 * 60;
const MAX_LIFE_S = 24 * 60 * 60;

// prettier-ignore
const KNOWN = [
  'mode', 'line_items', 'success_url', 'cancel_url', 'expires_at', 'customer', 'customer_email', 'customer_creation',
  'client_reference_id', 'metadata', 'payment_intent_data', 'payment_method_types', 'locale', 'submit_type', 'ui_mode',
];

function readUrl(key: string, value: string): string {
  if (!URL.canParse(value) || !/^https?:/.test(value)) {
    throw invalidParam('Not a valid URL', key, 'url_invalid');
  }
  if (value.length > 5000) throw invalidParam('URL must be 5000 characters or less.', key, 'url_invalid');
  return value;
}

/** Between 30 minutes and 24 hours after creation; 24 hours unless told. */
function readExpiry(params: Params, created: number): number {
  const expiresAt = params.whole('expires_at') ?? created + MAX_LIFE_S;
  if (expiresAt < created + MIN_LIFE_S) {
    throw invalidParam(
      'The `expires_at` timestamp must be at least 30 minutes from Checkout Session creation.',
      'expires_at',
    );
  }
  if (expiresAt > created + MAX_LIFE_S) {
    throw invalidParam(
      'The `expires_at` timestamp must be less than 24 hours from Checkout Session creation.',
      'expires_at',
    );
  }
  return expiresAt;
}

function readEmail(params: Params): string | null {
  const email = params.text('customer_email');
  if (email && !/^[^\s@]+@[^\s@]+$/.test(email)) {
    throw invalidParam(`Invalid email address: ${email}`, 'customer_email', 'email_invalid');
  }
  return email ?? null;
}

function readCustomer(fake: FakeContext, params: Params): string | null {
  const customer = params.text('customer');
  if (!customer) return null;
  if (params.has('customer_email')) {
    throw invalidParam('You may only specify one of these parameters: customer, customer_email.', 'customer');
  }
  if (!fake.store.customers.get(customer)) throw missing('customer', customer, 'customer');
  return customer;
}

/** Makes an open session in mode payment from the parameters of the public API. */
export function createSession(fake: FakeContext, params: Params): StoredSession {
  params.only(...KNOWN);
  if (params.needText('mode') !== 'payment')
    throw invalidParam('Invalid mode: this server takes only payment.', 'mode');
  const types = params.texts('payment_method_types');
  if (types.some((type) => type !== 'card')) {
    throw invalidParam('Invalid payment_method_types: this server takes only card.', 'payment_method_types');
  }
  const created = nowSeconds();
  const successUrl = readUrl('success_url', params.needText('success_url'));
  const cancelUrl = params.text('cancel_url');
  const lines = readLines(params);
  const currency = lines[0]?.currency ?? 'gbp';
  const total = lines.reduce((sum, line) => sum + line.amount_total, 0);
  const least = MINIMUM_CHARGE[currency] ?? 1;
  if (total < least) {
    throw invalidParam(
      `The Checkout Session's total amount due must add up to at least ${formatMoney(least, currency)}.`,
      undefined,
      'amount_too_small',
    );
  }
  const intentData = params
    .child('payment_intent_data')
    .only('metadata', 'transfer_group', 'description', 'receipt_email');
  const session = newSession({
    created,
    expiresAt: readExpiry(params, created),
    lines,
    currency,
    total,
    customer: readCustomer(fake, params),
    customerEmail: readEmail(params),
    customerCreation: params.oneOf('customer_creation', ['always', 'if_required']) ?? 'if_required',
    clientReferenceId: params.text('client_reference_id') ?? null,
    metadata: params.metadata(),
    successUrl,
    cancelUrl: cancelUrl === undefined ? null : readUrl('cancel_url', cancelUrl),
    locale: params.text('locale') ?? null,
    submitType: params.text('submit_type') ?? null,
  });
  fake.store.sessions.set(session.id, session);
  fake.store.sessionDetails.set(session.id, {
    lines,
    intentMetadata: intentData.metadata(),
    intentDescription: intentData.text('description') ?? null,
    transferGroup: intentData.text('transfer_group') ?? null,
  });
  fake.sessionClock.set(session.id, session.expires_at);
  return session;
}
