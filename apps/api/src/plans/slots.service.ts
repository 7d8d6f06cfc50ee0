import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { WorkshopsService } from '../workshops/workshops.service.js';
import { dayOf } from './planning/calendar.js';
import { freeSlots, type FreeSlot } from './planning/free-slots.js';

/** Free slots of one workshop, for whoever needs to offer another date. */
@Injectable()
export class SlotsService {
  constructor(
    private readonly clock: Clock,
    private readonly workshops: WorkshopsService,
  ) {}

  /** Slots on days after the day of `notBefore` in the workshop's zone; none for a workshop that does not exist. */
  async freeSlots(
    workshopId: string,
    minutes: number,
    notBefore: Date,
    limit: number,
    manager?: EntityManager,
  ): Promise<FreeSlot[]> {
    const [workshop] = await this.workshops.days(this.clock.now(), manager, workshopId);
    if (!workshop) return [];
    const afterDay = dayOf(notBefore, workshop.calendar.timeZone).toString();
    return freeSlots(workshop.calendar, workshop.stands, workshop.busy, { minutes, afterDay, limit });
  }
}
