import {
  applyDecorators,
  HttpCode,
  Injectable,
  SetMetadata,
  type CallHandler,
  type ExecutionContext,
  type NestInterceptor,
} from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { map, type Observable } from 'rxjs';
import type { z } from 'zod';

export const ANSWERS = 'linkfell:answers';
export interface AnswersMetadata {
  status: number;
  schema: z.ZodType | null;
}

/**
 * What a route answers when all is well. The body goes out through the contract, so fields that are not
 * part of it never leave, and a body that breaks it is our fault (500), not the client's surprise.
 * `null` for an answer without a body.
 */
export function Answers(schema: z.ZodType | null, status: number = schema === null ? 204 : 200) {
  return applyDecorators(
    HttpCode(status),
    SetMetadata(ANSWERS, { status, schema } satisfies AnswersMetadata),
  );
}

@Injectable()
export class AnswersInterceptor implements NestInterceptor {
  constructor(private readonly reflector: Reflector) {}

  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const answers = this.reflector.get<AnswersMetadata | undefined>(ANSWERS, context.getHandler());
    const schema = answers?.schema;
    if (!schema) return next.handle();
    return next.handle().pipe(map((body: unknown) => schema.parse(body)));
  }
}
