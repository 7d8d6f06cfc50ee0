import { Module } from '@nestjs/common';

import { PaymentsModule } from '../payments/payments.module.js';
import { OrdersController } from './orders.controller.js';
import { OrdersService } from './orders.service.js';
import { OrderViews } from './order-view.service.js';
import { OtherWorkshops } from './other-workshops.service.js';

@Module({
  imports: [PaymentsModule],
  controllers: [OrdersController],
  providers: [OrdersService, OrderViews, OtherWorkshops],
})
export class OrdersModule {}
