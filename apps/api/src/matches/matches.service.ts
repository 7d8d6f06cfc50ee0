import type { MatchDetail, MatchesQuery, MatchesView, Verdict } from '@linkfell/contracts';
import type { ShockFacts } from '@linkfell/fit-engine';
import { sagText } from './sag-text.js';
import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';

import { mountWord } from '../frames/mount-words.js';
import { frameName } from '../frames/sheet.js';
import { known } from '../measure-ups/answers.js';
import type { OpenMeasureUp } from '../measure-ups/measure-ups.service.js';
import { presentDrawing, sizeResult } from '../measure-ups/size-view.js';
import { Town } from '../organisations/town.entity.js';
import { FitCostService, type FitCost } from '../plans/fit-cost.service.js';
import type { Place } from '../workshops/great-circle.js';
import { itemsOf, JudgingService, workOf, type Judged } from './judging.service.js';
import { matchDetail, matchRow } from './match-row.js';

const verdictOrder: readonly Verdict[] = [
  'bolts-straight-in',
  'fits-with-work',
  'needs-an-answer',
  'wont-fit',
];
const wontFit = verdictOrder.indexOf('wont-fit');
const noCost: FitCost = { partsMinor: null, selfFitMinor: null, fittedMinor: null, earliest: null };

/** What the order of the rows is made from, before any row is. */
interface Ranked {
  shock: ShockFacts;
  cost: FitCost;
  group: number;
  /** Null for a shock that a cheap check has refused: it is judged in full only when its row is sent. */
  judged: Judged | null;
}

/** The cheapest way to have it: fitted or, where allowed, by oneself. */
const allIn = ({ cost }: Ranked): number => cost.fittedMinor ?? cost.partsMinor ?? Number.MAX_SAFE_INTEGER;

const compare = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

const orders: Record<MatchesQuery['order'], (a: Ranked, b: Ranked) => number> = {
  cheapest: (a, b) => allIn(a) - allIn(b),
  earliest: (a, b) => compare(a.cost.earliest?.day ?? '9999', b.cost.earliest?.day ?? '9999'),
  lightest: (a, b) => a.shock.massG - b.shock.massG,
};

@Injectable()
export class MatchesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly judging: JudgingService,
    private readonly costs: FitCostService,
  ) {}

  /** The fitting sheet: every size on sale judged, narrowed by the sentence, grouped by verdict. */
  async matches(measureUpId: string, query: MatchesQuery): Promise<MatchesView> {
    const { open, judged, refused, judgeRefused } = await this.judging.screenAll(measureUpId);
    const applied = appliedTo(open, query);
    const counts = Object.fromEntries(verdictOrder.map((verdict) => [verdict, 0])) as Record<Verdict, number>;
    for (const { judgement } of judged) counts[judgement.verdict] += 1;
    counts['wont-fit'] += refused.length;

    const mayFit = judged.filter(
      ({ shock, judgement }) =>
        wanted(shock, applied) && (judgement.verdict !== 'wont-fit' || applied.wontFit === 'shown'),
    );
    const asked = applied.wontFit === 'shown' ? refused.filter((shock) => wanted(shock, applied)) : [];
    const priced = mayFit.filter(({ judgement }) => judgement.verdict !== 'wont-fit');
    const costs = await this.costs.quoteMany(priced.map(requestOf), await this.placeOf(open));
    const ranked = [
      ...mayFit.map((one) => ranking(one, costs.get(one.shock.sizeId) ?? noCost)),
      ...asked.map((shock) => ({ shock, cost: noCost, group: wontFit, judged: null })),
    ].filter((one) => applied.maxMinor === null || one.group === wontFit || allIn(one) <= applied.maxMinor);
    ranked.sort(
      (a, b) => a.group - b.group || orders[applied.order](a, b) || compare(a.shock.sizeId, b.shock.sizeId),
    );
    const sent = ranked.slice(0, query.limit);
    // Figures of a refused shock are made only for a rider who sees them.
    const late = new Map(
      judgeRefused(sent.flatMap(({ judged: one, shock }) => (one ? [] : [shock]))).map((one) => [
        one.shock,
        one,
      ]),
    );
    const hiddenRefusals = applied.wontFit === 'hidden' ? counts['wont-fit'] : 0;
    return {
      measureUpId,
      revision: open.revision,
      title: open.side.frame.name,
      sheetNote: sheetNote(open),
      own: own(open),
      rider: { kg: riderKg(open), sagWindow: sagText(open.side) },
      applied,
      counts,
      leftOut: judged.length + refused.length - ranked.length - hiddenRefusals,
      rows: sent.flatMap(({ judged: early, shock, cost }) => {
        const one = early ?? late.get(shock);
        return one ? [matchRow(one, cost)] : [];
      }),
      more: ranked.length - sent.length,
    };
  }

  async detail(measureUpId: string, sizeId: string): Promise<MatchDetail> {
    const one = await this.judging.judgeOne(measureUpId, sizeId);
    const costs =
      one.judgement.verdict === 'wont-fit'
        ? new Map<string, FitCost>()
        : await this.costs.quoteMany([requestOf(one)], await this.placeOf(one.open));
    return matchDetail(one, costs.get(sizeId) ?? noCost);
  }

  /** Where the rider is, for distances; null while not told. */
  async placeOf(open: OpenMeasureUp): Promise<Place | null> {
    const place = known(open.answers, 'place');
    return place && this.dataSource.manager.findOneBy(Town, { id: place.townId });
  }
}

const ranking = (judged: Judged, cost: FitCost): Ranked => ({
  shock: judged.shock,
  cost,
  group: verdictOrder.indexOf(judged.judgement.verdict),
  judged,
});

const requestOf = (one: Judged) => ({
  key: one.shock.sizeId,
  items: itemsOf(one),
  work: workOf(one.judgement),
  selfFitAllowed: one.judgement.selfFitAllowed,
});

function appliedTo(open: OpenMeasureUp, query: MatchesQuery): MatchesView['applied'] {
  const { rider } = open.side;
  return {
    spring: query.spring ?? rider.springWish,
    reservoir: query.reservoir ?? rider.reservoirWish,
    maxMinor: query.maxMinor ?? known(open.answers, 'budget')?.maxMinor ?? null,
    order: query.order,
    wontFit: query.wontFit,
  };
}

function wanted(shock: ShockFacts, { spring, reservoir }: MatchesView['applied']): boolean {
  if (spring !== 'either' && shock.spring.kind !== spring) return false;
  return reservoir === 'either' || (shock.reservoir !== null) === (reservoir === 'with');
}

const riderKg = ({ side: { rider } }: OpenMeasureUp): number | null =>
  rider.riderKg === null ? null : rider.riderKg + (rider.kitKg ?? 0);

function sheetNote({ sheet, side }: OpenMeasureUp): string {
  if (!sheet)
    return `${side.frame.name} is not in our list; its size comes from your present shock, not from its maker.`;
  const listed = [...new Set(sheet.entries.map((entry) => entry.sizeKey))].join(' and ');
  return `The frame sheet of the ${frameName(sheet)}, version ${sheet.version}, lists ${listed}.`;
}

function own(open: OpenMeasureUp): MatchesView['own'] {
  const { side } = open;
  const size = sizeResult(side);
  const drawing = presentDrawing(side, size);
  if (!drawing) return null;
  const { present } = side;
  const word = (kind: typeof present.bodyEndKind): string => (kind ? mountWord(kind) : 'not known');
  return {
    drawing,
    sizeText: size.sizeKey ?? `${drawing.eyeToEyeMm} x ${drawing.strokeMm ?? '?'}`,
    mounts:
      present.bodyEndKind || present.shaftEndKind
        ? `${word(present.bodyEndKind)} / ${word(present.shaftEndKind)}`
        : 'not told',
    spring: present.spring ?? 'not known',
    remote: present.remoteAction?.replaceAll('-', ' ') ?? 'not known',
  };
}
