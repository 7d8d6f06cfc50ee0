import { Module } from '@nestjs/common';

import { MeasureUpsModule } from '../measure-ups/measure-ups.module.js';
import { CostsModule } from '../plans/costs.module.js';
import { ShocksModule } from '../shocks/shocks.module.js';
import { JudgingService } from './judging.service.js';
import { MatchesController } from './matches.controller.js';
import { MatchesService } from './matches.service.js';

@Module({
  imports: [MeasureUpsModule, ShocksModule, CostsModule],
  controllers: [MatchesController],
  providers: [JudgingService, MatchesService],
  exports: [JudgingService, MatchesService],
})
export class MatchesModule {}
