import {
  slug,
  workshopList,
  workshopPage,
  workshopsQuery,
  type WorkshopList,
  type WorkshopPage,
  type WorkshopsQuery,
} from '@linkfell/contracts';
import { Controller, Get, Param, Query } from '@nestjs/common';

import { Public } from '../common/access/access.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { WorkshopDirectoryService } from './workshop-directory.service.js';

@Controller('workshops')
export class WorkshopsController {
  constructor(private readonly directory: WorkshopDirectoryService) {}

  @Get()
  @Public()
  @Answers(workshopList)
  list(@Query(zod(workshopsQuery)) { from }: WorkshopsQuery): Promise<WorkshopList> {
    return this.directory.list(from);
  }

  @Get(':workshopId')
  @Public()
  @Answers(workshopPage)
  page(@Param('workshopId', zod(slug)) workshopId: string): Promise<WorkshopPage> {
    return this.directory.page(workshopId);
  }
}
