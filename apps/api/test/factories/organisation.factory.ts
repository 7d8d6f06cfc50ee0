import type { EntityManager } from 'typeorm';

import type { Account } from '../../src/accounts/account.entity.js';
import { OrganisationMember, type MemberRole } from '../../src/organisations/organisation-member.entity.js';
import { Organisation } from '../../src/organisations/organisation.entity.js';
import { Town } from '../../src/organisations/town.entity.js';
import { Stand } from '../../src/workshops/stand.entity.js';
import { WorkshopHours } from '../../src/workshops/workshop-hours.entity.js';
import { WorkshopService } from '../../src/workshops/workshop-service.entity.js';
import { createAccount } from './account.factory.js';
import { next } from './sequence.js';

export async function createTown(manager: EntityManager, overrides: Partial<Town> = {}): Promise<Town> {
  const n = next();
  return manager.save(
    manager.create(Town, {
      id: `town-${n}`,
      name: `Town ${n}`,
      latitude: 54.5,
      longitude: -2.9,
      ...overrides,
    }),
  );
}

/** A shop that dispatches on weekdays before 14:00; carriage and VAT as the schema has them. */
export async function createShop(
  manager: EntityManager,
  overrides: Partial<Organisation> = {},
): Promise<Organisation> {
  const n = next();
  const townId = overrides.townId ?? (await createTown(manager)).id;
  return manager.save(
    manager.create(Organisation, {
      id: `organisation-${n}`,
      name: `Organisation ${n}`,
      isShop: true,
      isWorkshop: false,
      email: `organisation-${n}@example.test`,
      phone: '01632 960000',
      street: `${n} Mill Street`,
      townId,
      postcode: 'ZZ1 1ZZ',
      latitude: 54.5,
      longitude: -2.9,
      vatNumber: `GB${String(100_000_000 + n)}`,
      ...overrides,
    }),
  );
}

/** A workshop with one stand, open Monday to Friday 09:00 to 17:00, that fits shocks in an hour for £45. */
export async function createWorkshop(
  manager: EntityManager,
  overrides: Partial<Organisation> = {},
): Promise<Organisation> {
  const workshop = await createShop(manager, { isShop: false, isWorkshop: true, ...overrides });
  const organisationId = workshop.id;
  await manager.insert(Stand, { id: `${organisationId}-stand-1`, organisationId, name: 'Stand 1' });
  await manager.insert(
    WorkshopHours,
    [1, 2, 3, 4, 5].map((weekday) => ({ organisationId, weekday, opens: '09:00', closes: '17:00' })),
  );
  await manager.insert(WorkshopService, {
    organisationId,
    workId: 'fit-shock',
    minutes: 60,
    priceMinor: 45_00,
  });
  return workshop;
}

/** A new account with that role in the organisation. */
export async function createMember(
  manager: EntityManager,
  organisation: Organisation,
  role: MemberRole,
  overrides: Partial<Account> = {},
): Promise<Account> {
  const account = await createAccount(manager, overrides);
  await manager.insert(OrganisationMember, { organisationId: organisation.id, accountId: account.id, role });
  return account;
}
