import type { CheckoutBody, CheckoutView } from '@linkfell/contracts';
import { Inject, Injectable, Logger } from '@nestjs/common';
import { DataSource, In, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CONFIG, type Config } from '../config/config.js';
import { inTransaction } from '../database/in-transaction.js';
import { OrderLifecycle } from '../orders/lifecycle.service.js';
import { OrderLine } from '../orders/order-line.entity.js';
import { poundsText } from '../orders/money-text.js';
import { Order } from '../orders/order.entity.js';
import { Parcel, type ParcelAddress } from '../orders/parcel.entity.js';
import { newReference } from '../orders/reference.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { OutboxService } from '../outbox/outbox.service.js';
import { Payment } from '../payments/payment.entity.js';
import { PaymentsException } from '../payments/payments.exception.js';
import { PaymentsService } from '../payments/payments.service.js';
import { Plan } from '../plans/plan.entity.js';
import { PlansException } from '../plans/plans.exception.js';
import { PlansService } from '../plans/plans.service.js';
import type { PreparedOrder } from '../plans/prepared-order.js';
import { SlotsService } from '../plans/slots.service.js';
import { moveStock } from '../stock/move-stock.js';
import { CheckoutException } from './checkout.exception.js';

/** Turns a plan into an order that is held until it is paid. */
@Injectable()
export class CheckoutService {
  private readonly logger = new Logger(CheckoutService.name);

  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly plans: PlansService,
    private readonly slots: SlotsService,
    private readonly lifecycle: OrderLifecycle,
    private readonly payments: PaymentsService,
    private readonly outbox: OutboxService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async checkout(planId: string, body: CheckoutBody): Promise<CheckoutView & { orderId: string }> {
    const order = await inTransaction(this.dataSource, (manager) => this.hold(manager, planId, body));
    try {
      const { url } = await this.payments.openSession(order.id);
      if (!url) throw new Error('the session has no page');
      return { orderId: order.id, reference: order.reference, paymentUrl: url };
    } catch (cause) {
      this.logger.error(`no session for ${order.reference}: ${String(cause)}`);
      await this.payments.release(order.id, 'payment-unavailable');
      throw new PaymentsException('payment-unavailable', {
        cause,
        detail: 'Nothing was taken and nothing is held. Your plan is kept; try again in a minute.',
      });
    }
  }

  /** Stock, slot, order and the end of the hold, all in one transaction. */
  private async hold(manager: EntityManager, planId: string, body: CheckoutBody): Promise<Order> {
    // One live order per plan: a second press of the button finds the first.
    await manager.findOneOrFail(Plan, { where: { id: planId }, lock: { mode: 'pessimistic_write' } });
    const live = await manager.findOneBy(Order, {
      planId,
      state: In(['held', 'paid', 'completed', 'refunding']),
    });
    if (live?.state === 'held') return live;
    if (live) throw new PlansException('already-paid', { extensions: { reference: live.reference } });
    const prepared = await this.plans.prepareOrder(planId, manager);
    if (prepared.totalMinor !== body.totalMinor) {
      throw new CheckoutException('price-changed', {
        detail: `It is now ${poundsText(prepared.totalMinor)}. Look at your plan again before you pay.`,
        extensions: { totalMinor: prepared.totalMinor },
      });
    }
    return this.reserve(manager, prepared, body);
  }

  private async reserve(
    manager: EntityManager,
    prepared: PreparedOrder,
    { contact }: CheckoutBody,
  ): Promise<Order> {
    const now = this.clock.now();
    const order = await manager.save(
      manager.create(Order, {
        reference: newReference(),
        planId: prepared.planId,
        measureUpId: prepared.measureUpId,
        state: 'held' as const,
        fit: prepared.fit,
        email: contact.email,
        contact,
        job: { ...prepared.job, title: prepared.title, shockName: prepared.shockName },
        currency: prepared.currency,
        totalMinor: prepared.totalMinor,
        holdExpiresAt: new Date(now.getTime() + this.config.HOLD_MINUTES * 60_000),
        createdAt: now,
        version: 1,
      }),
    );
    await this.takeStock(manager, prepared, order);
    await this.takeSlot(manager, prepared, order);
    await this.writeLines(manager, prepared, order, contact);
    await manager.insert(Payment, {
      orderId: order.id,
      state: 'preparing',
      amountMinor: prepared.totalMinor,
      currency: prepared.currency,
      createdAt: now,
    });
    await this.outbox.add(
      manager,
      'hold-ended',
      { orderId: order.id },
      { dedupeKey: `hold-ended:${order.id}`, runAt: order.holdExpiresAt },
    );
    return order;
  }

  /** In the order of the listings' ids, so that two riders never wait for each other in a circle. */
  private async takeStock(manager: EntityManager, prepared: PreparedOrder, order: Order): Promise<void> {
    const items = prepared.lines
      .filter((line) => line.kind === 'item')
      .sort((a, b) => String(a.listingId).localeCompare(String(b.listingId)));
    for (const { listingId, quantity, description } of items) {
      const taken = await moveStock(manager, {
        listingId: listingId as string,
        kind: 'reserve',
        quantity: 0,
        reserved: quantity,
        orderId: order.id,
      });
      if (!taken) {
        throw new CheckoutException('stock-gone', {
          detail: `The last ${description} at this shop has just been sold. Your plan and answers are kept; choose another shop or shock.`,
        });
      }
    }
  }

  private async takeSlot(
    manager: EntityManager,
    { booking, job }: PreparedOrder,
    order: Order,
  ): Promise<void> {
    if (!booking || (await this.lifecycle.book(manager, order, booking))) return;
    const minutes = job.work.reduce((sum, work) => sum + work.minutes, 0);
    // The day before: the same day's other hours are still worth offering.
    const from = new Date(booking.start.getTime() - 86_400_000);
    const free = await this.slots.freeSlots(booking.workshopId, minutes, from, 6, manager);
    throw new CheckoutException('slot-taken', {
      detail: 'Somebody has just taken that date. Your plan and answers are kept; choose another.',
      extensions: {
        slots: free.map(({ start, end }) => ({ start: start.toISOString(), end: end.toISOString() })),
      },
    });
  }

  private async writeLines(
    manager: EntityManager,
    prepared: PreparedOrder,
    order: Order,
    contact: CheckoutBody['contact'],
  ): Promise<void> {
    const address = await this.addressFor(manager, prepared, contact);
    const parcels = new Map<string, string>();
    for (const { shopId, dispatchBy } of prepared.parcels) {
      const parcel = await manager.save(Parcel, {
        orderId: order.id,
        shopId,
        state: 'held' as const,
        address,
        dispatchBy,
      });
      parcels.set(shopId, parcel.id);
    }
    await manager.insert(
      OrderLine,
      prepared.lines.map(({ note: _note, ...line }, position) => ({
        ...line,
        orderId: order.id,
        parcelId: line.kind === 'work' ? null : (parcels.get(line.sellerId) ?? null),
        position,
      })),
    );
  }

  /** To the workshop where one fits it, to the rider otherwise. */
  private async addressFor(
    manager: EntityManager,
    { booking }: PreparedOrder,
    contact: CheckoutBody['contact'],
  ): Promise<ParcelAddress> {
    if (!booking) return { name: contact.name, lines: [contact.street, contact.town, contact.postcode] };
    const workshop = await manager.findOneOrFail(Organisation, {
      where: { id: booking.workshopId },
      relations: { town: true },
    });
    return { name: workshop.name, lines: [workshop.street, workshop.town.name, workshop.postcode] };
  }
}
