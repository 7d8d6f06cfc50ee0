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
        title: 'Test bike',
        shockName: 'Test 230x60',
        bike: 'Test bike',
        frameSheet: 'Test sheet, version 1',
        entry: '230x60',
        oldShock: 'not described',
        newShock: 'Test 230x60',
        wayRound: 'Body at the frame',
        ends: [],
        spring: {
          kind: 'air',
          say: 'not known yet',
          gaugePsi: null,
          rateLbPerIn: null,
          sag: 'not worked out',
        },
        parts: [],
        work: [],
        tools: [],
        cautions: [],
        selfFitAllowed: true,
        selfFitReason: null,
        riderWeight: 'not told',
        verdict: 'bolts-straight-in',
        drawing: {
          eyeToEyeMm: 230,
          strokeMm: 60,
          bodyEnd: { kind: 'eyelet', boreMm: 15 },
          shaftEnd: { kind: 'eyelet', boreMm: 15 },
          spring: 'air',
          diameterMm: 46,
          reservoir: null,
          remote: false,
        },
      },
      totalMinor: 400_00,
      holdExpiresAt: new Date('2026-03-02T10:01:00Z'),
      ...overrides,
    }),
  );
}
