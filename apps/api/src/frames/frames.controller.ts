import { frameList, frameSheetView, slug, townList } from '@linkfell/contracts';
import type { FrameList, FrameSheetView, TownList } from '@linkfell/contracts';
import { Controller, Get, Param, Query } from '@nestjs/common';
import { z } from 'zod';

import { Public } from '../common/access/access.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { FramesService } from './frames.service.js';

const findQuery = z.object({ q: z.string().max(80).optional(), maker: slug.optional() });

@Controller()
export class FramesController {
  constructor(private readonly frames: FramesService) {}

  @Get('frames')
  @Public()
  @Answers(frameList)
  find(@Query(zod(findQuery)) query: z.infer<typeof findQuery>): Promise<FrameList> {
    return this.frames.find(query);
  }

  @Get('frames/:frameId')
  @Public()
  @Answers(frameSheetView)
  sheet(@Param('frameId', zod(slug)) frameId: string): Promise<FrameSheetView> {
    return this.frames.view(frameId);
  }

  @Get('towns')
  @Public()
  @Answers(townList)
  towns(): Promise<TownList> {
    return this.frames.towns();
  }
}
