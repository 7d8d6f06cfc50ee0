import { Injectable, type OnModuleInit } from '@nestjs/common';
import { DiscoveryService, MetadataScanner, Reflector } from '@nestjs/core';

import { OUTBOX_TOPIC, type OutboxDelivery } from './outbox-handler.js';

type Deliver = (payload: unknown, delivery: OutboxDelivery) => Promise<void>;

/** Finds the handler of every topic at boot; two for one topic are a mistake. */
@Injectable()
export class OutboxRegistry implements OnModuleInit {
  private readonly handlers = new Map<string, Deliver>();

  constructor(
    private readonly discovery: DiscoveryService,
    private readonly scanner: MetadataScanner,
    private readonly reflector: Reflector,
  ) {}

  onModuleInit(): void {
    for (const { instance } of this.discovery.getProviders()) {
      if (typeof instance !== 'object' || instance === null) continue;
      const provider = instance as Record<string, unknown>;
      for (const name of this.scanner.getAllMethodNames(Object.getPrototypeOf(provider) as object)) {
        const method = provider[name];
        if (typeof method !== 'function') continue;
        const topic = this.reflector.get<string | undefined>(OUTBOX_TOPIC, method);
        if (topic !== undefined) this.register(topic, method.bind(provider) as Deliver);
      }
    }
  }

  /** @throws Error when the topic has a handler already */
  register(topic: string, deliver: Deliver): void {
    if (this.handlers.has(topic)) throw new Error(`two outbox handlers for "${topic}"`);
    this.handlers.set(topic, deliver);
  }

  /** @throws Error when nobody handles the topic, perhaps because a newer release wrote it */
  handlerOf(topic: string): Deliver {
    const deliver = this.handlers.get(topic);
    if (!deliver) throw new Error(`no outbox handler for "${topic}"`);
    return deliver;
  }
}
