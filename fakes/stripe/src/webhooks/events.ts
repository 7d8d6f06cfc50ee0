import { API_VERSION } from '../context.js';
import type { StoredEvent } from '../objects/stored.js';
import { newId, nowSeconds } from '../store/ids.js';
import type { Store } from '../store/store.js';

type Cause = { id: string | null; idempotency_key: string | null };

/** Makes events, keeps them and hands them on for delivery. */
export class EventSource {
  private cause: Cause | null = null;

  constructor(
    private readonly store: Store,
    private readonly deliver: (event: StoredEvent) => void,
  ) {}

  /** Runs synchronous work so that the events it makes name the request that caused them. */
  during<T>(cause: Cause, work: () => T): T {
    this.cause = cause;
    try {
      return work();
    } finally {
      this.cause = null;
    }
  }

  /** Makes an event with a snapshot of the object as it is at this moment. */
  emit(type: string, object: object, previous?: Record<string, unknown>): StoredEvent {
    const event: StoredEvent = {
      id: newId('evt'),
      object: 'event',
      api_version: API_VERSION,
      created: nowSeconds(),
      data: {
        object: structuredClone(object) as Record<string, unknown>,
        ...(previous ? { previous_attributes: previous } : {}),
      },
      livemode: false,
      pending_webhooks: 0,
      request: this.cause ?? { id: null, idempotency_key: null },
      type,
    };
    this.store.events.set(event.id, event);
    this.deliver(event);
    return event;
  }
}
