import type { FakeContext } from '../context.js';
import type {
  ApiList,
  StoredLine,
  StoredRefund,
  StoredReversal,
  StoredSession,
  StoredTransfer,
} from './stored.js';

/** A session as the API shows it: the address of the payment page only while it can be paid. */
export function presentSession(fake: FakeContext, session: StoredSession): StoredSession {
  return { ...session, url: session.status === 'open' ? `${fake.url}/pay/${session.id}` : null };
}

export function presentLines(fake: FakeContext, sessionId: string): ApiList<StoredLine> {
  const data = fake.store.sessionDetails.get(sessionId)?.lines ?? [];
  return {
    object: 'list',
    data: structuredClone(data),
    has_more: false,
    url: `/v1/checkout/sessions/${sessionId}/line_items`,
  };
}

export function presentRefundsOf(fake: FakeContext, chargeId: string): ApiList<StoredRefund> {
  const data = fake.store.refunds.newest((refund) => refund.charge === chargeId).slice(0, 10);
  return {
    object: 'list',
    data: structuredClone(data),
    has_more: false,
    url: `/v1/charges/${chargeId}/refunds`,
  };
}

export function presentTransfer(
  fake: FakeContext,
  transfer: StoredTransfer,
): StoredTransfer & { reversals: ApiList<StoredReversal> } {
  const data = fake.store.reversals.newest((reversal) => reversal.transfer === transfer.id);
  const reversals: ApiList<StoredReversal> = {
    object: 'list',
    data: data.slice(0, 10),
    has_more: data.length > 10,
    url: `/v1/transfers/${transfer.id}/reversals`,
  };
  return { ...transfer, reversals };
}

/** Any object by its id, as the API shows it and free to be changed; undefined when there is none. */
export function present(fake: FakeContext, id: string): unknown {
  const { store } = fake;
  const session = store.sessions.get(id);
  if (session) return structuredClone(presentSession(fake, session));
  const transfer = store.transfers.get(id);
  if (transfer) return structuredClone(presentTransfer(fake, transfer));
  const tables = [
    store.intents,
    store.charges,
    store.refunds,
    store.customers,
    store.accounts,
    store.reversals,
    store.events,
  ];
  for (const table of tables) {
    const found = table.get(id);
    if (found) return structuredClone(found);
  }
  return undefined;
}
