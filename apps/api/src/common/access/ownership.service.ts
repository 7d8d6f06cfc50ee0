import { Injectable } from '@nestjs/common';
import { isUUID } from './uuid.js';
import type { Request } from 'express';
import { DataSource } from 'typeorm';

import { MeasureUp } from '../../measure-ups/measure-up.entity.js';
import { OrganisationMember } from '../../organisations/organisation-member.entity.js';
import { Order } from '../../orders/order.entity.js';
import { Plan } from '../../plans/plan.entity.js';
import { GrantsService } from './grants.service.js';
import type { CurrentMemberData } from './principal.js';

/** Answers "may this request touch that one?" from grants and rows; never says why not. */
@Injectable()
export class OwnershipService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly grants: GrantsService,
  ) {}

  async holdsMeasureUp(request: Request, id: string): Promise<boolean> {
    if (!isUUID(id)) return false;
    // The grant is honoured only while the measure-up exists, which the feature's own read finds out.
    if (this.grants.hasMeasureUp(request, id)) return true;
    if (!request.account) return false;
    return this.dataSource.manager.existsBy(MeasureUp, { id, accountId: request.account.id });
  }

  async holdsPlan(request: Request, id: string): Promise<boolean> {
    if (!isUUID(id)) return false;
    const plan = await this.dataSource.manager.findOne(Plan, {
      select: { measureUpId: true },
      where: { id },
    });
    return plan !== null && this.holdsMeasureUp(request, plan.measureUpId);
  }

  async holdsOrder(request: Request, reference: string): Promise<boolean> {
    const order = await this.dataSource.manager.findOne(Order, {
      select: { id: true, measureUpId: true },
      where: { reference },
    });
    if (!order) return false;
    if (this.grants.hasOrder(request, order.id)) return true;
    // A link to a measure-up opens that measure-up only: its guests do not see the order, its account does.
    if (!request.account || !order.measureUpId) return false;
    return this.dataSource.manager.existsBy(MeasureUp, {
      id: order.measureUpId,
      accountId: request.account.id,
    });
  }

  async membership(
    accountId: string,
    organisationId: string,
    trade: 'shop' | 'workshop',
  ): Promise<CurrentMemberData | null> {
    const member = await this.dataSource.manager.findOne(OrganisationMember, {
      where: {
        accountId,
        organisationId,
        organisation: trade === 'shop' ? { isShop: true } : { isWorkshop: true },
      },
    });
    return member && { organisationId, accountId, role: member.role };
  }
}
