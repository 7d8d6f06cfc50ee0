import { Router } from 'express';
import type { FakeContext } from '../context.js';
import { missing } from '../http/api-error.js';
import { endpoint, type Call } from '../http/endpoint.js';
import { createdWithin, LIST_PARAMS, page } from '../http/list.js';
import type { StoredRefund } from '../objects/stored.js';
import { createRefund } from '../payments/refund.js';

export function refundRoutes(fake: FakeContext): Router {
  const find = ({ path }: Call): StoredRefund => {
    const refund = fake.store.refunds.get(path('id'));
    if (!refund) throw missing('refund', path('id'));
    return refund;
  };
  const router = Router();
  router.post(
    '/',
    endpoint(fake, ({ params }) => createRefund(fake, params)),
  );
  router.get(
    '/',
    endpoint(fake, ({ params }) => {
      const within = createdWithin(params.only(...LIST_PARAMS, 'payment_intent', 'charge'));
      const [intent, charge] = [params.text('payment_intent'), params.text('charge')];
      const rows = fake.store.refunds.newest(
        (refund) =>
          within(refund) &&
          (!intent || refund.payment_intent === intent) &&
          (!charge || refund.charge === charge),
      );
      return page(rows, '/v1/refunds', params);
    }),
  );
  router.get('/:id', endpoint(fake, find));
  router.post(
    '/:id',
    endpoint(fake, (call) => {
      const refund = find(call);
      const previous = { metadata: { ...refund.metadata } };
      refund.metadata = call.params.only('metadata').mergeMetadata(refund.metadata ?? {});
      fake.events.emit('refund.updated', refund, previous);
      return refund;
    }),
  );
  return router;
}
