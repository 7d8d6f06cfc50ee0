import { checkoutBody, checkoutView } from '@linkfell/contracts';
import type { CheckoutBody, CheckoutView } from '@linkfell/contracts';
import { Body, Controller, Param, Post, Req } from '@nestjs/common';
import type { Request } from 'express';

import { PlanGrant } from '../common/access/access.js';
import { GrantsService } from '../common/access/grants.service.js';
import { OwnershipService } from '../common/access/ownership.service.js';
import { Idempotent } from '../common/idempotency/idempotent.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { CheckoutService } from './checkout.service.js';

@Controller('plans/:id/checkout')
export class CheckoutController {
  constructor(
    private readonly service: CheckoutService,
    private readonly grants: GrantsService,
    private readonly ownership: OwnershipService,
  ) {}

  @Post()
  @PlanGrant()
  @Idempotent('checkout')
  @Answers(checkoutView, 201)
  async checkout(
    @Param('id') id: string,
    @Body(zod(checkoutBody)) body: CheckoutBody,
    @Req() request: Request,
  ): Promise<CheckoutView> {
    const { orderId, ...view } = await this.service.checkout(id, body, (reference) =>
      this.ownership.holdsOrder(request, reference),
    );
    this.grants.addOrder(request, orderId);
    return view;
  }
}
