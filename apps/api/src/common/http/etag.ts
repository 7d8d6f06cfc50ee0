import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request, Response } from 'express';

import { CommonException } from '../problems/problem.exception.js';

const form = /^(?:W\/)?"(\d{1,9})"$/;

/** Puts a row's version on the answer, as `"7"`. */
export function setVersion(response: Response, version: number): void {
  response.setHeader('ETag', `"${version}"`);
}

/**
 * The version that the client says it is changing, from If-Match.
 * @throws CommonException "precondition-missing" (428) without the header, "precondition-failed" (412) if it is no version of ours
 */
export function readIfMatch(request: Request): number {
  const header = request.get('if-match');
  if (header === undefined) throw new CommonException('precondition-missing');
  const match = form.exec(header.trim());
  if (!match) throw new CommonException('precondition-failed');
  return Number(match[1]);
}

/** `@IfMatch() version: number`; compare it in the same UPDATE that changes the row. */
export const IfMatch = createParamDecorator((_: unknown, context: ExecutionContext) =>
  readIfMatch(context.switchToHttp().getRequest<Request>()),
);

/** @throws CommonException "precondition-failed" (412) when somebody else was quicker */
export function needVersion(actual: number, expected: number): void {
  if (actual !== expected) throw new CommonException('precondition-failed');
}
