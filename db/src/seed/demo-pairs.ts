import type {
  AnswerKind,
  CheckId,
  FitQuestion,
  FrameFacts,
  PresentShock,
  RiderFacts,
  ShockFacts,
} from '@linkfell/fit-engine';

import { partsOnSale } from './parts-on-sale.js';
import type { Scenario } from './scenario.js';
import { readOne } from './seed-files.js';

interface PairInFile {
  name: string;
  check: CheckId;
  answer: AnswerKind;
  code: string;
  /** A listed frame, or else the facts of a described one. */
  frameId?: string;
  frame?: FrameFacts;
  shockItemId: string;
  rider: Partial<RiderFacts>;
  present: Partial<PresentShock>;
  /** Checks that rest on the same unknown and therefore give the same answer. */
  together: CheckId[];
  note: string;
}
interface PairsFile {
  usualRider: RiderFacts;
  usualPresent: PresentShock;
  pairs: PairInFile[];
}

/** A bike and a shock where one check alone decides. */
export interface DemoPair extends Pick<
  PairInFile,
  'name' | 'check' | 'answer' | 'code' | 'together' | 'note'
> {
  question: FitQuestion;
}

function found<T>(thing: T | undefined, what: string): T {
  if (thing === undefined) throw new Error(`The demo data have no ${what}`);
  return thing;
}

const named = (things: readonly { id: string; name: string }[], id: string): string =>
  found(
    things.find((thing) => thing.id === id),
    id,
  ).name;

/** A frame of the scenario as the engine is told it. */
export function frameFacts(s: Scenario, id: string): FrameFacts {
  const { makerId, model, sheet } = found(
    s.frames.find((frame) => frame.id === id),
    `frame ${id}`,
  );
  return {
    ...sheet.facts,
    origin: 'sheet',
    id,
    name: `${named(s.makers, makerId)} ${model}`,
    sheetVersion: sheet.version,
    entries: sheet.entries,
  };
}

/** A shock size of the scenario as the engine is told it. */
export function shockFacts(s: Scenario, id: string): ShockFacts {
  const { makerId, modelId, sizeKey, facts } = found(
    s.shockSizes.find((size) => size.id === id),
    `shock ${id}`,
  );
  const names = { makerName: named(s.makers, makerId), modelName: named(s.shockModels, modelId) };
  return { ...facts, sizeId: id, sizeKey, ...names };
}

/** The demo pairs of db/seeds/demo-pairs.json as questions to the engine. */
export function readDemoPairs(s: Scenario): DemoPair[] {
  const { usualRider, usualPresent, pairs } = readOne<PairsFile>('demo-pairs');
  const sale = partsOnSale(s);
  return pairs.map(({ frameId, frame, shockItemId, rider, present, ...pair }) => ({
    ...pair,
    question: {
      frame: frame ?? frameFacts(s, found(frameId, `frame for "${pair.name}"`)),
      shock: shockFacts(s, shockItemId),
      rider: { ...usualRider, ...rider },
      present: { ...usualPresent, ...present },
      sale,
    },
  }));
}
