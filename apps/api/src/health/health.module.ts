import { Module } from '@nestjs/common';
import { TerminusModule } from '@nestjs/terminus';

import { Metrics } from '../common/metrics/metrics.js';
import { Drain } from './drain.js';
import { HealthController } from './health.controller.js';
import { MetricsController } from './metrics.controller.js';

@Module({
  imports: [TerminusModule.forRoot({ logger: false, errorLogStyle: 'json' })],
  controllers: [HealthController, MetricsController],
  providers: [Metrics, Drain],
})
export class HealthModule {}
