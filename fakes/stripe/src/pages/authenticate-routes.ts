import { Router, type Response } from 'express';
import { currentSession } from '../checkout/expire.js';
import { successUrl } from '../checkout/pay.js';
import type { FakeContext } from '../context.js';
import { formatMoney } from '../objects/money.js';
import type { StoredIntent } from '../objects/stored.js';
import { answerAuthentication } from '../payments/confirm.js';
import { markup } from './html.js';
import { sendNotice, sendPage } from './layout.js';

/** The address to return to when the intent was made by the API and not by the payment page. */
function returnUrl(intent: StoredIntent, base: string): string {
  const url = new URL(base);
  url.searchParams.set('payment_intent', intent.id);
  url.searchParams.set('payment_intent_client_secret', intent.client_secret ?? '');
  url.searchParams.set('redirect_status', intent.status === 'succeeded' ? 'succeeded' : 'failed');
  return url.href;
}

/** The page that stands for the bank's question (3D Secure): complete or refuse. */
export function authenticateRoutes(fake: FakeContext): Router {
  const router = Router();

  /** The intent, after its session, if it has one, was given the chance to expire. */
  const find = (id: string): StoredIntent | undefined => {
    const sessionId = fake.store.intentDetails.get(id)?.sessionId;
    if (sessionId) currentSession(fake, sessionId);
    return fake.store.intents.get(id);
  };

  const leave = (res: Response, intent: StoredIntent): void => {
    const detail = fake.store.intentDetails.get(intent.id);
    const session = detail?.sessionId ? fake.store.sessions.get(detail.sessionId) : undefined;
    if (session)
      return res.redirect(303, session.status === 'complete' ? successUrl(session) : `/pay/${session.id}`);
    if (detail?.returnUrl) return res.redirect(303, returnUrl(intent, detail.returnUrl));
    sendNotice(res, 200, 'Nothing to confirm', 'You can close this page.');
  };

  router.get('/authenticate/:id', (req, res) => {
    const intent = find(req.params.id);
    if (!intent)
      return sendNotice(res, 404, 'No such payment', 'This address does not belong to any payment.');
    if (intent.status !== 'requires_action') return leave(res, intent);
    sendPage(
      res,
      200,
      'Confirm this test payment',
      markup`<h1>Confirm this test payment</h1>
        <p class="note">This is a test server. No real money moves.</p>
        <p>
          In real life the card's bank would ask here whether it is you who pays
          ${formatMoney(intent.amount, intent.currency)}.
        </p>
        <form method="post" action="/authenticate/${intent.id}">
          <button type="submit" name="outcome" value="complete">Complete</button>
          <button class="quiet" type="submit" name="outcome" value="refuse">Refuse</button>
        </form>`,
    );
  });

  router.post('/authenticate/:id', (req, res) => {
    const intent = find(req.params.id);
    if (!intent)
      return sendNotice(res, 404, 'No such payment', 'This address does not belong to any payment.');
    if (intent.status === 'requires_action') {
      const { outcome } = (req.body ?? {}) as { outcome?: unknown };
      if (outcome !== 'complete' && outcome !== 'refuse')
        return res.redirect(303, `/authenticate/${intent.id}`);
      answerAuthentication(fake, intent, outcome);
      fake.state.touch();
    }
    leave(res, intent);
  });

  return router;
}
