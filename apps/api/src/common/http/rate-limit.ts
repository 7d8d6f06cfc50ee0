import { Inject, Injectable, type DynamicModule, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import {
  InjectThrottlerOptions,
  InjectThrottlerStorage,
  Throttle,
  ThrottlerGuard,
  ThrottlerModule,
  type ThrottlerLimitDetail,
  type ThrottlerModuleOptions,
  type ThrottlerRequest,
  type ThrottlerStorage,
} from '@nestjs/throttler';

import { CONFIG, type Config } from '../../config/config.js';
import { CommonException } from '../problems/problem.exception.js';

const minute = 60_000;

/** Requests per minute, route and address; generous, since a household or a shop shares one address. */
export function rateLimitModule(): DynamicModule {
  return ThrottlerModule.forRoot([{ name: 'default', ttl: minute, limit: 600 }]);
}

/** A tighter limit per minute for what invites guessing: sign-in, reset, finding an order. */
export const TightLimit = (perMinute: number) => Throttle({ default: { ttl: minute, limit: perMinute } });

@Injectable()
export class RateLimitGuard extends ThrottlerGuard {
  constructor(
    @InjectThrottlerOptions() options: ThrottlerModuleOptions,
    @InjectThrottlerStorage() storage: ThrottlerStorage,
    reflector: Reflector,
    @Inject(CONFIG) private readonly config: Config,
  ) {
    super(options, storage, reflector);
  }

  protected override handleRequest(request: ThrottlerRequest): Promise<boolean> {
    return super.handleRequest({ ...request, limit: request.limit * this.config.RATE_LIMIT_SCALE });
  }

  protected override throwThrottlingException(
    _: ExecutionContext,
    detail: ThrottlerLimitDetail,
  ): Promise<void> {
    throw new CommonException('too-many-requests', {
      headers: { 'Retry-After': String(Math.max(1, detail.timeToBlockExpire)) },
    });
  }
}
