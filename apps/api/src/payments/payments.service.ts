import { Inject, Injectable, Logger } from '@nestjs/common';
import type Stripe from 'stripe';
import { DataSource } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CONFIG, type Config } from '../config/config.js';
import { inTransaction } from '../database/in-transaction.js';
import { OrderLifecycle, type ReleaseReason } from '../orders/lifecycle.service.js';
import { OrderLine } from '../orders/order-line.entity.js';
import { Order } from '../orders/order.entity.js';
import { paymentTransitions, step } from '../orders/transitions.js';
import { OutboxHandler, type OutboxDelivery } from '../outbox/outbox-handler.js';
import { Payment } from './payment.entity.js';
import { Refund } from './refund.entity.js';
import { STRIPE } from './stripe-client.js';

/** The provider lets no session live for less than half an hour; a shorter hold ends it by call. */
const leastSessionMs = 30 * 60_000 + 30_000;

/** Sessions and refunds at the payment provider. What the provider says counts, never what a page says. */
@Injectable()
export class PaymentsService {
  private readonly logger = new Logger(PaymentsService.name);

  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    @Inject(STRIPE) private readonly stripe: Stripe,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /**
   * The open session of an order, made if need be. The idempotency key is the payment's id: an answer that was lost
   * on the way is given again, and no second session is made.
   * @throws the provider's error
   */
  async openSession(orderId: string): Promise<{ id: string; url: string | null }> {
    const { manager } = this.dataSource;
    const order = await manager.findOneByOrFail(Order, { id: orderId });
    const payment = await manager.findOneByOrFail(Payment, { orderId });
    if (payment.providerSessionId) return { id: payment.providerSessionId, url: payment.url };
    const lines = await manager.find(OrderLine, { where: { orderId }, order: { position: 'ASC' } });
    const page = `${this.config.PUBLIC_URL}/orders/${order.reference}`;
    const metadata = { order_id: order.id, reference: order.reference };
    const expires = Math.max(order.holdExpiresAt.getTime(), order.createdAt.getTime() + leastSessionMs);
    const session = await this.stripe.checkout.sessions.create(
      {
        mode: 'payment',
        customer_email: order.email,
        client_reference_id: order.reference,
        metadata,
        payment_intent_data: { metadata, transfer_group: order.reference },
        line_items: lines
          .filter((line) => line.unitMinor > 0)
          .map((line) => ({
            quantity: line.quantity,
            price_data: {
              currency: order.currency,
              unit_amount: line.unitMinor,
              product_data: { name: line.description },
            },
          })),
        expires_at: Math.ceil(expires / 1000),
        success_url: `${page}?paid=1`,
        cancel_url: `${page}?cancelled=1`,
      },
      { idempotencyKey: `session-${payment.id}` },
    );
    await manager.update(
      Payment,
      { id: payment.id, state: 'preparing' },
      { state: 'open', providerSessionId: session.id, url: session.url },
    );
    return { id: session.id, url: session.url };
  }

  /** Ends the session by call, then lets stock and slot go; a session that was paid meanwhile is settled instead. */
  async giveUp(orderId: string, reason: ReleaseReason): Promise<void> {
    const { id } = await this.openSession(orderId);
    const session = await this.stripe.checkout.sessions.retrieve(id);
    if (session.status === 'open') {
      try {
        await this.stripe.checkout.sessions.expire(id, {}, { idempotencyKey: `expire-${id}` });
      } catch (error) {
        // Paid between our two calls: what the provider says now counts.
        const now = await this.stripe.checkout.sessions.retrieve(id);
        if (now.status === 'open') throw error;
        if (now.status === 'complete') return this.settle(id);
      }
    }
    if (session.status === 'complete') return this.settle(id);
    await this.release(orderId, reason);
  }

  /** Lets a held order go; one that is no longer held is left alone. */
  async release(orderId: string, reason: ReleaseReason): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const order = await this.lifecycle.lock(manager, orderId);
      if (order.state === 'held') await this.lifecycle.release(manager, order, reason);
    });
  }

  /** Fetches the session and brings our side to what it says; works twice, late and out of order. */
  async settle(sessionId: string): Promise<void> {
    const session = await this.stripe.checkout.sessions.retrieve(sessionId);
    const orderId = session.metadata?.order_id;
    if (!orderId) return;
    if (session.status === 'expired') return this.release(orderId, 'expired');
    if (session.payment_status !== 'paid') return;
    await inTransaction(this.dataSource, async (manager) => {
      const order = await this.lifecycle.lock(manager, orderId);
      const payment = await manager.findOneByOrFail(Payment, { orderId });
      if (payment.state === 'paid') return;
      if (
        (payment.providerSessionId !== null && payment.providerSessionId !== session.id) ||
        session.amount_total !== payment.amountMinor ||
        session.currency !== payment.currency
      ) {
        this.logger.error(`session ${session.id} does not agree with order ${order.reference}: not settled`);
        throw new Error('the payment does not agree with the order');
      }
      const intent = session.payment_intent;
      payment.state = step(paymentTransitions, payment.state, 'paid');
      payment.paidAt = this.clock.now();
      payment.providerSessionId = session.id;
      payment.providerPaymentIntentId = typeof intent === 'string' ? intent : (intent?.id ?? null);
      await manager.save(payment);
      await this.lifecycle.paid(manager, order);
    });
  }

  @OutboxHandler('hold-ended')
  async holdEnded({ orderId }: { orderId: string }, _: OutboxDelivery): Promise<void> {
    const order = await this.dataSource.manager.findOneBy(Order, { id: orderId });
    if (order?.state === 'held') await this.giveUp(orderId, 'expired');
  }

  @OutboxHandler('refund')
  async sendRefund({ refundId }: { refundId: string }, _: OutboxDelivery): Promise<void> {
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
    await inTransaction(this.dataSource, async (manager) => {
      const order = await this.lifecycle.lock(manager, refund.payment.orderId);
      await manager.update(
        Refund,
        { id: refund.id },
        { state: 'done', providerRefundId: sent.id, doneAt: this.clock.now() },
      );
      const left = await manager.countBy(Refund, { paymentId: refund.paymentId, state: 'pending' });
      if (order.state === 'refunding' && left === 0) {
        await this.lifecycle.setOrder(manager, order, 'refunded', { endedAt: this.clock.now() });
      }
    });
  }
}
