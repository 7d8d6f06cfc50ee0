import { createPlanBody, planView, putChoicesBody } from '@linkfell/contracts';
import type { CreatePlanBody, PlanView, PutChoicesBody } from '@linkfell/contracts';
import { Body, Controller, Get, Param, Post, Put, Res } from '@nestjs/common';
import type { Response } from 'express';

import { MeasureUpGrant, PlanGrant } from '../common/access/access.js';
import { IfMatch, setVersion } from '../common/http/etag.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { PlansService } from './plans.service.js';

@Controller()
export class PlansController {
  constructor(private readonly plans: PlansService) {}

  @Post('measure-ups/:id/plans')
  @MeasureUpGrant()
  @Answers(planView, 201)
  async create(
    @Param('id') id: string,
    @Body(zod(createPlanBody)) { sizeId }: CreatePlanBody,
    @Res({ passthrough: true }) response: Response,
  ): Promise<PlanView> {
    return withVersion(response, await this.plans.create(id, sizeId));
  }

  @Get('plans/:id')
  @PlanGrant()
  @Answers(planView)
  async get(@Param('id') id: string, @Res({ passthrough: true }) response: Response): Promise<PlanView> {
    return withVersion(response, await this.plans.view(id));
  }

  @Put('plans/:id/choices')
  @PlanGrant()
  @Answers(planView)
  async choose(
    @Param('id') id: string,
    @IfMatch() version: number,
    @Body(zod(putChoicesBody)) body: PutChoicesBody,
    @Res({ passthrough: true }) response: Response,
  ): Promise<PlanView> {
    return withVersion(response, await this.plans.choose(id, version, body));
  }
}

function withVersion(response: Response, plan: PlanView): PlanView {
  setVersion(response, plan.revision);
  return plan;
}
