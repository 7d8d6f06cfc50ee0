import { signInBody } from '@linkfell/contracts';
import { Injectable, type ExecutionContext } from '@nestjs/common';
import { AuthGuard } from '@nestjs/passport';
import type { Request } from 'express';

import { zod } from '../common/validation/zod.pipe.js';

/** Guards run before pipes: the body is checked here, so that the strategy never sees an unchecked one. */
@Injectable()
export class LocalAuthGuard extends AuthGuard('local') {
  override canActivate(context: ExecutionContext) {
    const request = context.switchToHttp().getRequest<Request>();
    request.body = zod(signInBody).transform(request.body, { type: 'body' });
    return super.canActivate(context);
  }
}
