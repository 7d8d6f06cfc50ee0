import { matchDetail, matchesQuery, matchesView, slug } from '@linkfell/contracts';
import type { MatchDetail, MatchesQuery, MatchesView } from '@linkfell/contracts';
import { Controller, Get, Param, Query } from '@nestjs/common';

import { MeasureUpGrant } from '../common/access/access.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { MatchesService } from './matches.service.js';

@Controller('measure-ups/:id/matches')
export class MatchesController {
  constructor(private readonly service: MatchesService) {}

  @Get()
  @MeasureUpGrant()
  @Answers(matchesView)
  matches(@Param('id') id: string, @Query(zod(matchesQuery)) query: MatchesQuery): Promise<MatchesView> {
    return this.service.matches(id, query);
  }

  @Get(':sizeId')
  @MeasureUpGrant()
  @Answers(matchDetail)
  detail(@Param('id') id: string, @Param('sizeId', zod(slug)) sizeId: string): Promise<MatchDetail> {
    return this.service.detail(id, sizeId);
  }
}
