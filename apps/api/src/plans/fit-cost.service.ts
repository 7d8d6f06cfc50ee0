import type { WorkId } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';

import { Clock } from '../common/clock.js';
import { OffersService, type ShopOffer } from '../listings/offers.service.js';
import { greatCircleKm, type Place } from '../workshops/great-circle.js';
import { WorkshopsService, type WorkshopDay } from '../workshops/workshops.service.js';
import { chooseOffers, type NeededItem } from './planning/choose-offers.js';
import { FirstDays } from './planning/first-days.js';
import { jobAt } from './planning/job-cost.js';

export interface CostRequest {
  key: string;
  items: NeededItem[];
  work: WorkId[];
  selfFitAllowed: boolean;
}
export interface FitCost {
  /** Items and carriage; null when something is not to be had. */
  partsMinor: number | null;
  selfFitMinor: number | null;
  fittedMinor: number | null;
  /** The first slot at the workshop whose price is counted. */
  earliest: { day: string; workshopName: string; distanceKm: number | null } | null;
}

const none: FitCost = { partsMinor: null, selfFitMinor: null, fittedMinor: null, earliest: null };

function byItemId(offers: readonly ShopOffer[]): Map<string, ShopOffer[]> {
  const groups = new Map<string, ShopOffer[]>();
  for (const offer of offers) {
    const group = groups.get(offer.itemId);
    if (group) group.push(offer);
    else groups.set(offer.itemId, [offer]);
  }
  return groups;
}

/** What a shock costs with all it needs, and when it could be fitted. */
@Injectable()
export class FitCostService {
  constructor(
    private readonly clock: Clock,
    private readonly offers: OffersService,
    private readonly workshops: WorkshopsService,
  ) {}

  /** All-in prices for many shocks at once: two statements, however many are asked for. */
  async quoteMany(requests: readonly CostRequest[], place: Place | null): Promise<Map<string, FitCost>> {
    const now = this.clock.now();
    const [offers, workshops] = await Promise.all([
      this.offers.forItems(requests.flatMap((request) => request.items.map((item) => item.itemId))),
      this.workshops.days(now),
    ]);
    const byItem = byItemId(offers);
    const firstDays = new FirstDays(now);
    return new Map(
      requests.map((request) => {
        const basket = chooseOffers(
          request.items,
          request.items.flatMap((item) => byItem.get(item.itemId) ?? []),
        );
        if (!basket) return [request.key, none];
        const fitted = this.cheapestFitting(request.work, basket.offers, workshops, place, firstDays);
        return [
          request.key,
          {
            partsMinor: basket.totalMinor,
            selfFitMinor: request.selfFitAllowed ? basket.totalMinor : null,
            fittedMinor: fitted && basket.totalMinor + fitted.priceMinor,
            earliest: fitted?.earliest ?? null,
          },
        ];
      }),
    );
  }

  /** The cheapest workshop with a free slot; of equal ones the earlier, then the nearer. */
  private cheapestFitting(
    work: readonly WorkId[],
    offers: readonly ShopOffer[],
    workshops: readonly WorkshopDay[],
    place: Place | null,
    firstDays: FirstDays,
  ): { priceMinor: number; earliest: FitCost['earliest'] } | null {
    const candidates = workshops
      .flatMap((workshop) => {
        const job = jobAt(workshop, work);
        return job ? [{ workshop, ...job, distanceKm: place && greatCircleKm(place, workshop) }] : [];
      })
      .sort((a, b) => a.priceMinor - b.priceMinor || (a.distanceKm ?? 0) - (b.distanceKm ?? 0));
    for (const { workshop, minutes, priceMinor, distanceKm } of candidates) {
      const day = firstDays.firstDay(workshop, offers, minutes);
      if (day) return { priceMinor, earliest: { day, workshopName: workshop.name, distanceKm } };
    }
    return null;
  }
}
