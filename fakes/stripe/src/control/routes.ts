import express, { Router } from 'express';
import { currentSession, expireSession } from '../checkout/expire.js';
import { payForSession, successUrl } from '../checkout/pay.js';
import type { FakeContext } from '../context.js';
import { presentSession } from '../objects/present.js';
import { answerAuthentication } from '../payments/confirm.js';
import { nowSeconds } from '../store/ids.js';
import { API_FAULTS, WEBHOOK_FAULTS, type FaultOrder } from './faults.js';

/** What tests use to make the service misbehave and to look behind it. Not part of the public API. */
export function controlRoutes(fake: FakeContext): Router {
  const router = Router();
  router.use(express.json());

  router.post('/', (req, res) => {
    const order = (req.body ?? {}) as FaultOrder;
    if (!fake.faults.order(order)) {
      return void res
        .status(400)
        .json({ error: `Unknown fault. Known: ${[...API_FAULTS, ...WEBHOOK_FAULTS].join(', ')}` });
    }
    res.json({ pending: fake.faults.pending() });
  });

  router.get('/faults', (_req, res) => void res.json({ pending: fake.faults.pending() }));

  router.post('/reset', (_req, res) => {
    fake.faults.clear();
    fake.sessionClock.clearAll();
    fake.dispatcher.reset();
    fake.store.clear();
    fake.log.clear();
    fake.state.touch();
    res.json({ reset: true });
  });

  router.get('/requests', (_req, res) => void res.json({ requests: fake.log.all() }));

  router.get('/webhooks/deliveries', (_req, res) => {
    res.json({ idle: fake.dispatcher.idle, deliveries: fake.dispatcher.deliveries });
  });

  router.post('/webhooks/endpoint', (req, res) => {
    const { url, secret } = (req.body ?? {}) as { url?: unknown; secret?: unknown };
    if (typeof url !== 'string' || typeof secret !== 'string' || !URL.canParse(url)) {
      return void res.status(400).json({ error: 'Send url and secret.' });
    }
    fake.dispatcher.endpoint = { url, secret };
    res.json({ url });
  });

  router.post('/webhooks/pause', (_req, res) => {
    fake.dispatcher.pause();
    res.json({ paused: true });
  });

  router.post('/webhooks/resume', (_req, res) => {
    fake.dispatcher.resume();
    res.json({ paused: false });
  });

  router.post('/redeliver/:eventId', (req, res) => {
    const event = fake.store.events.get(req.params.eventId);
    if (!event) return void res.status(404).json({ error: 'No such event.' });
    fake.dispatcher.redeliver(event);
    res.json({ redelivered: event.id });
  });

  router.post('/sessions/:id/expire-now', (req, res) => {
    const session = currentSession(fake, req.params.id);
    if (!session) return void res.status(404).json({ error: 'No such session.' });
    if (session.status !== 'open')
      return void res.status(409).json({ error: `The session is ${session.status}.` });
    session.expires_at = nowSeconds();
    expireSession(fake, session);
    fake.state.touch();
    res.json(presentSession(fake, session));
  });

  // Pays as the payment page does, for tests without a browser. `authenticate` answers the bank's question.
  router.post('/sessions/:id/pay', (req, res) => {
    const { number = '4242424242424242', authenticate = 'complete' } = (req.body ?? {}) as Record<
      string,
      string
    >;
    const session = currentSession(fake, req.params.id);
    if (!session) return void res.status(404).json({ error: 'No such session.' });
    if (session.status !== 'open')
      return void res.status(409).json({ error: `The session is ${session.status}.` });
    const intent = payForSession(fake, session, {
      number,
      cardholder: 'Test Rider',
      email: 'rider@example.com',
    });
    if (intent.status === 'requires_action') {
      answerAuthentication(fake, intent, authenticate === 'refuse' ? 'refuse' : 'complete');
    }
    fake.state.touch();
    const paid = intent.status === 'succeeded';
    res.json({
      paid,
      message: intent.last_payment_error?.message ?? null,
      redirect: paid ? successUrl(session) : null,
    });
  });

  return router;
}
