import { Router } from 'express';
import { createSession } from '../checkout/create-session.js';
import { currentSession, expireSession } from '../checkout/expire.js';
import type { FakeContext } from '../context.js';
import { missing, refused } from '../http/api-error.js';
import { endpoint, type Call } from '../http/endpoint.js';
import { createdWithin, LIST_PARAMS, page } from '../http/list.js';
import { presentSession } from '../objects/present.js';
import type { StoredSession } from '../objects/stored.js';

export function checkoutSessionRoutes(fake: FakeContext): Router {
  const find = ({ path }: Call): StoredSession => {
    const session = currentSession(fake, path('id'));
    if (!session) throw missing('checkout.session', path('id'));
    return session;
  };
  const router = Router();

  router.post(
    '/',
    endpoint(fake, ({ params }) => presentSession(fake, createSession(fake, params))),
  );
  router.get(
    '/',
    endpoint(fake, ({ params }) => list(fake, params)),
  );
  router.get(
    '/:id',
    endpoint(fake, (call) => presentSession(fake, find(call))),
  );
  router.get(
    '/:id/line_items',
    endpoint(fake, (call) => {
      const session = find(call);
      const lines = fake.store.sessionDetails.get(session.id)?.lines ?? [];
      return page(lines, `/v1/checkout/sessions/${session.id}/line_items`, call.params.only(...LIST_PARAMS));
    }),
  );
  router.post(
    '/:id',
    endpoint(fake, (call) => {
      const session = find(call);
      session.metadata = call.params.only('metadata').mergeMetadata(session.metadata ?? {});
      return presentSession(fake, session);
    }),
  );
  router.post(
    '/:id/expire',
    endpoint(fake, (call) => {
      const session = find(call);
      if (session.status !== 'open') {
        throw refused(
          `Only Checkout Sessions with a status in ["open"] can be expired. This Checkout Session has a status of ${session.status}.`,
        );
      }
      expireSession(fake, session);
      return presentSession(fake, session);
    }),
  );
  return router;
}

function list(fake: FakeContext, params: Call['params']): unknown {
  params.only(...LIST_PARAMS, 'payment_intent', 'customer', 'customer_details', 'status');
  const within = createdWithin(params);
  const intent = params.text('payment_intent');
  const customer = params.text('customer');
  const email = params.child('customer_details').text('email');
  const status = params.text('status');
  // Copied first: looking at a session whose time has passed ends it.
  for (const { id } of fake.store.sessions.all()) currentSession(fake, id);
  const rows = fake.store.sessions.newest(
    (session) =>
      within(session) &&
      (!intent || session.payment_intent === intent) &&
      (!customer || session.customer === customer) &&
      (!email || session.customer_details?.email === email) &&
      (!status || session.status === status),
  );
  return page(
    rows.map((session) => presentSession(fake, session)),
    '/v1/checkout/sessions',
    params,
  );
}
