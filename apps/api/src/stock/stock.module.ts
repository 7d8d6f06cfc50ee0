import { Module } from '@nestjs/common';

import { OrdersCoreModule } from '../orders/orders-core.module.js';
import { ParcelsService } from './parcels.service.js';
import { StockController } from './stock.controller.js';
import { StockService } from './stock.service.js';

@Module({
  imports: [OrdersCoreModule],
  controllers: [StockController],
  providers: [StockService, ParcelsService],
})
export class StockModule {}
