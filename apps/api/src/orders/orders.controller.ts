import { emptyBody, findOrderBody, orderView, rebookBody, rebookOptions } from '@linkfell/contracts';
import type { FindOrderBody, OrderView, RebookBody, RebookOptions } from '@linkfell/contracts';
import { Body, Controller, Get, Param, Post, Req } from '@nestjs/common';
import type { Request } from 'express';
import type { z } from 'zod';

import { OrderGrant, Public } from '../common/access/access.js';
import { GrantsService } from '../common/access/grants.service.js';
import { TightLimit } from '../common/http/rate-limit.js';
import { Idempotent } from '../common/idempotency/idempotent.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { OrdersService } from './orders.service.js';

type Empty = z.infer<typeof emptyBody>;

@Controller('orders')
export class OrdersController {
  constructor(
    private readonly orders: OrdersService,
    private readonly grants: GrantsService,
  ) {}

  @Post('find')
  @Public()
  @TightLimit(10)
  @Answers(null)
  async find(@Req() request: Request, @Body(zod(findOrderBody)) body: FindOrderBody): Promise<void> {
    this.grants.addOrder(request, await this.orders.find(body));
  }

  @Get(':reference')
  @OrderGrant()
  @Answers(orderView)
  get(@Param('reference') reference: string): Promise<OrderView> {
    return this.orders.view(reference);
  }

  @Post(':reference/cancel-payment')
  @OrderGrant()
  @Answers(orderView)
  cancelPayment(@Param('reference') reference: string, @Body(zod(emptyBody)) _: Empty): Promise<OrderView> {
    return this.orders.cancelPayment(reference);
  }

  @Get(':reference/workshops')
  @OrderGrant()
  @Answers(rebookOptions)
  options(@Param('reference') reference: string): Promise<RebookOptions> {
    return this.orders.rebookOptions(reference);
  }

  @Post(':reference/workshop')
  @OrderGrant()
  @Idempotent('rebook')
  @Answers(orderView)
  rebook(@Param('reference') reference: string, @Body(zod(rebookBody)) body: RebookBody): Promise<OrderView> {
    return this.orders.rebook(reference, body);
  }

  @Post(':reference/self-fit')
  @OrderGrant()
  @Answers(orderView)
  selfFit(@Param('reference') reference: string, @Body(zod(emptyBody)) _: Empty): Promise<OrderView> {
    return this.orders.selfFit(reference);
  }

  @Post(':reference/refund')
  @OrderGrant()
  @Answers(orderView)
  refund(@Param('reference') reference: string, @Body(zod(emptyBody)) _: Empty): Promise<OrderView> {
    return this.orders.refund(reference);
  }
}
