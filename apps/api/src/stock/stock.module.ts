import { Module } from '@nestjs/common';

import { OrdersCoreModule } from '../orders/orders-core.module.js';
import { StockController } from './stock.controller.js';
import { StockService } from './stock.service.js';

@Module({ imports: [OrdersCoreModule], controllers: [StockController], providers: [StockService] })
export class StockModule {}
