import type { LineView, PlanChoices, PlanView } from '@linkfell/contracts';

import type { ShopOffer } from '../listings/offers.service.js';
import type { Judged } from '../matches/judging.service.js';
import { itemsOf, workOf } from '../matches/judging.service.js';
import type { OpenMeasureUp } from '../measure-ups/measure-ups.service.js';
import type { WorkshopDay } from '../workshops/workshops.service.js';
import { selfFitReason } from './job.js';
import { chooseOffers, type NeededItem } from './planning/choose-offers.js';
import type { FreeSlot } from './planning/free-slots.js';
import { jobAt, lastArrival, slotsAfterParts } from './planning/job-cost.js';
import { vatWithin } from './vat.js';

/** All that a plan rests on at one instant. */
export interface DraftInput {
  now: Date;
  judged: Judged;
  open: OpenMeasureUp;
  offers: readonly ShopOffer[];
  workshops: readonly WorkshopDay[];
  choices: PlanChoices;
}

export interface PricedLine extends LineView {
  listingId: string | null;
  itemId: string | null;
  vatRateBp: number;
}

/** A plan worked out: what is bought where, when and by whom it is fitted, and what is still missing. */
export interface Draft {
  items: (NeededItem & { offers: ShopOffer[]; chosen: ShopOffer | null })[];
  chosen: ShopOffer[];
  workshop: WorkshopDay | null;
  job: { minutes: number; priceMinor: number } | null;
  slots: FreeSlot[];
  slot: FreeSlot | null;
  arrivesOn: string | null;
  missing: PlanView['missing'];
}

/** Enough for three weeks of half hours at a small workshop; a page never shows more. */
const slotsShown = 120;

export function draft({ now, judged, offers, workshops, choices }: DraftInput): Draft {
  const { judgement } = judged;
  const needed = itemsOf(judged);
  const best = chooseOffers(needed, offers);
  const items = needed.map((need) => {
    const mine = offers.filter((offer) => offer.itemId === need.itemId && offer.available >= need.quantity);
    const asked = mine.find((offer) => offer.listingId === choices.listings[need.itemId]);
    const cheapest = best?.offers.find((offer) => offer.itemId === need.itemId);
    return { ...need, offers: mine, chosen: asked ?? cheapest ?? null };
  });
  const chosen = items.flatMap((item) => item.chosen ?? []);
  const missing: PlanView['missing'] = [];
  const say = (code: PlanView['missing'][number]['code'], text: string): void =>
    void missing.push({ code, say: text });

  if (judgement.verdict === 'needs-an-answer' || judgement.verdict === 'wont-fit') {
    say('not-judged-fit', 'Something that matters is not known yet, so this shock cannot be ordered.');
  }
  if (chosen.length < items.length)
    say('stock-gone', 'One of the parts is sold out everywhere at the moment.');

  const result: Draft = {
    items,
    chosen,
    workshop: null,
    job: null,
    slots: [],
    slot: null,
    arrivesOn: null,
    missing,
  };
  if (choices.fit === 'self') {
    const reason = selfFitReason(judgement);
    if (reason) say('self-fit-not-offered', reason);
    return { ...result, arrivesOn: lastArrival(now, chosen) };
  }
  const workshop = workshops.find(({ id }) => id === choices.workshopId) ?? null;
  const job = workshop && jobAt(workshop, workOf(judgement));
  if (!workshop || !job) {
    say('choose-workshop', 'Choose who fits it.');
    return result;
  }
  const { arrivesOn, slots } = slotsAfterParts(now, workshop, chosen, job.minutes, slotsShown);
  const wanted = choices.slotStart === null ? null : new Date(choices.slotStart).getTime();
  const slot = slots.find(({ start }) => start.getTime() === wanted) ?? null;
  if (!slot) {
    if (wanted === null) say('choose-slot', 'Choose a date for the fitting.');
    else say('slot-gone', 'That date is no longer free, or the parts arrive after it. Choose another.');
  }
  return { ...result, workshop, job, slots, slot, arrivesOn };
}

/** The lines of the bill: items, carriage once per shop, work. All prices include VAT. */
export function linesOf(
  { items, chosen, workshop, job }: Draft,
  names: ReadonlyMap<string, string>,
  note: (itemId: string) => string | null,
): PricedLine[] {
  const line = (
    kind: PricedLine['kind'],
    seller: { id: string; vatRateBp: number },
    description: string,
    unitMinor: number,
    rest: Partial<PricedLine> = {},
  ): PricedLine => {
    const quantity = rest.quantity ?? 1;
    const totalMinor = unitMinor * quantity;
    return {
      kind,
      sellerId: seller.id,
      description,
      note: null,
      quantity,
      unitMinor,
      totalMinor,
      vatMinor: vatWithin(totalMinor, seller.vatRateBp),
      listingId: null,
      itemId: null,
      vatRateBp: seller.vatRateBp,
      ...rest,
    };
  };
  const goods = items.flatMap(({ itemId, quantity, chosen: offer }) =>
    offer
      ? [
          line(
            'item',
            { id: offer.shopId, vatRateBp: offer.vatRateBp },
            names.get(itemId) ?? itemId,
            offer.priceMinor,
            {
              quantity,
              itemId,
              listingId: offer.listingId,
              note: note(itemId),
            },
          ),
        ]
      : [],
  );
  const shops = new Map(chosen.map((offer) => [offer.shopId, offer]));
  const carriage = [...shops.values()]
    .filter((offer) => offer.carriageMinor > 0)
    .map((offer) =>
      line(
        'carriage',
        { id: offer.shopId, vatRateBp: offer.vatRateBp },
        `Carriage, ${offer.shopName}`,
        offer.carriageMinor,
      ),
    );
  const work =
    workshop && job ? [line('work', workshop, `Fitting, ${job.minutes} minutes`, job.priceMinor)] : [];
  return [...goods, ...carriage, ...work];
}
