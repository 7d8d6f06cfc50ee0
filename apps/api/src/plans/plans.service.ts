import type { LineView, PlanChoices, PlanView, PutChoicesBody, SellerView } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource, In, type EntityManager } from 'typeorm';

import { Clock } from '../common/clock.js';
import { needVersion } from '../common/http/etag.js';
import { CommonException } from '../common/problems/problem.exception.js';
import { inTransaction } from '../database/in-transaction.js';
import { OffersService } from '../listings/offers.service.js';
import { itemsOf, JudgingService, workOf, type Judged } from '../matches/judging.service.js';
import { decisive } from '../matches/match-row.js';
import { MatchesService } from '../matches/matches.service.js';
import type { OpenMeasureUp } from '../measure-ups/measure-ups.service.js';
import { Order } from '../orders/order.entity.js';
import { Organisation } from '../organisations/organisation.entity.js';
import { drawnShock } from '../shocks/drawn-shock.js';
import { tell } from '@linkfell/fit-engine';
import { greatCircleKm, type Place } from '../workshops/great-circle.js';
import { WorkshopsService, type WorkshopDay } from '../workshops/workshops.service.js';
import { cautions } from './cautions.js';
import { draft, linesOf, type Draft } from './draft.js';
import { jobSnapshot, partNote, selfFitReason, springWords, workLines } from './job.js';
import { Plan } from './plan.entity.js';
import { arrivalDay, dispatchDay } from './planning/dispatch.js';
import { jobAt, slotsAfterParts } from './planning/job-cost.js';
import { PlansException } from './plans.exception.js';
import type { PreparedOrder } from './prepared-order.js';
import { answerDeadline } from './planning/calendar.js';

interface OpenPlan {
  plan: Plan;
  judged: Judged & { open: OpenMeasureUp; names: Map<string, string> };
  workshops: WorkshopDay[];
  place: Place | null;
  now: Date;
  drafted: Draft;
}

export const sellerView = (seller: Organisation): SellerView => ({
  id: seller.id,
  name: seller.name,
  address: [seller.street, seller.town.name, seller.postcode],
  vatNumber: seller.vatNumber,
  email: seller.email,
  phone: seller.phone,
});

/** One shock chosen: what is bought where, who fits it when, what it costs. */
@Injectable()
export class PlansService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly judging: JudgingService,
    private readonly matches: MatchesService,
    private readonly offers: OffersService,
    private readonly workshops: WorkshopsService,
  ) {}

  /** @throws PlansException "not-fit" for a shock that is judged not to fit */
  async create(measureUpId: string, sizeId: string): Promise<PlanView> {
    const judged = await this.judging.judgeOne(measureUpId, sizeId);
    if (judged.judgement.verdict === 'wont-fit') {
      const reason = decisive(judged.judgement.answers);
      throw new PlansException('not-fit', reason ? { detail: tell(reason).short } : {});
    }
    const now = this.clock.now();
    const choices = await this.firstChoices(judged, now);
    const plan = await this.dataSource.manager.save(Plan, {
      measureUpId,
      shockItemId: sizeId,
      choices,
      createdAt: now,
      updatedAt: now,
    });
    return this.view(plan.id);
  }

  async view(id: string): Promise<PlanView> {
    const open = await this.open(id, this.dataSource.manager);
    const live = await this.dataSource.manager.findOne(Order, {
      where: { planId: id, state: In(['held', 'paid', 'completed', 'refunding']) },
      order: { createdAt: 'DESC' },
    });
    return this.toView(open, live?.reference ?? null);
  }

  async choose(id: string, version: number, change: PutChoicesBody): Promise<PlanView> {
    await inTransaction(this.dataSource, async (manager) => {
      const plan = await manager.findOne(Plan, { where: { id }, lock: { mode: 'pessimistic_write' } });
      if (!plan) throw new CommonException('not-found');
      needVersion(plan.revision, version);
      // Another workshop or another way of fitting makes the old date meaningless.
      const moved =
        (change.workshopId !== undefined && change.workshopId !== plan.choices.workshopId) ||
        (change.fit !== undefined && change.fit !== plan.choices.fit);
      const choices: PlanChoices = {
        ...plan.choices,
        ...(moved && change.slotStart === undefined ? { slotStart: null } : {}),
        ...change,
        listings: { ...plan.choices.listings, ...change.listings },
      };
      await manager.update(
        Plan,
        { id },
        { choices: choices as object, revision: plan.revision + 1, updatedAt: this.clock.now() },
      );
    });
    return this.view(id);
  }

  /**
   * Everything an order keeps, read in the transaction of `manager`.
   * @throws PlansException "not-ready" with what is missing
   */
  async prepareOrder(planId: string, manager: EntityManager): Promise<PreparedOrder> {
    const open = await this.open(planId, manager);
    const { plan, judged, drafted, now } = open;
    if (drafted.missing.length > 0) {
      throw new PlansException('not-ready', {
        detail: drafted.missing.map(({ say }) => say).join(' '),
        extensions: { missing: drafted.missing },
      });
    }
    const lines = this.lines(open);
    const { workshop, slot } = drafted;
    const released = workshop ? (answerDeadline(now, workshop.calendar) ?? now) : now;
    const shops = new Map(drafted.chosen.map((offer) => [offer.shopId, offer]));
    const { shock, judgement } = judged;
    return {
      planId,
      measureUpId: plan.measureUpId,
      fit: plan.choices.fit,
      title: judged.open.side.frame.name,
      shockName: `${shock.makerName} ${shock.modelName} ${shock.sizeKey}`,
      verdict: judgement.verdict,
      currency: 'gbp',
      totalMinor: lines.reduce((sum, line) => sum + line.totalMinor, 0),
      lines: lines.map(({ totalMinor: _total, vatMinor: _vat, ...line }) => line),
      parcels: [...shops].map(([shopId]) => ({
        shopId,
        dispatchBy: drafted.chosen
          .filter((offer) => offer.shopId === shopId)
          .map((offer) => dispatchDay(released, offer.dispatch, offer.leadDays).toString())
          .sort()
          .at(-1) as string,
      })),
      booking:
        workshop && slot
          ? { workshopId: workshop.id, standIds: slot.standIds, start: slot.start, end: slot.end }
          : null,
      job: jobSnapshot(judged, judged.open, workshop),
    };
  }

  private async open(id: string, manager: EntityManager): Promise<OpenPlan> {
    const plan = await manager.findOneBy(Plan, { id });
    if (!plan) throw new CommonException('not-found');
    const now = this.clock.now();
    const judged = await this.judging.judgeOne(plan.measureUpId, plan.shockItemId, manager);
    const offers = await this.offers.forItems(
      itemsOf(judged).map(({ itemId }) => itemId),
      manager,
    );
    const workshops = await this.workshops.days(now, manager);
    const place = await this.matches.placeOf(judged.open);
    const { open, ...rest } = judged;
    const drafted = draft({ now, judged: rest, open, offers, workshops, choices: plan.choices });
    return { plan, judged, workshops, place, now, drafted };
  }

  /** The cheapest basket; the cheapest workshop that can do it, on its first free date, unless it is plain self-fit work. */
  private async firstChoices(judged: Judged & { open: OpenMeasureUp }, now: Date): Promise<PlanChoices> {
    const offers = await this.offers.forItems(itemsOf(judged).map(({ itemId }) => itemId));
    const workshops = await this.workshops.days(now);
    const base = { listings: {}, workshopId: null, slotStart: null };
    const { open, ...rest } = judged;
    const basket = draft({
      now,
      judged: rest,
      open,
      offers,
      workshops,
      choices: { ...base, fit: 'self' },
    }).chosen;
    const options = workshops
      .flatMap((workshop) => {
        const job = jobAt(workshop, workOf(judged.judgement));
        const first = job && slotsAfterParts(now, workshop, basket, job.minutes, 1).slots[0];
        return job && first ? [{ workshop, job, first }] : [];
      })
      .sort(
        (a, b) => a.job.priceMinor - b.job.priceMinor || a.first.start.getTime() - b.first.start.getTime(),
      );
    const [best] = options;
    if (!best) return { ...base, fit: judged.judgement.selfFitAllowed ? 'self' : 'workshop' };
    return {
      ...base,
      fit: 'workshop',
      workshopId: best.workshop.id,
      slotStart: best.first.start.toISOString(),
    };
  }

  private lines({ judged, drafted }: OpenPlan) {
    return linesOf(drafted, judged.names, (itemId) => partNote(judged.judgement, itemId));
  }

  private async toView(open: OpenPlan, orderReference: string | null): Promise<PlanView> {
    const { plan, judged, drafted, workshops, place, now } = open;
    const { shock, judgement } = judged;
    const lines = this.lines(open);
    const sellers = await this.dataSource.manager.find(Organisation, {
      where: { id: In([...new Set(lines.map((line) => line.sellerId))]) },
      relations: { town: true },
      order: { name: 'ASC' },
    });
    const reason = decisive(judgement.answers);
    const why = selfFitReason(judgement);
    return {
      id: plan.id,
      revision: plan.revision,
      measureUpId: plan.measureUpId,
      title: judged.open.side.frame.name,
      shock: {
        sizeId: shock.sizeId,
        makerName: shock.makerName,
        modelName: shock.modelName,
        sizeKey: shock.sizeKey,
        drawing: drawnShock(shock, judgement.reservoirPositionDeg),
      },
      verdict: judgement.verdict,
      reason: reason && tell(reason).short,
      spring: springWords(judgement),
      choices: {
        ...plan.choices,
        listings: Object.fromEntries(
          drafted.items.flatMap(({ itemId, chosen }) => (chosen ? [[itemId, chosen.listingId]] : [])),
        ),
      },
      items: drafted.items.map(({ itemId, quantity, offers }) => ({
        itemId,
        name: judged.names.get(itemId) ?? itemId,
        note: partNote(judgement, itemId),
        quantity,
        offers: offers.map((offer) => {
          const leaves = dispatchDay(now, offer.dispatch, offer.leadDays);
          return {
            listingId: offer.listingId,
            shopId: offer.shopId,
            shopName: offer.shopName,
            priceMinor: offer.priceMinor,
            carriageMinor: offer.carriageMinor,
            available: offer.available,
            dispatchDay: leaves.toString(),
            arrivalDay: arrivalDay(leaves, offer.dispatch.carrierDays).toString(),
          };
        }),
      })),
      work: workLines(judgement),
      selfFit: { allowed: why === null, reason: why },
      workshops: workshops
        .flatMap((workshop) => {
          const job = jobAt(workshop, workOf(judgement));
          if (!job) return [];
          const first = slotsAfterParts(now, workshop, drafted.chosen, job.minutes, 1).slots[0];
          return [
            {
              id: workshop.id,
              name: workshop.name,
              town: workshop.town,
              distanceKm: place && Math.round(greatCircleKm(place, workshop) * 10) / 10,
              priceMinor: job.priceMinor,
              minutes: job.minutes,
              timeZone: workshop.calendar.timeZone,
              earliest: first?.start.toISOString() ?? null,
            },
          ];
        })
        .sort((a, b) => (a.earliest ?? '9').localeCompare(b.earliest ?? '9')),
      slots: drafted.slots.map(({ start, end }) => ({ start: start.toISOString(), end: end.toISOString() })),
      partsArriveDay: drafted.arrivesOn,
      lines: lines.map(
        ({ kind, sellerId, description, note, quantity, unitMinor, totalMinor, vatMinor }): LineView => ({
          kind,
          sellerId,
          description,
          note,
          quantity,
          unitMinor,
          totalMinor,
          vatMinor,
        }),
      ),
      sellers: sellers.map(sellerView),
      totalMinor: lines.reduce((sum, line) => sum + line.totalMinor, 0),
      vatMinor: lines.reduce((sum, line) => sum + line.vatMinor, 0),
      cautions: [...cautions],
      missing: drafted.missing,
      orderReference,
    };
  }
}
