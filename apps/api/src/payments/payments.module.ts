import { Module } from '@nestjs/common';

import { CONFIG, type Config } from '../config/config.js';
import { OrdersCoreModule } from '../orders/orders-core.module.js';
import { PaymentsService } from './payments.service.js';
import { RefundsService } from './refunds.service.js';
import { PaymentSessions } from './sessions.service.js';
import { STRIPE, stripeClient } from './stripe-client.js';
import { StripeWebhookController } from './webhook.controller.js';

@Module({
  imports: [OrdersCoreModule],
  controllers: [StripeWebhookController],
  providers: [
    PaymentsService,
    PaymentSessions,
    RefundsService,
    { provide: STRIPE, inject: [CONFIG], useFactory: (config: Config) => stripeClient(config) },
  ],
  exports: [PaymentsService, OrdersCoreModule],
})
export class PaymentsModule {}
