import type { WorkId } from '@linkfell/contracts';

import type { ShopOffer } from '../../listings/offers.service.js';
import type { WorkshopDay } from '../../workshops/workshops.service.js';
import { answerDeadline, dayOf } from './calendar.js';
import { arrivalDay, dispatchDay } from './dispatch.js';
import { freeSlots, type FreeSlot } from './free-slots.js';

/** Minutes and price of the named work; a kind of work that occurs twice (a kit at either end) counts twice. */
export function jobAt(
  workshop: WorkshopDay,
  work: readonly WorkId[],
): { minutes: number; priceMinor: number } | null {
  let minutes = 0;
  let priceMinor = 0;
  for (const id of work) {
    const service = workshop.services.get(id);
    if (!service) return null;
    minutes += service.minutes;
    priceMinor += service.priceMinor;
  }
  return { minutes, priceMinor };
}

/** The day on which the last parcel arrives if all are released at one instant; null without parcels. */
export function lastArrival(releasedAt: Date, offers: readonly ShopOffer[]): string | null {
  const days = offers.map((offer) =>
    arrivalDay(
      dispatchDay(releasedAt, offer.dispatch, offer.leadDays),
      offer.dispatch.carrierDays,
    ).toString(),
  );
  return days.sort().at(-1) ?? null;
}

/**
 * The first slots for a fitting paid for at `paidAt`. Parts leave for the workshop only when it has accepted, and it
 * may take its whole time to answer: dates count from that latest answer, so that a date shown is one that holds.
 */
export function slotsAfterParts(
  paidAt: Date,
  workshop: WorkshopDay,
  offers: readonly ShopOffer[],
  minutes: number,
  limit: number,
): { arrivesOn: string | null; slots: FreeSlot[] } {
  const releasedAt = answerDeadline(paidAt, workshop.calendar);
  if (!releasedAt) return { arrivesOn: null, slots: [] };
  const arrivesOn =
    lastArrival(releasedAt, offers) ?? dayOf(releasedAt, workshop.calendar.timeZone).toString();
  return {
    arrivesOn,
    slots: freeSlots(workshop.calendar, workshop.stands, workshop.busy, {
      minutes,
      afterDay: arrivesOn,
      limit,
    }),
  };
}
