import type { WorkId } from '@linkfell/contracts';
import {
  judge,
  judgeAll,
  sift,
  type FitQuestion,
  type Judgement,
  type SheetEntry,
  type ShockFacts,
} from '@linkfell/fit-engine';
import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

import { CommonException } from '../common/problems/problem.exception.js';
import { known } from '../measure-ups/answers.js';
import { MeasureUpsService, type OpenMeasureUp } from '../measure-ups/measure-ups.service.js';
import { MeasureUpsException } from '../measure-ups/measure-ups.exception.js';
import { CatalogueService } from '../shocks/catalogue.service.js';

/** One shock judged for one measure-up. */
export interface Judged {
  shock: ShockFacts;
  judgement: Judgement;
  entry: SheetEntry | null;
}

/** A catalogue gone through for one measure-up. */
interface Screened {
  open: OpenMeasureUp;
  judged: Judged[];
  refused: ShockFacts[];
  /** All that there is to say of refused shocks, for a rider who wants to see them. */
  judgeRefused: (some: readonly ShockFacts[]) => Judged[];
}

/** The work to be named to a workshop: putting the shock in, and all that the judgement adds. */
export const workOf = ({ work }: Judgement): WorkId[] => ['fit-shock', ...work.map(({ id }) => id)];

/** The items to be bought, the shock first. */
export const itemsOf = ({ shock, judgement }: Judged): { itemId: string; quantity: number }[] => {
  const counted = new Map<string, number>([[shock.sizeId, 1]]);
  for (const part of judgement.parts)
    counted.set(part.partId, (counted.get(part.partId) ?? 0) + part.quantity);
  return [...counted].map(([itemId, quantity]) => ({ itemId, quantity }));
};

/** Brings measure-ups and catalogue before the engine. */
@Injectable()
export class JudgingService {
  constructor(
    private readonly measureUps: MeasureUpsService,
    private readonly catalogue: CatalogueService,
  ) {}

  /** Every size on sale: those that may fit are judged, the many that a cheap check refuses are left for `judgeRefused`. */
  async screenAll(measureUpId: string): Promise<Screened> {
    const open = await this.ready(measureUpId);
    const { shocks, parts } = await this.catalogue.snapshot();
    const base = { ...open.side, sale: parts };
    const sifted = sift(base, shocks);
    const judged = sifted.judged.map(({ shock, judgement }) => withEntry(open, shock, judgement));
    const judgeRefused = (some: readonly ShockFacts[]): Judged[] =>
      some.length === 0
        ? []
        : judgeAll(base, some).map((judgement, i) => withEntry(open, some[i] as ShockFacts, judgement));
    return { open, judged, refused: sifted.refused, judgeRefused };
  }

  /** @throws CommonException "not-found" for a size that is in no catalogue */
  async judgeOne(
    measureUpId: string,
    sizeId: string,
    manager?: EntityManager,
  ): Promise<Judged & { open: OpenMeasureUp; question: FitQuestion; names: Map<string, string> }> {
    const open = await this.ready(measureUpId, manager);
    const { byId, parts, names } = await this.catalogue.snapshot();
    const shock = byId.get(sizeId) ?? (await this.catalogue.shock(sizeId));
    if (!shock) throw new CommonException('not-found');
    const question = { ...open.side, shock, sale: parts };
    return { open, question, names, ...withEntry(open, shock, judge(question, { full: true })) };
  }

  private async ready(id: string, manager?: EntityManager): Promise<OpenMeasureUp> {
    const open = await this.measureUps.open(id, manager);
    if (!known(open.answers, 'frame')) throw new MeasureUpsException('no-frame-yet');
    return open;
  }
}

const withEntry = (open: OpenMeasureUp, shock: ShockFacts, judgement: Judgement): Judged => ({
  shock,
  judgement,
  entry: open.side.frame.entries.find((entry) => entry.id === judgement.entryId) ?? null,
});
