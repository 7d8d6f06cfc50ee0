import { Module } from '@nestjs/common';

import { WorkshopsService } from './workshops.service.js';

@Module({ providers: [WorkshopsService], exports: [WorkshopsService] })
export class WorkshopsModule {}
