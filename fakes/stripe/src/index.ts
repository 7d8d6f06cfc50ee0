import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { createApp } from './app.js';
import { currentSession } from './checkout/expire.js';
import { SessionClock } from './checkout/session-clock.js';
import type { FakeContext } from './context.js';
import { Faults } from './control/faults.js';
import { RequestLog } from './http/request-log.js';
import { finishRefund } from './payments/refund.js';
import { StateFile } from './store/state-file.js';
import { Store } from './store/store.js';
import { Dispatcher } from './webhooks/dispatcher.js';
import { EventSource } from './webhooks/events.js';

export type { FaultOrder } from './control/faults.js';
export type { LoggedRequest } from './http/request-log.js';
export type { Delivery } from './webhooks/dispatcher.js';

export interface FakeStripeOptions {
  /** 0, the default, takes any free port. */
  port?: number;
  /** The only key that is accepted; sk_test_linkfell unless told. */
  apiKey?: string;
  webhookUrl?: string;
  webhookSecret?: string;
  /** A file that keeps payments over a restart. Without it everything is forgotten at the end. */
  stateFile?: string;
  /** Waits between tries of a webhook after a failed one, in ms. */
  webhookRetryMs?: number[];
}

export interface FakeStripe {
  port: number;
  url: string;
  setWebhook(url: string, secret: string): void;
  close(): Promise<void>;
}

/** Starts the payment service's stand-in on loopback. Rejects when the port is taken. */
export async function startFakeStripe(options: FakeStripeOptions = {}): Promise<FakeStripe> {
  const store = new Store();
  const faults = new Faults();
  const dispatcher = new Dispatcher(faults, options.webhookRetryMs);
  const state = new StateFile(store, options.stateFile);
  const fake: FakeContext = {
    apiKey: options.apiKey ?? 'sk_test_linkfell',
    url: '',
    store,
    state,
    events: new EventSource(store, (event) => {
      dispatcher.enqueue(event);
      state.touch();
    }),
    dispatcher,
    faults,
    log: new RequestLog(),
    sessionClock: new SessionClock((id) => currentSession(fake, id)),
  };
  if (options.webhookUrl)
    dispatcher.endpoint = { url: options.webhookUrl, secret: options.webhookSecret ?? '' };

  state.load();
  const server = createServer(createApp(fake));
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(options.port ?? 0, '127.0.0.1', resolve);
  });
  const { port } = server.address() as AddressInfo;
  fake.url = `http://127.0.0.1:${port}`;
  // What ran out while the server was down expires now, the rest on its own time.
  for (const session of store.sessions.all()) {
    if (currentSession(fake, session.id)?.status === 'open')
      fake.sessionClock.set(session.id, session.expires_at);
  }
  for (const refund of store.refunds.all())
    if (refund.status === 'pending') finishRefund(fake, refund.id, 'later');

  return {
    port,
    url: fake.url,
    setWebhook: (url, secret) => {
      dispatcher.endpoint = { url, secret };
    },
    close: async () => {
      fake.sessionClock.clearAll();
      await dispatcher.close();
      state.close();
      const closed = new Promise((resolve) => server.close(resolve));
      server.closeAllConnections();
      await closed;
    },
  };
}
