import type { ShopOffer } from '../../listings/offers.service.js';
import type { WorkshopDay } from '../../workshops/workshops.service.js';
import { answerDeadline, dayOf } from './calendar.js';
import { lastArrival } from './job-cost.js';
import { freeSlots } from './free-slots.js';
import { Remembered } from './remembered.js';

const arrivals = new Remembered<string>(10_000);

/**
 * The first day of a fitting for many baskets at one instant. Workshops, shops and lead days are few where baskets
 * are many: each deadline, each arrival and each search for a free slot is made once.
 */
export class FirstDays {
  private readonly deadlines = new Map<string, Date | null>();
  private readonly days = new Map<string, string | null>();

  constructor(private readonly paidAt: Date) {}

  /** ISO day in the workshop's zone, or null where it has no free slot within the horizon. */
  firstDay(workshop: WorkshopDay, offers: readonly ShopOffer[], minutes: number): string | null {
    const releasedAt = this.deadline(workshop);
    if (!releasedAt) return null;
    const arrivesOn = offers.reduce<string | null>((latest, offer) => {
      const day = this.arrival(releasedAt, offer);
      return latest === null || day > latest ? day : latest;
    }, null);
    const afterDay = arrivesOn ?? dayOf(releasedAt, workshop.calendar.timeZone).toString();
    const key = `${workshop.id} ${minutes} ${afterDay}`;
    let day = this.days.get(key);
    if (day === undefined) {
      const [first] = freeSlots(workshop.calendar, workshop.stands, workshop.busy, {
        minutes,
        afterDay,
        limit: 1,
      });
      day = first ? dayOf(first.start, workshop.calendar.timeZone).toString() : null;
      this.days.set(key, day);
    }
    return day;
  }

  private deadline(workshop: WorkshopDay): Date | null {
    let found = this.deadlines.get(workshop.id);
    if (found === undefined) {
      found = answerDeadline(this.paidAt, workshop.calendar);
      this.deadlines.set(workshop.id, found);
    }
    return found;
  }

  private arrival(releasedAt: Date, offer: ShopOffer): string {
    const { timeZone, cutoff, weekdays, carrierDays } = offer.dispatch;
    const key = `${releasedAt.getTime()} ${offer.leadDays} ${timeZone} ${cutoff} ${weekdays.join('')} ${carrierDays}`;
    return arrivals.of(key, () => lastArrival(releasedAt, [offer]) as string);
  }
}
