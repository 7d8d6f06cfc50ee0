import { SetMetadata } from '@nestjs/common';

export const OUTBOX_TOPIC = 'linkfell:outbox-topic';

/** What a handler is told beside the payload. */
export interface OutboxDelivery {
  /** The same at every try: the idempotency key for whatever is called. */
  id: string;
  topic: string;
  /** 1 at the first try. */
  attempt: number;
}

export type OutboxHandlerFunction = (payload: never, delivery: OutboxDelivery) => Promise<void>;

/**
 * Marks the method of a provider that delivers one topic. It runs at least once per message, perhaps twice and
 * perhaps while an earlier run is still at work, so it must be idempotent. What it throws is tried again later.
 */
export function OutboxHandler(topic: string) {
  return (target: object, key: string, descriptor: TypedPropertyDescriptor<OutboxHandlerFunction>): void => {
    SetMetadata(OUTBOX_TOPIC, topic)(target, key, descriptor as PropertyDescriptor);
  };
}

/** Thrown by a handler when trying again can never help. */
export class GiveUp extends Error {}
