import { Module } from '@nestjs/common';

import { MeasureUpsModule } from '../measure-ups/measure-ups.module.js';
import { CostsModule } from '../plans/costs.module.js';
import { ShocksModule } from '../shocks/shocks.module.js';
import { ClearanceService } from './clearance.service.js';
import { CurvesService } from './curves.service.js';
import { JudgingService } from './judging.service.js';
import { MatchesController } from './matches.controller.js';
import { MatchesService } from './matches.service.js';
import { MatchViewsController } from './views.controller.js';

@Module({
  imports: [MeasureUpsModule, ShocksModule, CostsModule],
  controllers: [MatchesController, MatchViewsController],
  providers: [ClearanceService, CurvesService, JudgingService, MatchesService],
  exports: [JudgingService, MatchesService],
})
export class MatchesModule {}
