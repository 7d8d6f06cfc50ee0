import { Controller, Get } from '@nestjs/common';
import { HealthCheck, HealthCheckService, TypeOrmHealthIndicator } from '@nestjs/terminus';

import { Public } from '../common/access/access.js';
import { Drain } from './drain.js';

@Controller('health')
export class HealthController {
  constructor(
    private readonly health: HealthCheckService,
    private readonly database: TypeOrmHealthIndicator,
    private readonly drain: Drain,
  ) {}

  /** The process answers. */
  @Get('live')
  @Public()
  live(): { status: 'ok' } {
    return { status: 'ok' };
  }

  /** The process can work: the database answers, and we are not on our way out. */
  @Get('ready')
  @Public()
  @HealthCheck()
  ready() {
    return this.health.check([
      () => this.drain.indicate(),
      () => this.database.pingCheck('database', { timeout: 2_000 }),
    ]);
  }
}
