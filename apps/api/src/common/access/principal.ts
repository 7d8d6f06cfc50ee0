import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';

import type { PlatformRole } from '../../accounts/account.entity.js';
import type { MemberRole } from '../../organisations/organisation-member.entity.js';
import { CommonException } from '../problems/problem.exception.js';

/** The account behind a request. */
export interface CurrentAccountData {
  id: string;
  email: string;
  displayName: string;
  platformRole: PlatformRole;
}

/** The membership on which a `@Member` route was opened. */
export interface CurrentMemberData {
  organisationId: string;
  accountId: string;
  role: MemberRole;
}

declare module 'express-serve-static-core' {
  interface Request {
    account?: CurrentAccountData | null;
    member?: CurrentMemberData;
  }
}

/** The signed-in account, or null for a guest. */
export const MaybeAccount = createParamDecorator(
  (_: unknown, context: ExecutionContext) => context.switchToHttp().getRequest<Request>().account ?? null,
);

/** The signed-in account; for routes that let in nobody else. */
export const CurrentAccount = createParamDecorator((_: unknown, context: ExecutionContext) => {
  const account = context.switchToHttp().getRequest<Request>().account;
  if (!account) throw new CommonException('sign-in-needed');
  return account;
});

/** The membership of the signed-in account in `:orgId`; for `@Member` routes. */
export const CurrentMember = createParamDecorator((_: unknown, context: ExecutionContext) => {
  const member = context.switchToHttp().getRequest<Request>().member;
  if (!member) throw new CommonException('not-found');
  return member;
});
