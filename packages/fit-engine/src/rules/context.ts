import type {
  AnswerKind,
  AskNeed,
  CheckAnswer,
  CheckId,
  Figure,
  PartNeed,
  SpringForRider,
  WorkNeed,
} from '../answers.js';
import type { FitQuestion, FrameEnd, SheetEntry, ShockMount, Source } from '../facts.js';
import type { SizeResult } from '../sizing/resolve-size.js';
import type { ReasonCode } from '../messages/reason-codes.js';
import type { Applies } from './entry-applies.js';
import type { Ride, RideResult } from './ride.js';

export interface SpringAnswer {
  answer: CheckAnswer;
  spring: SpringForRider | null;
}

/** What all shocks of one judgement share. */
export interface Shared {
  size: SizeResult;
  /** Which entries speak for the rider's bike. */
  applies: Map<SheetEntry, Applies>;
  /** Load, window and leverage by entry and stroke. */
  rides: Map<SheetEntry, Map<string, RideResult>>;
  /** Progression of the leverage by entry, %; null where it is not known. */
  progressions: Map<SheetEntry, number | null>;
  /** Springs already chosen, by what they depend on. */
  coils: Map<Ride, Map<string, SpringAnswer>>;
}

/** One way of putting this shock in: against one entry of the sheet, one way round. */
export interface Trial extends FitQuestion {
  shared: Shared;
  entry: SheetEntry;
  wayRound: 'body-to-frame' | 'body-to-link';
  /** Look at the costly checks even if a cheap one has failed. */
  full: boolean;
}

export interface TrialEnd {
  end: 'frame' | 'link';
  frame: FrameEnd | null;
  shock: ShockMount;
}

/** The two ends as this way round brings them together. */
export function endsOf({ entry, shock, wayRound }: Trial): readonly [TrialEnd, TrialEnd] {
  const bodyAtFrame = wayRound === 'body-to-frame';
  return [
    { end: 'frame', frame: entry.frameEnd, shock: bodyAtFrame ? shock.bodyEnd : shock.shaftEnd },
    { end: 'link', frame: entry.linkEnd, shock: bodyAtFrame ? shock.shaftEnd : shock.bodyEnd },
  ];
}

interface Extras {
  figures?: readonly (Figure | null)[];
  remark?: boolean;
  parts?: readonly PartNeed[];
  work?: readonly WorkNeed[];
  ask?: readonly AskNeed[];
}

const none: readonly never[] = Object.freeze([]);
const plain = new Map<string, CheckAnswer>();

/** An answer without figures or needs is the same for every shock: one object serves them all. */
function plainAnswer(check: CheckId, kind: AnswerKind, code: ReasonCode): CheckAnswer {
  const key = `${check} ${code}`;
  const before = plain.get(key);
  if (before) return before;
  const made: CheckAnswer = Object.freeze({
    check,
    answer: kind,
    code,
    figures: none,
    remark: false,
    parts: none,
    work: none,
    ask: none,
  });
  plain.set(key, made);
  return made;
}

/** Builds an answer; figures that are null are left out. */
export function answer(check: CheckId, kind: AnswerKind, code: ReasonCode, extras?: Extras): CheckAnswer {
  if (!extras) return plainAnswer(check, kind, code);
  const { figures = none, remark = false, parts = none, work = none, ask = none } = extras;
  return {
    check,
    answer: kind,
    code,
    figures: figures.includes(null) ? figures.filter((one) => one !== null) : (figures as readonly Figure[]),
    remark,
    parts,
    work,
    ask,
  };
}

export const figure = (
  key: string,
  value: number | string | null,
  unit: Figure['unit'],
  source: Source,
): Figure => ({ key, value, unit, source });

export const riderSaid: Source = { kind: 'rider', label: 'Your answer', date: null };
export const computed: Source = { kind: 'computed', label: 'Computed', date: null };
export const practice: Source = { kind: 'practice', label: 'Common practice', date: null };

const rank: Record<AnswerKind, number> = { pass: 0, work: 1, unknown: 2, fail: 3 };
export const rankOf = (kind: AnswerKind): number => rank[kind];
export const worst = (answers: readonly CheckAnswer[]): AnswerKind =>
  answers.reduce<AnswerKind>((bad, { answer: kind }) => (rank[kind] > rank[bad] ? kind : bad), 'pass');
