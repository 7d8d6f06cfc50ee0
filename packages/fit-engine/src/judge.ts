import type { Judgement, PartNeed, Refusal, Verdict, WorkNeed } from './answers.js';
import { advise } from './advice.js';
import type { FitQuestion, SheetEntry, ShockFacts } from './facts.js';
import { rankOf, worst, type Shared } from './rules/context.js';
import { entryApplies } from './rules/entry-applies.js';
import { beginAll, compare, costOf, finish, type Begun, type Outcome } from './rules/run-trial.js';
import { Screen } from './screening/screen.js';
import { presentSize } from './sizing/present-size.js';

const verdicts: readonly Verdict[] = ['bolts-straight-in', 'fits-with-work', 'needs-an-answer', 'wont-fit'];

/** The best outcome; a trial that could not beat the best so far even with room for the reservoir is not swept. */
function bestOf(trials: readonly Begun[]): Outcome | null {
  let best: (Outcome & { cost: number[] }) | null = null;
  for (const begun of [...trials].sort(compare)) {
    if (best && compare(best, begun) <= 0) break;
    const outcome = finish(begun);
    const costed = { ...outcome, cost: costOf(outcome.answers) };
    if (!best || compare(costed, best) < 0) best = costed;
  }
  return best;
}

/** An entry for another year, size or chip position must neither save a shock nor condemn it. */
function speakingEntries({ frame }: Pick<FitQuestion, 'frame'>, shared: Shared): readonly SheetEntry[] {
  const speaking = frame.entries.filter((entry) => shared.applies.get(entry)?.state !== 'no');
  return speaking.length > 0 ? speaking : frame.entries;
}

function judgementOf({ answers, trial, spring, positionDeg }: Outcome): Judgement {
  const parts: PartNeed[] = [];
  const work: WorkNeed[] = [];
  for (const given of answers) {
    parts.push(...given.parts);
    work.push(...given.work);
  }
  return {
    verdict: verdicts[rankOf(worst(answers))] ?? 'wont-fit',
    answers,
    entryId: trial.entry.id,
    wayRound: trial.wayRound,
    reservoirPositionDeg: positionDeg,
    parts,
    work,
    spring,
    advice: advise(trial),
    selfFitAllowed: !work.some(({ workshopOnly }) => workshopOnly),
  };
}

/** What all shocks of one question share. */
function sharedBy({ frame, present, rider }: Pick<FitQuestion, 'frame' | 'present' | 'rider'>): Shared {
  return {
    size: presentSize(frame, present),
    applies: new Map(frame.entries.map((entry) => [entry, entryApplies(frame, rider, entry)])),
    rides: new Map(),
    progressions: new Map(),
    coils: new Map(),
  };
}

/**
 * Whether a shock fits: every check against the best entry of the sheet and the better way round; the verdict is
 * the worst answer.
 * @param full look at the costly checks even where a cheap one has refused
 * @throws RangeError for a frame without entries
 */
export function judge(question: FitQuestion, { full = false } = {}): Judgement {
  const shared = sharedBy(question);
  const best = bestOf(beginAll({ ...question, shared, full }, speakingEntries(question, shared)));
  if (!best) throw new RangeError('a frame needs at least one entry');
  return judgementOf(best);
}

function screenOf(base: Omit<FitQuestion, 'shock'>): Screen {
  const shared = sharedBy(base);
  return new Screen(base, shared, speakingEntries(base, shared));
}

/**
 * The same for many shocks; what does not depend on the shock is worked out once.
 * @throws RangeError for a frame without entries
 */
export function judgeAll(base: Omit<FitQuestion, 'shock'>, shocks: readonly ShockFacts[]): Judgement[] {
  const screen = screenOf(base);
  return shocks.map((shock) => judgementOf(screen.outcome(shock)));
}

/**
 * A catalogue gone through: the judgement of every shock that may fit, and of the many that do not only which check
 * refuses them. Verdict, entry, way round and the first check that fails are those of `judge`. A shock that the
 * costly check alone refuses has its judgement too.
 * @throws RangeError for a frame without entries
 */
export function screenAll(
  base: Omit<FitQuestion, 'shock'>,
  shocks: readonly ShockFacts[],
): (Judgement | Refusal)[] {
  const screen = screenOf(base);
  return shocks.map((shock) => screen.refusal(shock) ?? judgementOf(screen.outcome(shock)));
}

/** A catalogue gone through for those that may fit. */
export interface Sifted<S extends ShockFacts> {
  /** Judged as `judge` does it; among them those that the costly check alone refuses. */
  judged: { shock: S; judgement: Judgement }[];
  /** Those that a cheap check refuses. */
  refused: S[];
}

/**
 * The same as `screenAll` where nobody asks what refuses the many that do not fit.
 * @throws RangeError for a frame without entries
 */
export function sift<S extends ShockFacts>(
  base: Omit<FitQuestion, 'shock'>,
  shocks: readonly S[],
): Sifted<S> {
  const screen = screenOf(base);
  const sifted: Sifted<S> = { judged: [], refused: [] };
  for (const shock of shocks) {
    if (screen.refuses(shock)) sifted.refused.push(shock);
    else sifted.judged.push({ shock, judgement: judgementOf(screen.outcome(shock)) });
  }
  return sifted;
}

/** Whether a shock that was gone through has its judgement, with answers and figures. */
export const isJudged = (one: Judgement | Refusal): one is Judgement => 'answers' in one;
