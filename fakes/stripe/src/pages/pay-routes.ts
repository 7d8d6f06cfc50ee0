import { Router, type Response } from 'express';
import { currentSession } from '../checkout/expire.js';
import { payForSession, successUrl } from '../checkout/pay.js';
import type { FakeContext } from '../context.js';
import type { StoredSession } from '../objects/stored.js';
import {
  checkCardForm,
  digitsOf,
  EMPTY_FORM,
  readCardForm,
  type CardForm,
  type FieldError,
} from './card-form.js';
import { sendNotice, sendPage } from './layout.js';
import { paymentBody, paymentTitle } from './payment-page.js';

/** The page of a session that cannot be paid any more, or never could. */
export function sendClosed(res: Response, session: StoredSession | undefined): void {
  if (!session)
    return sendNotice(res, 404, 'No such payment', 'This address does not belong to any payment.');
  if (session.status === 'complete') {
    return sendNotice(res, 200, 'Already paid', 'This payment is complete. Nothing more is due.', {
      href: successUrl(session),
      label: 'Continue',
    });
  }
  const back = session.cancel_url ? { href: session.cancel_url, label: 'Go back' } : undefined;
  sendNotice(
    res,
    200,
    'This payment page has expired',
    'It can no longer be paid. You have not been charged.',
    back,
  );
}

/** The hosted payment page: a session's lines, the card form and what comes of it. */
export function payRoutes(fake: FakeContext): Router {
  const router = Router();

  const show = (
    res: Response,
    session: StoredSession,
    status = 200,
    form: CardForm = EMPTY_FORM,
    errors: FieldError[] = [],
  ): void => {
    const customer = session.customer ? fake.store.customers.get(session.customer) : undefined;
    const intent = session.payment_intent ? fake.store.intents.get(session.payment_intent) : undefined;
    const page = {
      session,
      lines: fake.store.sessionDetails.get(session.id)?.lines ?? [],
      email: session.customer_email ?? customer?.email ?? null,
      form,
      errors,
      declined: intent?.last_payment_error?.message ?? null,
    };
    sendPage(res, status, paymentTitle(page), paymentBody(page));
  };

  router.get('/pay/:id', (req, res) => {
    const session = currentSession(fake, req.params.id);
    if (session?.status !== 'open') return sendClosed(res, session);
    show(res, session);
  });

  router.post('/pay/:id', (req, res) => {
    const session = currentSession(fake, req.params.id);
    if (!session) return sendClosed(res, session);
    // A second click on Pay: the first one has paid already.
    if (session.status === 'complete') return res.redirect(303, successUrl(session));
    if (session.status !== 'open') return res.redirect(303, `/pay/${session.id}`);
    const form = readCardForm(req.body);
    const customer = session.customer ? fake.store.customers.get(session.customer) : undefined;
    const errors = checkCardForm(form, !session.customer_email && !customer?.email);
    if (errors.length > 0) return show(res, session, 422, form, errors);
    const card = { number: digitsOf(form.number), cardholder: form.name, email: form.email || null };
    const intent = payForSession(fake, session, card);
    fake.state.touch();
    if (intent.status === 'succeeded') return res.redirect(303, successUrl(session));
    if (intent.status === 'requires_action') return res.redirect(303, `/authenticate/${intent.id}`);
    res.redirect(303, `/pay/${session.id}`);
  });

  router.post('/pay/:id/cancel', (req, res) => {
    const session = currentSession(fake, req.params.id);
    // Going back leaves the session open; the shop decides whether to expire it.
    if (!session?.cancel_url) return sendClosed(res, session);
    res.redirect(303, session.cancel_url);
  });

  return router;
}
