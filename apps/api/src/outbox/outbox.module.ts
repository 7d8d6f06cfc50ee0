import { Global, Module } from '@nestjs/common';
import { DiscoveryModule } from '@nestjs/core';

import { OutboxRegistry } from './outbox-registry.js';
import { OutboxRunner } from './outbox-runner.js';
import { OutboxWorker } from './outbox-worker.js';
import { OutboxService } from './outbox.service.js';

@Global()
@Module({
  imports: [DiscoveryModule],
  providers: [OutboxService, OutboxRegistry, OutboxRunner, OutboxWorker],
  exports: [OutboxService, OutboxRegistry, OutboxRunner],
})
export class OutboxModule {}
