import { applyDecorators, SetMetadata, UseInterceptors } from '@nestjs/common';

import { IDEMPOTENT, IdempotencyInterceptor } from './idempotency.interceptor.js';

/**
 * The route needs an Idempotency-Key: the same request with the same key gets the stored answer and does nothing
 * again. `operation` names what is done, so that one key may serve for two different operations.
 */
export const Idempotent = (operation: string) =>
  applyDecorators(SetMetadata(IDEMPOTENT, operation), UseInterceptors(IdempotencyInterceptor));
