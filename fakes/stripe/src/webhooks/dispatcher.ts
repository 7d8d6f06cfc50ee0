import { setTimeout as sleep } from 'node:timers/promises';
import type { Faults } from '../control/faults.js';
import type { StoredEvent } from '../objects/stored.js';
import { nowSeconds } from '../store/ids.js';
import { signatureHeader } from './signature.js';

/** Waits between tries after a failed one, ms: quick, because both ends run on one machine. */
export const DEFAULT_RETRY_MS = [250, 1000, 3000, 8000];
const ANSWER_TIMEOUT_MS = 10_000;
const KEEP_DELIVERIES = 2000;

export interface Endpoint {
  url: string;
  secret: string;
}

export interface Delivery {
  eventId: string;
  type: string;
  attempt: number;
  /** HTTP status, or null when nothing answered. */
  status: number | null;
  badSignature: boolean;
  at: string;
}

/**
 * Posts events to the one webhook endpoint. First tries go out one after another in the order of the events;
 * a failed one is tried again on its own, so it can be overtaken, as with the real service.
 */
export class Dispatcher {
  endpoint: Endpoint | undefined;
  deliveries: Delivery[] = [];
  private queue: StoredEvent[] = [];
  private held: StoredEvent[] = [];
  private paused = false;
  private busy = false;
  private running = new Set<Promise<void>>();
  private stop = new AbortController();

  constructor(
    private readonly faults: Faults,
    private readonly retryMs: readonly number[] = DEFAULT_RETRY_MS,
  ) {}

  /** Takes a new event. Faults that concern order, number and time of deliveries apply here. */
  enqueue(event: StoredEvent): void {
    if (!this.endpoint) return;
    event.pending_webhooks = 1;
    const fault = this.faults.takeWebhook(event.type);
    if (!fault) return this.push(event);
    switch (fault.fault) {
      case 'webhook-lost':
        return;
      case 'webhook-duplicate':
        return this.push(event, event);
      case 'webhook-late':
        return this.track(this.later(event, fault.delayMs ?? 2000));
      case 'webhook-reversed':
        this.held.push(event);
        // The last of the batch lets all of them go, newest first.
        if (fault.last) this.push(...this.held.splice(0).reverse());
        return;
      case 'webhook-bad-signature':
        return this.track(this.attempts(event, true));
    }
  }

  /** Sends an event once more, properly signed and without any fault. */
  redeliver(event: StoredEvent): void {
    this.push(event);
  }

  pause(): void {
    this.paused = true;
  }

  resume(): void {
    this.paused = false;
    void this.drain();
  }

  /** Nothing queued, held or waiting to be tried again. */
  get idle(): boolean {
    return this.queue.length === 0 && this.held.length === 0 && this.running.size === 0 && !this.busy;
  }

  /** Forgets all that is under way and lets deliveries flow again. The endpoint stays. */
  reset(): void {
    this.stop.abort();
    this.stop = new AbortController();
    this.queue = [];
    this.held = [];
    this.deliveries = [];
    this.paused = false;
  }

  async close(): Promise<void> {
    this.reset();
    this.endpoint = undefined;
    await Promise.allSettled(this.running);
  }

  private push(...events: StoredEvent[]): void {
    this.queue.push(...events);
    void this.drain();
  }

  private async drain(): Promise<void> {
    if (this.busy) return;
    this.busy = true;
    // A turn of the loop first: the answer to the call that caused the event leaves before the event does.
    await sleep(1);
    while (!this.paused && this.queue.length > 0) {
      const event = this.queue.shift();
      const { signal } = this.stop;
      // After a reset the event belongs to a time that is forgotten: no further try.
      if (event && !(await this.post(event, 1, false)) && !signal.aborted)
        this.track(this.attempts(event, false, 2));
    }
    this.busy = false;
  }

  private track(work: Promise<void>): void {
    const tracked = work.catch(() => undefined).finally(() => this.running.delete(tracked));
    this.running.add(tracked);
  }

  private async later(event: StoredEvent, delayMs: number): Promise<void> {
    await sleep(delayMs, undefined, { signal: this.stop.signal });
    await this.attempts(event, false);
  }

  private async attempts(event: StoredEvent, badSignature: boolean, first = 1): Promise<void> {
    const { signal } = this.stop;
    for (let attempt = first; attempt <= this.retryMs.length + 1; attempt += 1) {
      if (attempt > 1) await sleep(this.retryMs[attempt - 2], undefined, { signal });
      if (await this.post(event, attempt, badSignature)) return;
    }
  }

  private async post(event: StoredEvent, attempt: number, badSignature: boolean): Promise<boolean> {
    const { endpoint } = this;
    if (!endpoint) return true;
    const body = JSON.stringify(event, null, 2);
    const secret = badSignature ? `${endpoint.secret}_forged` : endpoint.secret;
    let status: number | null = null;
    try {
      const answer = await fetch(endpoint.url, {
        method: 'POST',
        headers: {
          'content-type': 'application/json; charset=utf-8',
          'stripe-signature': signatureHeader(body, secret, nowSeconds()),
        },
        body,
        redirect: 'manual',
        signal: AbortSignal.any([AbortSignal.timeout(ANSWER_TIMEOUT_MS), this.stop.signal]),
      });
      status = answer.status;
      await answer.arrayBuffer();
    } catch {
      // No answer counts as a failed try; the log shows it as status null.
    }
    this.deliveries.push({
      eventId: event.id,
      type: event.type,
      attempt,
      status,
      badSignature,
      at: new Date().toISOString(),
    });
    if (this.deliveries.length > KEEP_DELIVERIES) this.deliveries.shift();
    const taken = status !== null && status >= 200 && status < 300;
    if (taken) event.pending_webhooks = 0;
    return taken;
  }
}
