import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import Stripe from 'stripe';
import { afterEach } from 'vitest';
import { startFakeStripe, type FakeStripe, type FakeStripeOptions } from '../../src/index.js';

export const API_KEY = 'sk_test_linkfell';
export const WEBHOOK_SECRET = 'whsec_test_of_ours';

const cleanups: (() => Promise<unknown>)[] = [];
afterEach(async () => {
  for (const cleanup of cleanups.splice(0).reverse()) await cleanup();
});

/** The unmodified SDK, pointed at a fake by host and port alone. */
export function sdk(fake: FakeStripe, apiKey = API_KEY, maxNetworkRetries = 0): Stripe {
  return new Stripe(apiKey, { host: '127.0.0.1', port: fake.port, protocol: 'http', maxNetworkRetries });
}

export interface Control {
  post(path: string, body?: object): Promise<Response>;
  get<T>(path: string): Promise<T>;
}

/** A running fake with its SDK client; ended after the test. */
export async function start(
  options: FakeStripeOptions = {},
): Promise<{ fake: FakeStripe; stripe: Stripe; control: Control }> {
  const fake = await startFakeStripe(options);
  cleanups.push(() => fake.close());
  const control: Control = {
    post: (path, body = {}) =>
      fetch(`${fake.url}/_control${path}`, {
        method: 'POST',
        headers: { 'content-type': 'application/json' },
        body: JSON.stringify(body),
      }),
    get: async <T>(path: string) => (await (await fetch(`${fake.url}/_control${path}`)).json()) as T,
  };
  return { fake, stripe: sdk(fake), control };
}

export interface Received {
  body: string;
  signature: string;
}

/** A webhook endpoint; answers with the statuses given, then 200. */
export async function receiver(
  ...statuses: number[]
): Promise<{ url: string; received: Received[]; types(): string[] }> {
  const received: Received[] = [];
  const server: Server = createServer((req, res) => {
    let body = '';
    req.on('data', (chunk: Buffer) => (body += chunk.toString()));
    req.on('end', () => {
      received.push({ body, signature: String(req.headers['stripe-signature']) });
      res.writeHead(statuses.shift() ?? 200).end();
    });
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  cleanups.push(() => new Promise((resolve) => server.close(resolve).closeAllConnections()));
  const { port } = server.address() as AddressInfo;
  const types = (): string[] => received.map(({ body }) => (JSON.parse(body) as { type: string }).type);
  return { url: `http://127.0.0.1:${port}/hook`, received, types };
}

/** Parameters of a session of 740.00 pounds in two lines. */
export function sessionParams(
  over: Partial<Stripe.Checkout.SessionCreateParams> = {},
): Stripe.Checkout.SessionCreateParams {
  return {
    mode: 'payment',
    line_items: [
      {
        quantity: 1,
        price_data: { currency: 'gbp', unit_amount: 68_000, product_data: { name: 'Air shock 210x55' } },
      },
      {
        quantity: 2,
        price_data: { currency: 'gbp', unit_amount: 3000, product_data: { name: 'Hardware 30x8' } },
      },
    ],
    customer_email: 'rider@example.com',
    client_reference_id: 'order-1',
    metadata: { order: 'order-1' },
    payment_intent_data: { metadata: { order: 'order-1' }, transfer_group: 'group-1' },
    success_url: 'http://127.0.0.1:1/orders/1?session={CHECKOUT_SESSION_ID}',
    cancel_url: 'http://127.0.0.1:1/plans/1?cancelled=1',
    ...over,
  };
}

/** Sends the payment page's form, as a browser would, without following the answer. */
export function payByForm(
  fake: FakeStripe,
  sessionId: string,
  number: string,
  over: Record<string, string> = {},
): Promise<Response> {
  return fetch(`${fake.url}/pay/${sessionId}`, {
    method: 'POST',
    redirect: 'manual',
    body: new URLSearchParams({ number, expiry: '12/40', cvc: '123', name: 'Test Rider', ...over }),
  });
}
