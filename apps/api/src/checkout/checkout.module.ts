import { Module } from '@nestjs/common';

import { PaymentsModule } from '../payments/payments.module.js';
import { PlansModule } from '../plans/plans.module.js';
import { CheckoutController } from './checkout.controller.js';
import { CheckoutService } from './checkout.service.js';
import { CheckoutRefusals } from './refusals.service.js';
import { Reservation } from './reservation.service.js';

@Module({
  imports: [PlansModule, PaymentsModule],
  controllers: [CheckoutController],
  providers: [CheckoutService, CheckoutRefusals, Reservation],
})
export class CheckoutModule {}
