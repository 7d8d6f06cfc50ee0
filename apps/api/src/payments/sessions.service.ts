import { Inject, Injectable } from '@nestjs/common';
import Stripe from 'stripe';
import { DataSource } from 'typeorm';

import { CONFIG, type Config } from '../config/config.js';
import { OrderLine } from '../orders/order-line.entity.js';
import { Order } from '../orders/order.entity.js';
import { Payment } from './payment.entity.js';
import { STRIPE } from './stripe-client.js';

/** The provider lets no session live for less than half an hour; a shorter hold ends it by call. */
const leastSessionMs = 30 * 60_000 + 30_000;

/** The provider's hosted payment pages. */
@Injectable()
export class PaymentSessions {
  constructor(
    private readonly dataSource: DataSource,
    @Inject(STRIPE) private readonly stripe: Stripe,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /**
   * The open session of an order, made if need be. The idempotency key is the payment's id: an answer that was lost
   * on the way is given again, and no second session is made.
   * @throws the provider's error
   */
  async open(orderId: string): Promise<{ id: string; url: string | null }> {
    const { manager } = this.dataSource;
    const order = await manager.findOneByOrFail(Order, { id: orderId });
    const payment = await manager.findOneByOrFail(Payment, { orderId });
    if (payment.providerSessionId) return { id: payment.providerSessionId, url: payment.url };
    const lines = await manager.find(OrderLine, { where: { orderId }, order: { position: 'ASC' } });
    const session = await this.stripe.checkout.sessions.create(this.request(order, lines), {
      idempotencyKey: `session-${payment.id}`,
    });
    await manager.update(
      Payment,
      { id: payment.id, state: 'preparing' },
      { state: 'open', providerSessionId: session.id, url: session.url },
    );
    return { id: session.id, url: session.url };
  }

  fetch(id: string): Promise<Stripe.Checkout.Session> {
    return this.stripe.checkout.sessions.retrieve(id);
  }

  /**
   * Ends the order's session by call, so that no card can be tried any more.
   * @returns what the provider says of it afterwards; null when there never was one
   * @throws the provider's error
   */
  async end(orderId: string): Promise<Stripe.Checkout.Session | null> {
    const id = await this.find(orderId);
    if (id === null) return null;
    const session = await this.fetch(id);
    if (session.status !== 'open') return session;
    try {
      return await this.stripe.checkout.sessions.expire(id, {}, { idempotencyKey: `expire-${id}` });
    } catch (error) {
      // Paid between our two calls, perhaps: what the provider says now counts.
      const now = await this.fetch(id);
      if (now.status === 'open') throw error;
      return now;
    }
  }

  /** A process that died between the commit and the call has left no id: asking again finds the session, or makes it. */
  private async find(orderId: string): Promise<string | null> {
    try {
      return (await this.open(orderId)).id;
    } catch (error) {
      // Refused because its time would be too short by now: so there was none under this key.
      if (error instanceof Stripe.errors.StripeInvalidRequestError) return null;
      throw error;
    }
  }

  /** The same at every call for one order, as the idempotency key asks. */
  private request(order: Order, lines: readonly OrderLine[]): Stripe.Checkout.SessionCreateParams {
    const page = `${this.config.PUBLIC_URL}/orders/${order.reference}`;
    const metadata = { order_id: order.id, reference: order.reference };
    const expires = Math.max(order.holdExpiresAt.getTime(), order.createdAt.getTime() + leastSessionMs);
    return {
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
    };
  }
}
