import { createAccount } from '../factories/account.factory.js';
import { createMeasureUp } from '../factories/measure-up.factory.js';
import { createOrder } from '../factories/order.factory.js';
import { createMember, createShop, createWorkshop } from '../factories/organisation.factory.js';
import { createPlan } from '../factories/plan.factory.js';
import type { AccessRule } from '../../src/common/access/access.js';
import type { Role } from '../e2e/access-table.js';
import type { TestApp } from './app.js';
import type { Client } from './client.js';
import { guestWith } from './guest.js';
import { signedIn } from './sign-in.js';

export interface AccessWorld {
  browsers: Record<Role, Client>;
  /** The route's address with the ids of this world in it. */
  address(path: string, rule: AccessRule | null): string;
}

/** One browser per role, and one of everything that a route may be about. */
export async function createAccessWorld(app: TestApp): Promise<AccessWorld> {
  const { manager } = app;
  const [shop, otherShop] = [await createShop(manager), await createShop(manager)];
  const [workshop, otherWorkshop] = [await createWorkshop(manager), await createWorkshop(manager)];
  const rider = await createAccount(manager);
  const measureUp = await createMeasureUp(manager, {}, { accountId: rider.id });
  const plan = await createPlan(manager, { measureUpId: measureUp.id });
  const order = await createOrder(manager, { planId: plan.id, measureUpId: measureUp.id });
  const measureUps = [measureUp.id];

  const browsers: Record<Role, Client> = {
    anonymous: app.client(),
    'measure-up guest': await guestWith(app, { measureUps }),
    guest: await guestWith(app, { measureUps, orders: [order.id] }),
    rider: await signedIn(app, rider),
    'other rider': await signedIn(app, await createAccount(manager)),
    'shop staff': await signedIn(app, await createMember(manager, shop, 'staff')),
    'shop owner': await signedIn(app, await createMember(manager, shop, 'owner')),
    'other shop owner': await signedIn(app, await createMember(manager, otherShop, 'owner')),
    mechanic: await signedIn(app, await createMember(manager, workshop, 'mechanic')),
    'workshop owner': await signedIn(app, await createMember(manager, workshop, 'owner')),
    'other workshop owner': await signedIn(app, await createMember(manager, otherWorkshop, 'owner')),
    curator: await signedIn(app, await createAccount(manager, { platformRole: 'curator' })),
    administrator: await signedIn(app, await createAccount(manager, { platformRole: 'administrator' })),
  };

  const idFor = (param: string, rule: AccessRule | null): string => {
    if (rule?.kind === 'member' && param === 'orgId') return rule.trade === 'shop' ? shop.id : workshop.id;
    if (rule?.kind === 'measure-up' && param === rule.param) return measureUp.id;
    if (rule?.kind === 'plan' && param === rule.param) return plan.id;
    if (rule?.kind === 'order' && param === rule.param) return order.reference;
    return '00000000-0000-4000-8000-000000000000';
  };
  return {
    browsers,
    address: (path, rule) => path.replace(/:(\w+)/g, (_, param: string) => idFor(param, rule)),
  };
}
