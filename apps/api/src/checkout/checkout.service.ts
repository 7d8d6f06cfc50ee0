import { isDeepStrictEqual } from 'node:util';

import type { CheckoutBody, CheckoutView } from '@linkfell/contracts';
import { Injectable, Logger } from '@nestjs/common';
import { DataSource, In, MoreThan, type EntityManager } from 'typeorm';

import { CommonException } from '../common/problems/problem.exception.js';
import { inTransaction } from '../database/in-transaction.js';
import { MeasureUp } from '../measure-ups/measure-up.entity.js';
import { poundsText } from '../orders/money-text.js';
import { liveStates, Order } from '../orders/order.entity.js';
import { PaymentsException } from '../payments/payments.exception.js';
import { PaymentsService } from '../payments/payments.service.js';
import { Plan } from '../plans/plan.entity.js';
import { PlansException } from '../plans/plans.exception.js';
import { PlansService } from '../plans/plans.service.js';
import { CheckoutException } from './checkout.exception.js';
import { CheckoutRefusals } from './refusals.service.js';
import { Reservation } from './reservation.service.js';

/** `outdated`: the order that is held is not what is asked for now. */
type Held = { order: Order; outdated: boolean };

/** Turns a plan into an order that is held until it is paid. */
@Injectable()
export class CheckoutService {
  private readonly logger = new Logger(CheckoutService.name);

  constructor(
    private readonly dataSource: DataSource,
    private readonly plans: PlansService,
    private readonly reservation: Reservation,
    private readonly refusals: CheckoutRefusals,
    private readonly payments: PaymentsService,
  ) {}

  /**
   * Holds the plan's order and opens its payment page. Asked twice for the same, the same page; asked for something
   * else by whoever holds the first order, that one makes way.
   * @param holdsOrder whether the caller may see the order with that reference
   * @throws CheckoutException, PlansException, PaymentsException
   */
  async checkout(
    planId: string,
    body: CheckoutBody,
    holdsOrder: (reference: string) => Promise<boolean>,
  ): Promise<CheckoutView & { orderId: string }> {
    let held = await this.hold(planId, body);
    if (held.outdated) {
      // Somebody with the rider's link must not end the rider's own payment.
      if (!(await holdsOrder(held.order.reference))) throw heldElsewhere();
      await this.payments.giveUp(held.order.id, 'replaced');
      held = await this.hold(planId, body);
      if (held.outdated) throw heldElsewhere();
    }
    const { id: orderId, reference } = held.order;
    return { orderId, reference, paymentUrl: await this.openPage(held.order) };
  }

  private async openPage(order: Order): Promise<string> {
    try {
      return await this.payments.pageFor(order.id);
    } catch (cause) {
      this.logger.error(`no session for ${order.reference}: ${String(cause)}`);
      await this.payments.release(order.id, 'payment-unavailable');
      throw new PaymentsException('payment-unavailable', {
        cause,
        detail: 'Nothing was taken and nothing is held. Your plan is kept; try again in a minute.',
      });
    }
  }

  private async hold(planId: string, body: CheckoutBody): Promise<Held> {
    try {
      return await inTransaction(this.dataSource, (manager) => this.holdWithin(manager, planId, body));
    } catch (error) {
      throw await this.refusals.explain(planId, error);
    }
  }

  private async holdWithin(manager: EntityManager, planId: string, body: CheckoutBody): Promise<Held> {
    // One live order per plan: a second press of the button finds the first.
    const plan = await manager.findOne(Plan, { where: { id: planId }, lock: { mode: 'pessimistic_write' } });
    if (!plan) throw new CommonException('not-found');
    const live = await manager.findOneBy(Order, { planId, state: In(liveStates) });
    if (live?.state === 'held') {
      const answered = { id: plan.measureUpId, updatedAt: MoreThan(live.createdAt) };
      const outdated = isOutdated(live, plan, body) || (await manager.existsBy(MeasureUp, answered));
      return { order: live, outdated };
    }
    if (live) throw new PlansException('already-paid', { extensions: { reference: live.reference } });
    const prepared = await this.plans.prepareOrder(planId, manager);
    if (prepared.totalMinor !== body.totalMinor) {
      throw new CheckoutException('price-changed', {
        detail: `It is now ${poundsText(prepared.totalMinor)}. Look at your plan again before you pay.`,
        extensions: { totalMinor: prepared.totalMinor },
      });
    }
    return { order: await this.reservation.make(manager, prepared, body.contact), outdated: false };
  }
}

function isOutdated(order: Order, plan: Plan, { contact, totalMinor }: CheckoutBody): boolean {
  return (
    plan.updatedAt > order.createdAt ||
    order.totalMinor !== totalMinor ||
    !isDeepStrictEqual(order.contact, contact)
  );
}

const heldElsewhere = (): CheckoutException =>
  new CheckoutException('held-elsewhere', {
    detail:
      'Stock and date are held for an order of this plan with other details. Pay or cancel it where it was made, or wait until its hold ends.',
  });
