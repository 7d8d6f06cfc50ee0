import type { EntityManager } from 'typeorm';

import { moveStock } from '../stock/move-stock.js';
import { OrderLine } from './order-line.entity.js';
import type { Order } from './order.entity.js';

/** Item lines in the order of their listings, so that two orders never wait for each other in a circle. */
function stockLines(manager: EntityManager, order: Order): Promise<OrderLine[]> {
  return manager.find(OrderLine, {
    where: { orderId: order.id, kind: 'item' },
    order: { listingId: 'ASC' },
  });
}

/**
 * Reserves all that an order which had been let go needs.
 * @returns false when something is not to be had any more; what was reserved before it is for the caller to roll back
 */
export async function reserveStock(manager: EntityManager, order: Order): Promise<boolean> {
  for (const { listingId, quantity } of await stockLines(manager, order)) {
    const taken = await moveStock(manager, {
      listingId: listingId as string,
      kind: 'reserve',
      quantity: 0,
      reserved: quantity,
      orderId: order.id,
    });
    if (!taken) return false;
  }
  return true;
}

/** Lets all go that the order has reserved. */
export async function freeStock(manager: EntityManager, order: Order): Promise<void> {
  for (const { listingId, quantity } of await stockLines(manager, order)) {
    await moveStock(manager, {
      listingId: listingId as string,
      kind: 'release',
      quantity: 0,
      reserved: -quantity,
      orderId: order.id,
    });
  }
}
