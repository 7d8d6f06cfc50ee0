import { linkView, measureUpView, openLinkBody, openLinkView } from '@linkfell/contracts';
import type { LinkView, MeasureUpView } from '@linkfell/contracts';
import { Body, Controller, Delete, Get, Param, Post, Put, Req } from '@nestjs/common';
import type { Request } from 'express';
import { z } from 'zod';

import { MeasureUpGrant, Public } from '../common/access/access.js';
import { GrantsService } from '../common/access/grants.service.js';
import { MaybeAccount, type CurrentAccountData } from '../common/access/principal.js';
import { TightLimit } from '../common/http/rate-limit.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { MeasureUpsService } from './measure-ups.service.js';

@Controller('measure-ups')
export class MeasureUpsController {
  constructor(
    private readonly measureUps: MeasureUpsService,
    private readonly grants: GrantsService,
  ) {}

  @Post()
  @Public()
  @Answers(measureUpView, 201)
  async create(
    @Req() request: Request,
    @MaybeAccount() account: CurrentAccountData | null,
  ): Promise<MeasureUpView> {
    const view = await this.measureUps.create(account?.id ?? null);
    this.grants.addMeasureUp(request, view.id);
    return view;
  }

  /** Exchanges the token of a rider's link, which travels in the fragment, for the session's grant. */
  @Post('open')
  @Public()
  @TightLimit(30)
  @Answers(openLinkView)
  async open(
    @Req() request: Request,
    @Body(zod(openLinkBody)) { token }: z.infer<typeof openLinkBody>,
  ): Promise<{ id: string }> {
    const id = await this.measureUps.byToken(token);
    this.grants.addMeasureUp(request, id);
    return { id };
  }

  @Get(':id')
  @MeasureUpGrant()
  @Answers(measureUpView)
  get(@Param('id') id: string): Promise<MeasureUpView> {
    return this.measureUps.view(id);
  }

  @Put(':id/answers/:question')
  @MeasureUpGrant()
  @Answers(measureUpView)
  answer(
    @Param('id') id: string,
    @Param('question') question: string,
    @Body(zod(z.unknown())) body: unknown,
  ): Promise<MeasureUpView> {
    return this.measureUps.answer(id, question, body);
  }

  @Delete(':id/answers/:question')
  @MeasureUpGrant()
  @Answers(measureUpView)
  forget(@Param('id') id: string, @Param('question') question: string): Promise<MeasureUpView> {
    return this.measureUps.forget(id, question);
  }

  @Post(':id/links')
  @MeasureUpGrant()
  @TightLimit(30)
  @Answers(linkView, 201)
  createLink(@Param('id') id: string): Promise<LinkView> {
    return this.measureUps.createLink(id);
  }

  @Delete(':id/links')
  @MeasureUpGrant()
  @Answers(null)
  revokeLinks(@Param('id') id: string): Promise<void> {
    return this.measureUps.revokeLinks(id);
  }
}
