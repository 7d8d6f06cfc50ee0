import { Module } from '@nestjs/common';

import { OrdersCoreModule } from '../orders/orders-core.module.js';
import { BookingsController } from './bookings.controller.js';
import { BookingsService } from './bookings.service.js';
import { JobSheets } from './job-sheets.service.js';

@Module({
  imports: [OrdersCoreModule],
  controllers: [BookingsController],
  providers: [BookingsService, JobSheets],
})
export class BookingsModule {}
