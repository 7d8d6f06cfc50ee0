import { Module } from '@nestjs/common';

import { PaymentsModule } from '../payments/payments.module.js';
import { PlansModule } from '../plans/plans.module.js';
import { CheckoutController } from './checkout.controller.js';
import { CheckoutService } from './checkout.service.js';

@Module({
  imports: [PlansModule, PaymentsModule],
  controllers: [CheckoutController],
  providers: [CheckoutService],
})
export class CheckoutModule {}
