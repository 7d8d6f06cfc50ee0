import { Module } from '@nestjs/common';

import { ListingsModule } from '../listings/listings.module.js';
import { WorkshopsModule } from '../workshops/workshops.module.js';
import { FitCostService } from './fit-cost.service.js';
import { SlotsService } from './slots.service.js';

/** Prices and dates, which both the fitting sheet and the plans are made of. */
@Module({
  imports: [ListingsModule, WorkshopsModule],
  providers: [FitCostService, SlotsService],
  exports: [FitCostService, SlotsService, ListingsModule, WorkshopsModule],
})
export class CostsModule {}
