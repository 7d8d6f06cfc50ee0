import { Injectable, Logger, type CanActivate, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';
import { DataSource } from 'typeorm';

import { Account } from '../../accounts/account.entity.js';
import { CommonException } from '../problems/problem.exception.js';
import { ACCESS, type AccessRule } from './access.js';
import { OwnershipService } from './ownership.service.js';

/**
 * Lets nobody in unless the route says who may. "Missing" and "not yours" are the same 404; only a member whose
 * role is too small is told so (403), since a member knows the place exists.
 */
@Injectable()
export class AccessGuard implements CanActivate {
  private readonly logger = new Logger(AccessGuard.name);

  constructor(
    private readonly reflector: Reflector,
    private readonly dataSource: DataSource,
    private readonly ownership: OwnershipService,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const rule = this.reflector.getAllAndOverride<AccessRule | undefined>(ACCESS, [
      context.getHandler(),
      context.getClass(),
    ]);
    const request = context.switchToHttp().getRequest<Request>();
    if (!rule) {
      this.logger.error(`${context.getClass().name}.${context.getHandler().name} declares no access rule`);
      throw new CommonException('not-found');
    }
    request.account = await this.accountOf(request);
    await this.check(rule, request);
    return true;
  }

  private async accountOf(request: Request) {
    const id = request.session?.accountId;
    if (!id) return null;
    return this.dataSource.manager.findOne(Account, {
      select: { id: true, email: true, displayName: true, platformRole: true },
      where: { id },
    });
  }

  private async check(rule: AccessRule, request: Request): Promise<void> {
    switch (rule.kind) {
      case 'public':
        return;
      case 'signed-in':
        this.needAccount(request);
        return;
      case 'platform':
        if (!rule.roles.includes(this.needAccount(request).platformRole))
          throw new CommonException('not-found');
        return;
      case 'member': {
        const account = this.needAccount(request);
        const member = await this.ownership.membership(account.id, param(request, 'orgId'), rule.trade);
        if (!member) throw new CommonException('not-found');
        if (!rule.roles.includes(member.role)) throw new CommonException('role-missing');
        request.member = member;
        return;
      }
      case 'measure-up':
        return this.needHeld(this.ownership.holdsMeasureUp(request, param(request, rule.param)));
      case 'plan':
        return this.needHeld(this.ownership.holdsPlan(request, param(request, rule.param)));
      case 'order':
        return this.needHeld(this.ownership.holdsOrder(request, param(request, rule.param)));
      default:
        rule satisfies never;
    }
  }

  private needAccount(request: Request) {
    if (!request.account) throw new CommonException('sign-in-needed');
    return request.account;
  }

  private async needHeld(held: Promise<boolean>): Promise<void> {
    if (!(await held)) throw new CommonException('not-found');
  }
}

function param(request: Request, name: string): string {
  const value: unknown = request.params[name];
  if (typeof value !== 'string') throw new Error(`the route has no path parameter :${name}`);
  return value;
}
