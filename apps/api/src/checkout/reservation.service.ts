import type { CheckoutBody } from '@linkfell/contracts';
import { Inject, Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { CONFIG, type Config } from '../config/config.js';
import { OrderLifecycle } from '../orders/lifecycle.service.js';
import { OrderLine } from '../orders/order-line.entity.js';
import { Order } from '../orders/order.entity.js';
import { Parcel, type ParcelAddress } from '../orders/parcel.entity.js';
import { newReference } from '../orders/reference.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { OutboxService } from '../outbox/outbox.service.js';
import { Payment } from '../payments/payment.entity.js';
import type { PreparedOrder } from '../plans/prepared-order.js';
import { moveStock } from '../stock/move-stock.js';
import { CheckoutException } from './checkout.exception.js';

type Contact = CheckoutBody['contact'];

/** Writes an order that is held: stock, slot, lines, parcels, payment and the end of the hold, in one transaction. */
@Injectable()
export class Reservation {
  constructor(
    private readonly clock: Clock,
    private readonly lifecycle: OrderLifecycle,
    private readonly outbox: OutboxService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** @throws CheckoutException "stock-gone", "slot-taken" */
  async make(manager: EntityManager, prepared: PreparedOrder, contact: Contact): Promise<Order> {
    const order = await this.writeOrder(manager, prepared, contact);
    await this.takeStock(manager, prepared, order);
    if (prepared.booking && !(await this.lifecycle.book(manager, order, prepared.booking))) {
      throw new CheckoutException('slot-taken');
    }
    await this.writeLines(manager, prepared, order);
    await manager.insert(Payment, {
      orderId: order.id,
      state: 'preparing',
      amountMinor: prepared.totalMinor,
      currency: prepared.currency,
      createdAt: order.createdAt,
    });
    await this.outbox.add(
      manager,
      'hold-ended',
      { orderId: order.id },
      { dedupeKey: `hold-ended:${order.id}`, runAt: order.holdExpiresAt },
    );
    return order;
  }

  private writeOrder(manager: EntityManager, prepared: PreparedOrder, contact: Contact): Promise<Order> {
    const now = this.clock.now();
    return manager.save(
      manager.create(Order, {
        reference: newReference(),
        planId: prepared.planId,
        measureUpId: prepared.measureUpId,
        state: 'held',
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
          extensions: { items: [description] },
        });
      }
    }
  }

  private async writeLines(manager: EntityManager, prepared: PreparedOrder, order: Order): Promise<void> {
    const address = await this.addressFor(manager, prepared, order.contact);
    const parcels = new Map<string, string>();
    for (const { shopId, dispatchBy } of prepared.parcels) {
      const parcel = await manager.save(
        manager.create(Parcel, { orderId: order.id, shopId, state: 'held', address, dispatchBy }),
      );
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
    contact: Contact,
  ): Promise<ParcelAddress> {
    if (!booking) return { name: contact.name, lines: [contact.street, contact.town, contact.postcode] };
    const workshop = await manager.findOneOrFail(Organisation, {
      where: { id: booking.workshopId },
      relations: { town: true },
    });
    return { name: workshop.name, lines: [workshop.street, workshop.town.name, workshop.postcode] };
  }
}
