import { Module } from '@nestjs/common';

import { OrdersCoreModule } from '../orders/orders-core.module.js';
import { BookingsController } from './bookings.controller.js';
import { BookingsService } from './bookings.service.js';

@Module({ imports: [OrdersCoreModule], controllers: [BookingsController], providers: [BookingsService] })
export class BookingsModule {}
