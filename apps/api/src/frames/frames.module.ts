import { Module } from '@nestjs/common';

import { FramesController } from './frames.controller.js';
import { FramesService } from './frames.service.js';

@Module({ controllers: [FramesController], providers: [FramesService], exports: [FramesService] })
export class FramesModule {}
