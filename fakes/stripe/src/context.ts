import type { EventSource } from './webhooks/events.js';
import type { Faults } from './control/faults.js';
import type { RequestLog } from './http/request-log.js';
import type { SessionClock } from './checkout/session-clock.js';
import type { StateFile } from './store/state-file.js';
import type { Store } from './store/store.js';
import type { Dispatcher } from './webhooks/dispatcher.js';

/** The API version of this fake's account: the one that the SDK it is tested with was made for. */
export const API_VERSION = '2026-10-28.endive';

/** Everything one running fake consists of; handed to each route. */
export interface FakeContext {
  apiKey: string;
  /** Address of this server, without a slash at the end. Known once it listens. */
  url: string;
  store: Store;
  state: StateFile;
  events: EventSource;
  dispatcher: Dispatcher;
  faults: Faults;
  log: RequestLog;
  sessionClock: SessionClock;
}
