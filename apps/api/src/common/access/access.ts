import { SetMetadata, type CustomDecorator } from '@nestjs/common';

import type { PlatformRole } from '../../accounts/account.entity.js';
import type { MemberRole } from '../../organisations/organisation-member.entity.js';

/** Who may call a route. A route without a rule can be called by nobody. */
export type AccessRule =
  | { kind: 'public' }
  | { kind: 'signed-in' }
  | { kind: 'platform'; roles: readonly PlatformRole[] }
  /** A member of the organisation in `:orgId`, which must be of that trade. */
  | { kind: 'member'; trade: 'shop' | 'workshop'; roles: readonly MemberRole[] }
  /** Whoever holds the measure-up (by a grant of the session, or as its account) that the path parameter leads to. */
  | { kind: 'measure-up'; param: string }
  | { kind: 'plan'; param: string }
  /** Whoever holds the order whose reference is the path parameter. */
  | { kind: 'order'; param: string };

export const ACCESS = 'linkfell:access';
const rule = (access: AccessRule): CustomDecorator => SetMetadata(ACCESS, access);

/** Anybody, signed in or not. */
export const Public = (): CustomDecorator => rule({ kind: 'public' });

/** Anybody with an account. */
export const SignedIn = (): CustomDecorator => rule({ kind: 'signed-in' });

/** Curators or administrators. */
export const Platform = (...roles: PlatformRole[]): CustomDecorator => rule({ kind: 'platform', roles });

/** Members of the shop or workshop in `:orgId`; all of its roles unless some are named. */
export const Member = (
  trade: 'shop' | 'workshop',
  roles: readonly MemberRole[] = ['owner', 'staff', 'mechanic'],
): CustomDecorator => rule({ kind: 'member', trade, roles });

/** The holder of the measure-up whose id is in `param`. */
export const MeasureUpGrant = (param = 'id'): CustomDecorator => rule({ kind: 'measure-up', param });

/** The holder of the measure-up to which the plan in `param` belongs. */
export const PlanGrant = (param = 'id'): CustomDecorator => rule({ kind: 'plan', param });

/** The holder of the order whose reference is in `param`. */
export const OrderGrant = (param = 'reference'): CustomDecorator => rule({ kind: 'order', param });

/** For machines (webhooks): no cookie is looked at, so the browser's cross-site checks do not apply. */
export const MACHINE = 'linkfell:machine';
export const Machine = (): CustomDecorator => SetMetadata(MACHINE, true);
