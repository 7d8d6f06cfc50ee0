import { Injectable } from '@nestjs/common';
import { In, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { Booking } from '../fitting-bookings/booking.entity.js';
import { answerDeadline, dayOf } from '../plans/planning/calendar.js';
import { freeSlots, type FreeSlot } from '../plans/planning/free-slots.js';
import { jobAt } from '../plans/planning/job-cost.js';
import { WorkshopsService, type WorkshopDay } from '../workshops/workshops.service.js';
import { dispatchDays } from './dispatch-days.js';
import { OrderLine } from './order-line.entity.js';
import type { Order } from './order.entity.js';

/** Slots offered per workshop when the rider chooses again. */
const slotsOffered = 40;

export interface WorkshopOption {
  workshop: WorkshopDay;
  slots: FreeSlot[];
  minutes: number;
  priceMinor: number;
}

/** Where else what is paid for could be fitted. */
@Injectable()
export class OtherWorkshops {
  constructor(
    private readonly clock: Clock,
    private readonly workshops: WorkshopsService,
  ) {}

  /**
   * Workshops that can do all of the work for at most what was paid for it, with their free slots after the parts can
   * be there; earliest first. One that has said no stands last: on another date it may say yes.
   */
  async optionsFor(order: Order, manager: EntityManager): Promise<WorkshopOption[]> {
    const now = this.clock.now();
    const paid = await manager.findOneBy(OrderLine, { orderId: order.id, kind: 'work' });
    const refused = await manager.findBy(Booking, {
      orderId: order.id,
      state: In<Booking['state']>(['declined', 'lapsed']),
    });
    const options: WorkshopOption[] = [];
    for (const workshop of await this.workshops.days(now, manager)) {
      const job = jobAt(
        workshop,
        order.job.work.map(({ id }) => id),
      );
      const answerBy = answerDeadline(now, workshop.calendar);
      if (!job || !answerBy || job.priceMinor > (paid?.unitMinor ?? 0)) continue;
      const days = await dispatchDays(manager, order.id, answerBy);
      const afterDay = [
        dayOf(answerBy, workshop.calendar.timeZone).toString(),
        ...days.map(({ arrivesOn }) => arrivesOn),
      ]
        .sort()
        .at(-1) as string;
      const slots = freeSlots(workshop.calendar, workshop.stands, workshop.busy, {
        minutes: job.minutes,
        afterDay,
        limit: slotsOffered,
      });
      if (slots.length > 0) options.push({ workshop, slots, ...job });
    }
    const saidNo = ({ workshop }: WorkshopOption): number =>
      Number(refused.some(({ workshopId }) => workshopId === workshop.id));
    const first = ({ slots }: WorkshopOption): number => slots[0]?.start.getTime() ?? Infinity;
    return options.sort((a, b) => saidNo(a) - saidNo(b) || first(a) - first(b));
  }
}
