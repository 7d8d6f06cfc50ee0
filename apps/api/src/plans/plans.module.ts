import { Module } from '@nestjs/common';

import { MatchesModule } from '../matches/matches.module.js';
import { CostsModule } from './costs.module.js';
import { PlansController } from './plans.controller.js';
import { PlansService } from './plans.service.js';

@Module({
  imports: [MatchesModule, CostsModule],
  controllers: [PlansController],
  providers: [PlansService],
  exports: [PlansService, CostsModule],
})
export class PlansModule {}
