import { clearanceView, curvesQuery, curvesView, slug } from '@linkfell/contracts';
import type { ClearanceView, CurvesQuery, CurvesView } from '@linkfell/contracts';
import { Controller, Get, Param, Query } from '@nestjs/common';

import { MeasureUpGrant } from '../common/access/access.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { ClearanceService } from './clearance.service.js';
import { CurvesService } from './curves.service.js';

/** What can be drawn of one match: asked for by itself, since it is looked at by few and worked out for one. */
@Controller('measure-ups/:id/matches/:sizeId')
export class MatchViewsController {
  constructor(
    private readonly curvesOf: CurvesService,
    private readonly clearanceOf: ClearanceService,
  ) {}

  @Get('curves')
  @MeasureUpGrant()
  @Answers(curvesView)
  curves(
    @Param('id') id: string,
    @Param('sizeId', zod(slug)) sizeId: string,
    @Query(zod(curvesQuery)) { present }: CurvesQuery,
  ): Promise<CurvesView> {
    return this.curvesOf.curves(id, sizeId, present ?? null);
  }

  @Get('clearance')
  @MeasureUpGrant()
  @Answers(clearanceView)
  clearance(@Param('id') id: string, @Param('sizeId', zod(slug)) sizeId: string): Promise<ClearanceView> {
    return this.clearanceOf.clearance(id, sizeId);
  }
}
