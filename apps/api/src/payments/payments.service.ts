import { Injectable, Logger } from '@nestjs/common';
import Stripe from 'stripe';
import { DataSource, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { inTransaction } from '../database/in-transaction.js';
import { OrderLifecycle, type ReleaseReason } from '../orders/lifecycle.service.js';
import { Order } from '../orders/order.entity.js';
import { paymentTransitions, step } from '../orders/transitions.js';
import { OutboxHandler, type OutboxDelivery } from '../outbox/outbox-handler.js';
import { Payment } from './payment.entity.js';
import { PaymentsException } from './payments.exception.js';
import { PaymentSessions } from './sessions.service.js';

/** Brings our side to what the payment provider says, never to what a page says. */
@Injectable()
export class PaymentsService {
  private readonly logger = new Logger(PaymentsService.name);

  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    private readonly sessions: PaymentSessions,
  ) {}

  /** Where to pay for a held order. @throws whatever keeps the provider from answering */
  async pageFor(orderId: string): Promise<string> {
    const { url } = await this.sessions.open(orderId);
    if (!url) throw new Error('the session has no page');
    return url;
  }

  /**
   * Ends the session by call, then lets stock and slot go; a session that was paid meanwhile is settled instead.
   * @throws PaymentsException "payment-unavailable" when the provider does not answer; the hold stands then
   */
  async giveUp(orderId: string, reason: ReleaseReason): Promise<void> {
    // Written down first: the provider's own message that the session has ended may overtake us.
    await this.dataSource.manager.update(Order, { id: orderId, state: 'held' }, { releaseReason: reason });
    const session = await this.sessions.end(orderId).catch((cause: unknown) => {
      if (!(cause instanceof Stripe.errors.StripeError)) throw cause;
      throw new PaymentsException('payment-unavailable', {
        cause,
        detail: 'Nothing has changed: stock and date are still held. Try again in a minute.',
      });
    });
    if (session?.status === 'complete') await this.settle(session.id);
    else await this.release(orderId, reason);
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
    const session = await this.sessions.fetch(sessionId);
    const orderId = session.metadata?.order_id;
    if (!orderId) return;
    await inTransaction(this.dataSource, async (manager) => {
      const order = await this.lifecycle.lock(manager, orderId);
      const payment = await manager.findOneByOrFail(Payment, { orderId });
      const agrees = this.agrees(session, order, payment);
      if (session.payment_status === 'paid') {
        if (!agrees) throw new Error('the payment does not agree with the order');
        await this.take(manager, order, payment, session);
      } else if (session.status === 'expired' && agrees && order.state === 'held') {
        await this.lifecycle.release(manager, order, 'expired');
      }
    });
  }

  private async take(
    manager: EntityManager,
    order: Order,
    payment: Payment,
    session: Stripe.Checkout.Session,
  ): Promise<void> {
    if (payment.state === 'paid') return;
    const intent = session.payment_intent;
    payment.state = step(paymentTransitions, payment.state, 'paid');
    payment.paidAt = this.clock.now();
    payment.providerSessionId = session.id;
    payment.providerPaymentIntentId = typeof intent === 'string' ? intent : (intent?.id ?? null);
    await manager.save(payment);
    await this.lifecycle.paid(manager, order);
  }

  /** Session, amount, currency and order are what we asked for. */
  private agrees(session: Stripe.Checkout.Session, order: Order, payment: Payment): boolean {
    const agrees =
      (payment.providerSessionId === null || payment.providerSessionId === session.id) &&
      session.amount_total === payment.amountMinor &&
      session.currency === payment.currency &&
      session.client_reference_id === order.reference;
    if (!agrees) this.logger.error(`session ${session.id} does not agree with order ${order.reference}`);
    return agrees;
  }

  @OutboxHandler('hold-ended')
  async holdEnded({ orderId }: { orderId: string }, _: OutboxDelivery): Promise<void> {
    const order = await this.dataSource.manager.findOneBy(Order, { id: orderId });
    if (order?.state === 'held') await this.giveUp(orderId, 'expired');
  }
}
