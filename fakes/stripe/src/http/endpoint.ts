import { setTimeout as sleep } from 'node:timers/promises';
import type { Request, RequestHandler, Response } from 'express';
import { API_VERSION, type FakeContext } from '../context.js';
import { newId } from '../store/ids.js';
import { ApiError } from './api-error.js';
import { requireKey } from './auth.js';
import { expand } from './expand.js';
import { Idempotency, type Answer } from './idempotency.js';
import { Params } from './params.js';

export interface Call {
  params: Params;
  /** A value from the path, such as the id. */
  path: (name: string) => string;
  /** The connected account that the call speaks for, if any. */
  account: string | null;
}

/** Does the work of one call and returns the object to answer with. Synchronous, so that each call is atomic. */
export type Handler = (call: Call) => unknown;

/** Wraps a handler in what every call shares: key, log, faults, idempotency, expansion and error objects. */
export function endpoint(fake: FakeContext, handler: Handler): RequestHandler {
  const idempotency = new Idempotency(fake.store);
  return async (req, res) => {
    const requestId = newId('req', 14);
    // Inside a router req.path is only the rest of the address.
    const path = `${req.baseUrl}${req.path}`.replace(/\/$/, '');
    const key = req.method === 'POST' ? (req.get('idempotency-key') ?? null) : null;
    const account = req.get('stripe-account') ?? null;
    const fault = fake.faults.takeApi(req.method, path);
    const entry = fake.log.add({
      id: requestId,
      at: new Date().toISOString(),
      method: req.method,
      path,
      body: req.method === 'GET' ? req.query : (req.body ?? {}),
      idempotencyKey: key,
      account,
      status: null,
      replayed: false,
      fault: fault?.fault ?? null,
    });
    res.set({ 'Request-Id': requestId, 'Stripe-Version': req.get('stripe-version') ?? API_VERSION });
    if (key) res.set('Idempotency-Key', key);

    if (fault?.fault === 'lose-request') return void req.socket.destroy();
    const answer = await answerTo();
    entry.status = answer.status;
    fake.state.touch();
    if (fault?.fault === 'lose-answer') return void req.socket.destroy();
    res.status(answer.status).json(answer.body);

    async function answerTo(): Promise<Answer> {
      try {
        requireKey(req, fake.apiKey);
        if (fault?.fault === 'answer-500-once') return serverError();
        if (fault?.fault === 'answer-429') return tooMany();
        const kept = key
          ? idempotency.claim(`${account ?? ''}:${key}`, path, req.body, requestId)
          : undefined;
        if (kept?.answer) {
          entry.replayed = true;
          res.set({ 'Idempotent-Replayed': 'true', 'Original-Request': kept.requestId });
          return kept.answer;
        }
      } catch (error) {
        return answerFor(error);
      }
      if (fault?.fault === 'slow-answer') await sleep(fault.delayMs ?? 1000);
      const { answer: result, saved } =
        fault?.fault === 'answer-500-saved' ? { answer: serverError(), saved: true } : run();
      if (key && saved) idempotency.keep(`${account ?? ''}:${key}`, result);
      if (key && !saved) idempotency.forget(`${account ?? ''}:${key}`);
      return result;
    }

    function run(): { answer: Answer; saved: boolean } {
      const params = new Params(req.method === 'GET' ? req.query : req.body);
      const pathValue = (name: string): string => String(req.params[name]);
      try {
        const done = fake.events.during({ id: requestId, idempotency_key: key }, () =>
          handler({ params, path: pathValue, account }),
        );
        const body = expand(fake, structuredClone(done), params.texts('expand'));
        return { answer: { status: 200, body }, saved: true };
      } catch (error) {
        return { answer: answerFor(error), saved: !(error instanceof ApiError) || error.saved };
      }
    }

    function answerFor(error: unknown): Answer {
      if (!(error instanceof ApiError)) {
        console.error(error);
        return serverError();
      }
      const { code } = error.body;
      const doc_url = code ? `https://docs.stripe.com/error-codes#${code.replaceAll('_', '-')}` : undefined;
      return {
        status: error.status,
        body: { error: { ...error.body, doc_url, request_log_url: undefined } },
      };
    }
  };
}

function serverError(): Answer {
  return { status: 500, body: { error: { type: 'api_error', message: 'An unknown error occurred.' } } };
}

function tooMany(): Answer {
  return {
    status: 429,
    body: { error: { type: 'invalid_request_error', code: 'rate_limit', message: 'Too many requests.' } },
  };
}

/** The API's answer to an address that it does not have. */
export function unknownRoute(req: Request, res: Response): void {
  const message = `Unrecognized request URL (${req.method}: ${req.originalUrl.split('?')[0]}).`;
  res.set('Request-Id', newId('req', 14));
  res.status(404).json({ error: { type: 'invalid_request_error', message } });
}
