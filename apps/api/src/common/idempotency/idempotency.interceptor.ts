import { createHash } from 'node:crypto';

import { Injectable, type CallHandler, type ExecutionContext, type NestInterceptor } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request, Response } from 'express';
import { from, lastValueFrom, type Observable } from 'rxjs';

import { CommonException } from '../problems/problem.exception.js';
import { IdempotencyKeys, type KeyedRequest } from './idempotency-keys.service.js';

/** Metadata key of `@Idempotent`; kept apart from the decorator, which needs this file. */
export const IDEMPOTENT = 'linkfell:idempotent';

const form = /^[\x21-\x7e]{8,128}$/;
const sha256 = (text: string): string => createHash('sha256').update(text).digest('hex');

/** The same JSON whatever the order of the keys. */
function canonical(value: unknown): string {
  return JSON.stringify(value, (_key, part: unknown) =>
    typeof part === 'object' && part !== null && !Array.isArray(part)
      ? Object.fromEntries(Object.entries(part).sort(([a], [b]) => (a < b ? -1 : 1)))
      : part,
  );
}

@Injectable()
export class IdempotencyInterceptor implements NestInterceptor {
  constructor(
    private readonly reflector: Reflector,
    private readonly keys: IdempotencyKeys,
  ) {}

  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const http = context.switchToHttp();
    const operation = this.reflector.get<string>(IDEMPOTENT, context.getHandler());
    return from(this.once(keyed(http.getRequest<Request>(), operation), http.getResponse<Response>(), next));
  }

  private async once(request: KeyedRequest, response: Response, next: CallHandler): Promise<unknown> {
    const stored = await this.keys.begin(request);
    if (stored) {
      response.status(stored.status).setHeader('Idempotency-Replayed', 'true');
      return stored.response;
    }
    let answer: unknown;
    try {
      answer = await lastValueFrom(next.handle(), { defaultValue: undefined });
    } catch (error) {
      await this.keys.release(request);
      throw error;
    }
    await this.keys.finish(request, response.statusCode, answer);
    return answer;
  }
}

function keyed(request: Request, operation: string): KeyedRequest {
  const key = request.get('idempotency-key');
  if (key === undefined || !form.test(key)) throw new CommonException('idempotency-key-missing');
  const actor = request.account ? `account:${request.account.id}` : `session:${sha256(request.sessionID)}`;
  return { actor, operation, key, requestHash: sha256(`${request.originalUrl}\n${canonical(request.body)}`) };
}
