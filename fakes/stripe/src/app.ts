import express, { type ErrorRequestHandler, type Express } from 'express';
import type { FakeContext } from './context.js';
import { controlRoutes } from './control/routes.js';
import { unknownRoute } from './http/endpoint.js';
import { authenticateRoutes } from './pages/authenticate-routes.js';
import { sendNotice } from './pages/layout.js';
import { payRoutes } from './pages/pay-routes.js';
import { accountRoutes } from './routes/accounts.js';
import { balanceRoutes } from './routes/balance.js';
import { chargeRoutes } from './routes/charges.js';
import { checkoutSessionRoutes } from './routes/checkout-sessions.js';
import { customerRoutes } from './routes/customers.js';
import { eventRoutes } from './routes/events.js';
import { paymentIntentRoutes } from './routes/payment-intents.js';
import { refundRoutes } from './routes/refunds.js';
import { transferRoutes } from './routes/transfers.js';

const badBody: ErrorRequestHandler = (_error, _req, res, _next) => {
  res
    .status(400)
    .json({ error: { type: 'invalid_request_error', message: 'The request body could not be read.' } });
};

/** The public API under /v1, the hosted pages and, under /_control, what tests steer it with. */
export function createApp(fake: FakeContext): Express {
  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('query parser', 'extended');
  app.use(express.urlencoded({ extended: true, limit: '1mb' }));

  app.use('/v1/checkout/sessions', checkoutSessionRoutes(fake));
  app.use('/v1/payment_intents', paymentIntentRoutes(fake));
  app.use('/v1/charges', chargeRoutes(fake));
  app.use('/v1/refunds', refundRoutes(fake));
  app.use('/v1/customers', customerRoutes(fake));
  app.use('/v1/events', eventRoutes(fake));
  app.use('/v1/accounts', accountRoutes(fake));
  app.use('/v1/transfers', transferRoutes(fake));
  app.use('/v1/balance', balanceRoutes(fake));
  app.use('/v1', unknownRoute);
  app.use('/_control', controlRoutes(fake));
  app.use(payRoutes(fake));
  app.use(authenticateRoutes(fake));
  app.use((_req, res) =>
    sendNotice(res, 404, 'No such page', 'This test server has no page at this address.'),
  );
  app.use(badBody);
  return app;
}
