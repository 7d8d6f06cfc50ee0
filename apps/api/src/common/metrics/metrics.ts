import { Injectable } from '@nestjs/common';
import type { NextFunction, Request, Response } from 'express';
import { collectDefaultMetrics, Histogram, Registry } from 'prom-client';

/** Prometheus figures of this process; requests are counted per route template, never per address. */
@Injectable()
export class Metrics {
  readonly registry = new Registry();
  private readonly requests = new Histogram({
    name: 'http_request_duration_seconds',
    help: 'Time from the first byte of a request to the last byte of its answer',
    labelNames: ['method', 'route', 'status'],
    buckets: [0.005, 0.01, 0.025, 0.05, 0.1, 0.25, 0.5, 1, 2.5, 5],
    registers: [this.registry],
  });

  constructor() {
    collectDefaultMetrics({ register: this.registry });
  }

  /** Express middleware; install before everything that answers. */
  readonly observe = (request: Request, response: Response, next: NextFunction): void => {
    const stop = this.requests.startTimer();
    response.once('finish', () => {
      const template: unknown = (request.route as { path?: unknown } | undefined)?.path;
      const route = typeof template === 'string' ? template : 'page';
      stop({ method: request.method, route, status: response.statusCode });
    });
    next();
  };
}
