import {
  bookingList,
  declineBody,
  emptyBody,
  fittingRecordBody,
  jobSheetView,
  uuid,
} from '@linkfell/contracts';
import type { BookingList, DeclineBody, FittingRecordBody, JobSheetView } from '@linkfell/contracts';
import { Body, Controller, Get, Param, Post, Put, Res } from '@nestjs/common';
import type { Response } from 'express';
import type { z } from 'zod';

import { Member } from '../common/access/access.js';
import { CurrentMember, type CurrentMemberData } from '../common/access/principal.js';
import { IfMatch, setVersion } from '../common/http/etag.js';
import { Answers } from '../common/validation/answers.js';
import { zod } from '../common/validation/zod.pipe.js';
import { BookingsService } from './bookings.service.js';
import { JobSheets } from './job-sheets.service.js';

type Empty = z.infer<typeof emptyBody>;
const id = zod(uuid);

@Controller('organisations/:orgId/bookings')
export class BookingsController {
  constructor(
    private readonly bookings: BookingsService,
    private readonly sheets: JobSheets,
  ) {}

  @Get()
  @Member('workshop')
  @Answers(bookingList)
  list(@Param('orgId') orgId: string): Promise<BookingList> {
    return this.sheets.list(orgId);
  }

  @Get(':bookingId')
  @Member('workshop')
  @Answers(jobSheetView)
  async jobSheet(
    @Param('orgId') orgId: string,
    @Param('bookingId', id) bookingId: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<JobSheetView> {
    return withVersion(response, await this.sheets.jobSheet(orgId, bookingId));
  }

  @Post(':bookingId/accept')
  @Member('workshop', ['owner', 'staff'])
  @Answers(jobSheetView)
  async accept(
    @Param('bookingId', id) bookingId: string,
    @CurrentMember() member: CurrentMemberData,
    @Body(zod(emptyBody)) _: Empty,
    @Res({ passthrough: true }) response: Response,
  ): Promise<JobSheetView> {
    return withVersion(response, await this.bookings.accept({ ...member, bookingId }));
  }

  @Post(':bookingId/decline')
  @Member('workshop', ['owner', 'staff'])
  @Answers(jobSheetView)
  async decline(
    @Param('bookingId', id) bookingId: string,
    @CurrentMember() member: CurrentMemberData,
    @Body(zod(declineBody)) { reason }: DeclineBody,
    @Res({ passthrough: true }) response: Response,
  ): Promise<JobSheetView> {
    return withVersion(response, await this.bookings.decline({ ...member, bookingId }, reason));
  }

  @Put(':bookingId/record')
  @Member('workshop', ['owner', 'mechanic'])
  @Answers(jobSheetView)
  async record(
    @Param('bookingId', id) bookingId: string,
    @CurrentMember() member: CurrentMemberData,
    @IfMatch() version: number,
    @Body(zod(fittingRecordBody)) body: FittingRecordBody,
    @Res({ passthrough: true }) response: Response,
  ): Promise<JobSheetView> {
    return withVersion(response, await this.bookings.record({ ...member, bookingId }, version, body));
  }

  @Post(':bookingId/fitted')
  @Member('workshop', ['owner', 'mechanic'])
  @Answers(jobSheetView)
  async fitted(
    @Param('bookingId', id) bookingId: string,
    @CurrentMember() member: CurrentMemberData,
    @Body(zod(emptyBody)) _: Empty,
    @Res({ passthrough: true }) response: Response,
  ): Promise<JobSheetView> {
    return withVersion(response, await this.bookings.fitted({ ...member, bookingId }));
  }
}

function withVersion(response: Response, sheet: JobSheetView): JobSheetView {
  setVersion(response, sheet.version);
  return sheet;
}
