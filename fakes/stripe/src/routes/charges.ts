import { Router } from 'express';
import type { FakeContext } from '../context.js';
import { missing } from '../http/api-error.js';
import { endpoint } from '../http/endpoint.js';
import { createdWithin, LIST_PARAMS, page } from '../http/list.js';

export function chargeRoutes(fake: FakeContext): Router {
  const router = Router();
  router.get(
    '/',
    endpoint(fake, ({ params }) => {
      const within = createdWithin(
        params.only(...LIST_PARAMS, 'payment_intent', 'customer', 'transfer_group'),
      );
      const [intent, customer, group] = [
        params.text('payment_intent'),
        params.text('customer'),
        params.text('transfer_group'),
      ];
      const rows = fake.store.charges.newest(
        (charge) =>
          within(charge) &&
          (!intent || charge.payment_intent === intent) &&
          (!customer || charge.customer === customer) &&
          (!group || charge.transfer_group === group),
      );
      return page(rows, '/v1/charges', params);
    }),
  );
  router.get(
    '/:id',
    endpoint(fake, ({ path }) => {
      const charge = fake.store.charges.get(path('id'));
      if (!charge) throw missing('charge', path('id'));
      return charge;
    }),
  );
  return router;
}
