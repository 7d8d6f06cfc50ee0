import type { ShockFacts } from '@linkfell/fit-engine';
import type { EntityManager } from 'typeorm';

import { Maker } from '../../src/frames/maker.entity.js';
import { Listing } from '../../src/listings/listing.entity.js';
import { CatalogueItem } from '../../src/shocks/catalogue-item.entity.js';
import { ShockModel } from '../../src/shocks/shock-model.entity.js';
import { ShockSize } from '../../src/shocks/shock-size.entity.js';
import { createShop } from './organisation.factory.js';
import { next } from './sequence.js';

export async function createMaker(manager: EntityManager, overrides: Partial<Maker> = {}): Promise<Maker> {
  const n = next();
  return manager.save(
    manager.create(Maker, { id: `maker-${n}`, name: `Maker ${n}`, makes: 'shocks', ...overrides }),
  );
}

/** A plain 230x60 air shock with eyelets; nothing about it is unknown that a check would ask for. */
export function shockFacts(overrides: Partial<ShockFacts> = {}): ShockFacts {
  const source = { kind: 'maker', label: 'Test sheet', date: '2026-01-01' } as const;
  return {
    sizeId: 'test-230x60',
    modelName: 'Test',
    makerName: 'Test',
    sizeKey: '230x60',
    spacedToKeys: [],
    bodyEnd: { kind: 'eyelet', boreMm: 15 },
    shaftEnd: { kind: 'eyelet', boreMm: 15 },
    spring: { kind: 'air', minGaugeKPa: 350, maxGaugeKPa: 2400, chambers: null },
    diameterMm: 46,
    reservoir: null,
    remote: null,
    eBikeApproved: { value: true, source },
    riderLimit: null,
    wayRound: null,
    tune: 'middle',
    massG: 420,
    serviceHours: 100,
    notices: [],
    source,
    ...overrides,
  };
}

/** A shock size with its model, maker and catalogue item. */
export async function createShockSize(
  manager: EntityManager,
  facts: Partial<ShockFacts> = {},
): Promise<ShockSize> {
  const n = next();
  const maker = await createMaker(manager);
  const id = `shock-${n}`;
  const complete = shockFacts({ sizeId: id, makerName: maker.name, modelName: `Shock ${n}`, ...facts });
  await manager.insert(CatalogueItem, { id, kind: 'shock', makerId: maker.id, name: complete.modelName });
  await manager.insert(ShockModel, {
    id: `model-${n}`,
    makerId: maker.id,
    name: complete.modelName,
    spring: complete.spring.kind,
    summary: 'For tests',
  });
  return manager.save(
    manager.create(ShockSize, {
      itemId: id,
      modelId: `model-${n}`,
      sizeKey: complete.sizeKey,
      facts: complete,
    }),
  );
}

/** Five of an item at a shop for £400 each, unless told otherwise. */
export async function createListing(
  manager: EntityManager,
  itemId: string,
  overrides: Partial<Listing> = {},
): Promise<Listing> {
  const shopId = overrides.shopId ?? (await createShop(manager)).id;
  return manager.save(
    manager.create(Listing, {
      shopId,
      itemId,
      priceMinor: 400_00,
      quantity: 5,
      reserved: 0,
      leadDays: 0,
      ...overrides,
    }),
  );
}
