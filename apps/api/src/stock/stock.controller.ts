import {
  parcelList,
  parcelRow,
  patchStockBody,
  sentBody,
  stockList,
  stockRow,
  uuid,
} from '@linkfell/contracts';
import type {
  ParcelList,
  ParcelRow,
  PatchStockBody,
  SentBody,
  StockList,
  StockRow,
} from '@linkfell/contracts';
import { Body, Controller, Get, Param, Patch, Post, Res } from '@nestjs/common';
import type { Response } from 'express';

import { Member } from '../common/access/access.js';
import { CurrentMember, type CurrentMemberData } from '../common/access/principal.js';
import { IfMatch, setVersion } from '../common/http/etag.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { ParcelsService } from './parcels.service.js';
import { StockService } from './stock.service.js';

@Controller('organisations/:orgId')
export class StockController {
  constructor(
    private readonly service: StockService,
    private readonly parcelsService: ParcelsService,
  ) {}

  @Get('stock')
  @Member('shop', ['owner', 'staff'])
  @Answers(stockList)
  stock(@CurrentMember() member: CurrentMemberData): Promise<StockList> {
    return this.service.stock(member.organisationId);
  }

  @Patch('stock/:listingId')
  @Member('shop', ['owner', 'staff'])
  @Answers(stockRow)
  async patch(
    @CurrentMember() { organisationId, accountId }: CurrentMemberData,
    @Param('listingId', zod(uuid)) listingId: string,
    @IfMatch() version: number,
    @Body(zod(patchStockBody)) body: PatchStockBody,
    @Res({ passthrough: true }) response: Response,
  ): Promise<StockRow> {
    const row = await this.service.patch(organisationId, listingId, accountId, version, body);
    setVersion(response, row.version);
    return row;
  }

  @Get('parcels')
  @Member('shop', ['owner', 'staff'])
  @Answers(parcelList)
  parcels(@CurrentMember() member: CurrentMemberData): Promise<ParcelList> {
    return this.parcelsService.list(member.organisationId);
  }

  @Post('parcels/:parcelId/sent')
  @Member('shop', ['owner', 'staff'])
  @Answers(parcelRow)
  sent(
    @CurrentMember() { organisationId, accountId }: CurrentMemberData,
    @Param('parcelId', zod(uuid)) parcelId: string,
    @Body(zod(sentBody)) { tracking }: SentBody,
  ): Promise<ParcelRow> {
    return this.parcelsService.sent(organisationId, parcelId, { accountId, tracking });
  }
}
