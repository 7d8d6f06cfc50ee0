import { Controller, Get, Header, Req } from '@nestjs/common';
import type { Request } from 'express';

import { Public } from '../common/access/access.js';
import { Metrics } from '../common/metrics/metrics.js';
import { CommonException } from '../common/problems/problem.exception.js';

const loopback = new Set(['127.0.0.1', '::1', '::ffff:127.0.0.1']);

/** For a collector on the same machine; from anywhere else, or through a proxy, it is not there. */
@Controller('metrics')
export class MetricsController {
  constructor(private readonly metrics: Metrics) {}

  @Get()
  @Public()
  @Header('Content-Type', 'text/plain; version=0.0.4; charset=utf-8')
  async read(@Req() request: Request): Promise<string> {
    const direct = request.get('x-forwarded-for') === undefined && request.get('forwarded') === undefined;
    if (!direct || !loopback.has(request.socket.remoteAddress ?? '')) throw new CommonException('not-found');
    return this.metrics.registry.metrics();
  }
}
