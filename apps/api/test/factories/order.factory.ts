import type { EntityManager } from 'typeorm';

import { Order } from '../../src/orders/order.entity.js';
import { next } from './sequence.js';

/** A held self-fit order without lines. */
export async function createOrder(manager: EntityManager, overrides: Partial<Order> = {}): Promise<Order> {
  const n = next();
  const contact = {
    name: 'Wren Hollis',
    email: `rider-${n}@example.test`,
    phone: '01632 960123',
    street: '1 Beck Lane',
    town: 'Netherfell',
    postcode: 'ZZ1 1ZZ',
  };
  return manager.save(
    manager.create(Order, {
      reference: `LF-T${String(n).padStart(7, '0')}`,
      state: 'held',
      fit: 'self',
      email: contact.email,
      contact,
      job: {
        judgement: {
          verdict: 'bolts-straight-in',
          answers: [],
          entryId: null,
          wayRound: null,
          reservoirPositionDeg: null,
          parts: [],
          work: [],
          spring: null,
          advice: [],
          selfFitAllowed: true,
        },
      },
      totalMinor: 400_00,
      holdExpiresAt: new Date('2026-03-02T10:01:00Z'),
      ...overrides,
    }),
  );
}
