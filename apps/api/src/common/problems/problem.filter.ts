import { STATUS_CODES } from 'node:http';

import type { Problem } from '@linkfell/contracts';
import { Catch, HttpException, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { Request, Response } from 'express';

import { ProblemException } from './problem.exception.js';

/** Errors of express and its body parsers: a status of their own, and whether the message may be shown. */
function isHttpError(error: unknown): error is Error & { status: number; expose: boolean } {
  return error instanceof Error && 'status' in error && typeof error.status === 'number' && 'expose' in error;
}

function describe(error: unknown): {
  problem: Problem & Record<string, unknown>;
  headers: Record<string, string>;
} {
  if (error instanceof ProblemException) {
    const { detail, errors, extensions, headers } = error.extras;
    return {
      problem: {
        ...extensions,
        type: `/problems/${error.code}`,
        title: error.title,
        status: error.status,
        code: error.code,
        ...(detail === undefined ? {} : { detail }),
        ...(errors === undefined ? {} : { errors }),
      },
      headers: headers ?? {},
    };
  }
  let status = 500;
  if (error instanceof HttpException) status = error.getStatus();
  else if (isHttpError(error) && error.expose && error.status >= 400 && error.status < 500)
    status = error.status;
  return { problem: { type: 'about:blank', title: STATUS_CODES[status] ?? 'Error', status }, headers: {} };
}

/** Turns everything that is thrown into problem details (RFC 9457); what we did not mean to say stays in the log. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(error: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const request = http.getRequest<Request>();
    const response = http.getResponse<Response>();
    const { problem, headers } = describe(error);
    if (problem.status >= 500) {
      this.logger.error({ err: error, requestId: request.id }, 'request failed');
    }
    if (response.headersSent) {
      response.end();
      return;
    }
    response.set(headers);
    response
      .status(problem.status)
      .type('application/problem+json')
      .send(JSON.stringify({ ...problem, instance: `/requests/${String(request.id)}` }));
  }
}
