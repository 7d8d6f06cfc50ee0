import { Inject, Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';

import { CONFIG, type Config } from '../../config/config.js';
import { MACHINE } from '../access/access.js';
import { CommonException } from '../problems/problem.exception.js';

const readOnly = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * State changes from a browser must come from our own pages. Three independent signs: a header that a foreign
 * page cannot set without a preflight we never grant, the browser's own Sec-Fetch-Site, and Origin.
 * The session cookie's SameSite=Lax is the fourth.
 */
@Injectable()
export class CsrfGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    if (readOnly.has(request.method)) return true;
    if (this.reflector.getAllAndOverride<boolean>(MACHINE, [context.getHandler(), context.getClass()]))
      return true;
    if (request.get('x-linkfell-csrf') !== '1' || !this.sameSite(request))
      throw new CommonException('cross-site');
    return true;
  }

  private sameSite(request: Request): boolean {
    const site = request.get('sec-fetch-site');
    if (site !== undefined && site !== 'same-origin') return false;
    const origin = request.get('origin');
    if (origin === undefined) return true;
    // The page may have been opened under another name of this very host, such as localhost for 127.0.0.1.
    const own = `${request.protocol}://${request.get('host') ?? ''}`;
    return origin === new URL(this.config.PUBLIC_URL).origin || origin === own;
  }
}
