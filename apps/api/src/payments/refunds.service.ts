import { Inject, Injectable, Logger } from '@nestjs/common';
import type Stripe from 'stripe';
import { DataSource, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { inTransaction } from '../database/in-transaction.js';
import { OrderLifecycle } from '../orders/lifecycle.service.js';
import type { Order } from '../orders/order.entity.js';
import { RiderMails } from '../orders/rider-mails.service.js';
import { refundTransitions, step } from '../orders/transitions.js';
import { OutboxHandler, type OutboxDelivery } from '../outbox/outbox-handler.js';
import { Refund } from './refund.entity.js';
import { STRIPE } from './stripe-client.js';

/** Money on its way back: asked for from the outbox, done when the provider says that it is. */
@Injectable()
export class RefundsService {
  private readonly logger = new Logger(RefundsService.name);

  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    private readonly mails: RiderMails,
    @Inject(STRIPE) private readonly stripe: Stripe,
  ) {}

  @OutboxHandler('refund')
  async send({ refundId }: { refundId: string }, _: OutboxDelivery): Promise<void> {
    const refund = await this.dataSource.manager.findOne(Refund, {
      where: { id: refundId },
      relations: { payment: true },
    });
    if (!refund || refund.state === 'done') return;
    const intent = refund.payment.providerPaymentIntentId;
    if (!intent) throw new Error('the payment has no intent to refund');
    const sent = await this.stripe.refunds.create(
      { payment_intent: intent, amount: refund.amountMinor, metadata: { refund_id: refund.id } },
      { idempotencyKey: `refund-${refund.id}` },
    );
    await this.settle(sent.id);
  }

  /** Brings our row to what the provider says of this refund; works twice, late and out of order. */
  async settle(providerRefundId: string): Promise<void> {
    const { metadata } = await this.stripe.refunds.retrieve(providerRefundId);
    const refundId = metadata?.refund_id;
    if (!refundId) return;
    await inTransaction(this.dataSource, async (manager) => {
      const { payment } = await manager.findOneOrFail(Refund, {
        where: { id: refundId },
        relations: { payment: true },
      });
      const order = await this.lifecycle.lock(manager, payment.orderId);
      // Asked again under the lock: of two messages at once, the later truth must not be overwritten by the earlier.
      const said = await this.stripe.refunds.retrieve(providerRefundId);
      const refund = await manager.findOneByOrFail(Refund, { id: refundId });
      if (said.amount !== refund.amountMinor || said.currency !== payment.currency) {
        throw new Error('the refund does not agree with ours');
      }
      refund.providerRefundId = said.id;
      if (said.status === 'succeeded') await this.arrived(manager, order, refund);
      else if (said.status === 'failed' || said.status === 'canceled')
        await this.handedBack(manager, order, refund);
      else await manager.save(refund);
    });
  }

  private async arrived(manager: EntityManager, order: Order, refund: Refund): Promise<void> {
    if (refund.state === 'done') return;
    refund.state = step(refundTransitions, refund.state, 'done');
    refund.doneAt = this.clock.now();
    await manager.save(refund);
    const left = await manager.countBy(Refund, { paymentId: refund.paymentId, state: 'pending' });
    if (order.state === 'refunding' && left === 0) {
      await this.lifecycle.setOrder(manager, order, 'refunded', { endedAt: refund.doneAt });
    }
  }

  /** A closed card, say: the money is with us again and still owed, which takes a person to mend. */
  private async handedBack(manager: EntityManager, order: Order, refund: Refund): Promise<void> {
    this.logger.error(`the bank has handed back a refund of order ${order.reference}`);
    if (refund.state === 'done') refund.state = step(refundTransitions, refund.state, 'pending');
    refund.doneAt = null;
    await manager.save(refund);
    if (order.state === 'refunded') {
      await this.lifecycle.setOrder(manager, order, 'refunding', { endedAt: null });
    }
    await this.mails.refundFailed(manager, order, refund);
  }
}
