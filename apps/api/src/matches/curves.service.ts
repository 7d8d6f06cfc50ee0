import type { CurvesView, RideView } from '@linkfell/contracts';
import {
  rideSeries,
  riderLoad,
  sizeOf,
  type RiderLoad,
  type SheetEntry,
  type ShockFacts,
  type SpringToDraw,
} from '@linkfell/fit-engine';
import { Injectable } from '@nestjs/common';

import { sizeResult } from '../measure-ups/size-view.js';
import { CatalogueService } from '../shocks/catalogue.service.js';
import { assumedIn, notDrawnWords, shockName, springText, type Drawn } from './curves-words.js';
import { JudgingService } from './judging.service.js';

/** Collar pitch where none is printed, mm a turn (common practice); one turn of preload is drawn. */
const usualPitchMm = 1;

/** Present and new shock as curves over the wheel's travel, worked out by the engine. */
@Injectable()
export class CurvesService {
  constructor(
    private readonly judging: JudgingService,
    private readonly catalogue: CatalogueService,
  ) {}

  /** @param presentId the shock that the rider has now, where it is in our list; another id counts as none */
  async curves(measureUpId: string, sizeId: string, presentId: string | null): Promise<CurvesView> {
    const { open, shock, judgement, entry } = await this.judging.judgeOne(measureUpId, sizeId);
    const { side } = open;
    const { frame, present, rider } = side;
    const load = riderLoad(rider, frame.sagTargetPercent?.value ?? null);
    const notDrawn: string[] = load ? [] : [notDrawnWords.rider];

    const fits = !judgement.answers.some(
      ({ check, answer }) => (check === 'eye-to-eye' || check === 'stroke') && answer === 'fail',
    );
    const next = fits && entry ? this.drawn(entry, shock, load, judgement.spring) : null;
    if (!next) notDrawn.push(fits ? notDrawnWords.frame(shock) : notDrawnWords.size(shock));
    else if (!next.view.spring && load) notDrawn.push(notDrawnWords.spring(shock));

    const size = sizeResult(side);
    const key = size.state === 'settled' ? size.sizeKey : null;
    const listed = frame.entries.flatMap((one) => one.sizeKey ?? []);
    const { shocks } = await this.catalogue.snapshot();
    const mayBe = shocks
      .filter((one) => one.sizeId !== sizeId && (key ? one.sizeKey === key : listed.includes(one.sizeKey)))
      .sort((a, b) => (shockName(a) < shockName(b) ? -1 : 1));
    const chosen = mayBe.find((one) => one.sizeId === presentId) ?? null;

    const presentKey = chosen?.sizeKey ?? key;
    const presentEntry = [entry, ...frame.entries].find(
      (one) => one && (one.sizeKey ?? presentKey) === presentKey,
    );
    let now: Drawn | null = null;
    if (presentKey === null) notDrawn.push(notDrawnWords.presentSize);
    else if (!presentEntry) notDrawn.push(notDrawnWords.presentNotListed(presentKey));
    else {
      now = this.drawn(presentEntry, chosen ?? { sizeKey: presentKey, spring: present.spring }, load, null);
      if (!now) notDrawn.push(notDrawnWords.presentFrame);
      else if (!now.view.spring && load) {
        notDrawn.push(chosen ? notDrawnWords.spring(chosen) : notDrawnWords.presentSpring(present.spring));
      }
    }
    return {
      frameName: frame.name,
      shockName: shockName(shock),
      next: next?.view ?? null,
      present: now?.view ?? null,
      loadN: load?.loadN ?? null,
      notDrawn,
      assumed: assumedIn(load, [next, now]),
      choices: mayBe.map((one) => ({ sizeId: one.sizeId, name: shockName(one) })),
      chosen: chosen?.sizeId ?? null,
    };
  }

  /** One shock in one entry of the sheet; null where travel and stroke make no curve. */
  private drawn(
    entry: SheetEntry,
    shock: ShockFacts | { sizeKey: string; spring: 'air' | 'coil' | null },
    load: RiderLoad | null,
    chosen: { rateNPerMm: number | null; preloadMm: number | null } | null,
  ): Drawn | null {
    const sizeKey = entry.sizeKey ?? shock.sizeKey;
    const strokeMm = sizeOf(sizeKey)?.strokeMm;
    if (strokeMm === undefined) return null;
    const spring = toDraw(shock.spring, chosen);
    const series = rideSeries({ table: entry.curve, travelMm: entry.travelMm, strokeMm }, load, spring);
    if (!series) return null;
    const { travelMm, meanRatio, progressionPercent, constant, points } = series;
    const known = 'sizeId' in shock;
    return {
      constant,
      spring: series.spring ? spring : null,
      rateChosen: chosen !== null && chosen.rateNPerMm !== null,
      view: {
        name: known ? shockName(shock) : 'Your present shock',
        ...{ sizeKey, travelMm, meanRatio, progressionPercent },
        points: [...points],
        spring: series.spring && { text: springText(series.spring), ...figuresOf(series.spring) },
      },
    };
  }
}

function toDraw(
  spring: ShockFacts['spring'] | 'air' | 'coil' | null,
  chosen: { rateNPerMm: number | null; preloadMm: number | null } | null,
): SpringToDraw | null {
  if (spring === 'coil') return { kind: 'coil', rateNPerMm: null, preloadMm: usualPitchMm };
  if (spring === null || spring === 'air') return null;
  if (spring.kind === 'air') return spring.chambers && { kind: 'air', chambers: spring.chambers.value };
  const preloadMm = chosen?.preloadMm ?? spring.collarPitchMm ?? usualPitchMm;
  return { kind: 'coil', rateNPerMm: chosen?.rateNPerMm ?? null, preloadMm };
}

const figuresOf = ({
  sagPercent,
  sagMm,
  sagWheelMm,
  frequencyHz,
  endToStatic,
  energyJ,
}: Omit<NonNullable<RideView['spring']>, 'text'>) => ({
  ...{ sagPercent, sagMm, sagWheelMm, frequencyHz, endToStatic, energyJ },
});
