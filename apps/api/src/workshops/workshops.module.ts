import { Module } from '@nestjs/common';

import { WorkshopDirectoryService } from './workshop-directory.service.js';
import { WorkshopsController } from './workshops.controller.js';
import { WorkshopsService } from './workshops.service.js';

@Module({
  controllers: [WorkshopsController],
  providers: [WorkshopsService, WorkshopDirectoryService],
  exports: [WorkshopsService],
})
export class WorkshopsModule {}
