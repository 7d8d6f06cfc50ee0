import { Controller, Inject, Post, Req } from '@nestjs/common';
import type { Request } from 'express';
import type Stripe from 'stripe';
import { DataSource } from 'typeorm';

import { Machine, Public } from '../common/access/access.js';
import { Clock } from '../common/clock.js';
import { Answers } from '../common/validation/answers.js';
import { CONFIG, type Config } from '../config/config.js';
import { PaymentsException } from './payments.exception.js';
import { PaymentsService } from './payments.service.js';
import { RefundsService } from './refunds.service.js';
import { STRIPE } from './stripe-client.js';
import { StripeEvent } from './stripe-event.entity.js';

/** Signatures older than this are refused, seconds. */
const toleranceS = 300;

/** Events are hints: each is checked, kept once, and answered by fetching the truth from the provider. */
@Controller('webhooks/stripe')
export class StripeWebhookController {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly payments: PaymentsService,
    private readonly refunds: RefundsService,
    @Inject(STRIPE) private readonly stripe: Stripe,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  @Post()
  @Public()
  @Machine()
  @Answers(null, 200)
  async receive(@Req() request: Request & { rawBody?: Buffer }): Promise<void> {
    const event = this.verified(request);
    const { manager } = this.dataSource;
    const object = event.data.object as { id?: string };
    await manager
      .createQueryBuilder()
      .insert()
      .into(StripeEvent)
      .values({ id: event.id, type: event.type, objectId: object.id ?? null, receivedAt: this.clock.now() })
      .orIgnore()
      .execute();
    const kept = await manager.findOneByOrFail(StripeEvent, { id: event.id });
    // Processed before: the provider repeats itself. Failed before: it is tried again.
    if (kept.processedAt) return;
    if (object.id && event.type.startsWith('checkout.session.')) await this.payments.settle(object.id);
    if (object.id && event.type.startsWith('refund.')) await this.refunds.settle(object.id);
    await manager.update(StripeEvent, { id: event.id }, { processedAt: this.clock.now() });
  }

  private verified(request: Request & { rawBody?: Buffer }): Stripe.Event {
    try {
      return this.stripe.webhooks.constructEvent(
        request.rawBody ?? Buffer.alloc(0),
        request.get('stripe-signature') ?? '',
        this.config.STRIPE_WEBHOOK_SECRET,
        toleranceS,
      );
    } catch (cause) {
      throw new PaymentsException('bad-signature', { cause });
    }
  }
}
