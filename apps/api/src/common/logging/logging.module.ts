import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';

import { LoggerModule } from 'nestjs-pino';
import type { DynamicModule } from '@nestjs/common';

import type { Config } from '../../config/config.js';
import { mask } from './mask.js';

const safeId = /^[\w-]{8,64}$/;

/** The id of a request: the proxy's when it sent a harmless one, else a new one; echoed in X-Request-Id. */
export function requestId(request: IncomingMessage, response: ServerResponse): string {
  const given = request.headers['x-request-id'];
  const id = typeof given === 'string' && safeId.test(given) ? given : randomUUID();
  response.setHeader('X-Request-Id', id);
  return id;
}

const withoutQuery = (url: string | undefined): string => url?.split('?', 1)[0] ?? '';

/** One JSON line per request and event. Bodies, cookies and queries are never logged; addresses are masked. */
export function loggingModule(config: Config): DynamicModule {
  return LoggerModule.forRoot({
    pinoHttp: [
      {
        level: config.LOG_LEVEL,
        genReqId: requestId,
        redact: ['req.headers', 'res.headers', '*.password', '*.token', '*.secret'],
        serializers: {
          req: (request: { id: unknown; method: string; url: string }) => ({
            id: request.id,
            method: request.method,
            path: withoutQuery(request.url),
          }),
          res: (response: { statusCode: number }) => ({ status: response.statusCode }),
        },
        autoLogging: { ignore: (request) => request.url?.startsWith('/health/') ?? false },
        customLogLevel: (_request, response, error) =>
          error || response.statusCode >= 500 ? 'error' : response.statusCode >= 400 ? 'warn' : 'info',
      },
      { write: (line: string) => void process.stdout.write(mask(line)) },
    ],
  });
}
