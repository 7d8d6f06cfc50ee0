import { Router } from 'express';
import type { FakeContext } from '../context.js';
import { endpoint } from '../http/endpoint.js';
import { balances } from '../payments/balance.js';

export function balanceRoutes(fake: FakeContext): Router {
  const router = Router();
  router.get(
    '/',
    endpoint(fake, ({ account }) => {
      const rows = [...balances(fake.store, account)].map(([currency, amount]) => ({
        amount,
        currency,
        source_types: { card: amount },
      }));
      const available = rows.length > 0 ? rows : [{ amount: 0, currency: 'gbp', source_types: { card: 0 } }];
      const pending = available.map(({ currency }) => ({ amount: 0, currency, source_types: { card: 0 } }));
      return { object: 'balance', available, livemode: false, pending };
    }),
  );
  return router;
}
