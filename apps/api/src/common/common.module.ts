import { Global, Module } from '@nestjs/common';

import { Clock } from './clock.js';
import { IdempotencyKeys } from './idempotency/idempotency-keys.service.js';

@Global()
@Module({ providers: [Clock, IdempotencyKeys], exports: [Clock, IdempotencyKeys] })
export class CommonModule {}
