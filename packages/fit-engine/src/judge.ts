import type { Judgement, PartNeed, Verdict, WorkNeed } from './answers.js';
import { advise } from './advice.js';
import type { FitQuestion, ShockFacts } from './facts.js';
import { rankOf, worst, type Shared } from './rules/context.js';
import { entryApplies } from './rules/entry-applies.js';
import { beginAll, compare, costOf, finish, type Begun, type Outcome } from './rules/run-trial.js';
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

function judgeWith(question: FitQuestion, shared: Shared, full: boolean): Judgement {
  const { entries } = question.frame;
  // An entry for another year, size or chip position must neither save a shock nor condemn it.
  const speaking = entries.filter((entry) => shared.applies.get(entry)?.state !== 'no');
  const trials = beginAll({ ...question, shared, full }, speaking.length > 0 ? speaking : entries);
  const best = bestOf(trials);
  if (!best) throw new RangeError('a frame needs at least one entry');
  const { answers, trial, spring, positionDeg } = best;
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
export const judge = (question: FitQuestion, { full = false } = {}): Judgement =>
  judgeWith(question, sharedBy(question), full);

/** The same for many shocks; what does not depend on the shock is worked out once. */
export function judgeAll(base: Omit<FitQuestion, 'shock'>, shocks: readonly ShockFacts[]): Judgement[] {
  const shared = sharedBy(base);
  return shocks.map((shock) => judgeWith({ ...base, shock }, shared, false));
}
