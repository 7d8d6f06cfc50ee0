import { Module } from '@nestjs/common';

import { FramesModule } from '../frames/frames.module.js';
import { MeasureUpsController } from './measure-ups.controller.js';
import { MeasureUpsService } from './measure-ups.service.js';

@Module({
  imports: [FramesModule],
  controllers: [MeasureUpsController],
  providers: [MeasureUpsService],
  exports: [MeasureUpsService],
})
export class MeasureUpsModule {}
