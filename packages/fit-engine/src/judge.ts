import type { CheckAnswer, Judgement, SpringForRider, Verdict } from './answers.js';
import { advise } from './advice.js';
import type { FitQuestion, ShockFacts } from './facts.js';
import { coilOnYokeCheck, springTypeCheck } from './rules/spring-type.js';
import { diameterCheck } from './rules/diameter.js';
import { eBikeCheck, noticesCheck, positionCheck, readingConflictCheck } from './rules/others.js';
import { hardwareCheck } from './rules/hardware.js';
import { mountsCheck } from './rules/mounts.js';
import { pressureCheck } from './rules/pressure.js';
import { remoteCheck } from './rules/remote.js';
import { reservoirCheck } from './rules/reservoir.js';
import { riderWeightCheck } from './rules/rider-weight.js';
import { entryApplies, sizeChecks } from './rules/size.js';
import { springRateCheck } from './rules/spring-rate.js';
import { answer, rankOf, worst, type Shared, type Trial } from './rules/context.js';
import { resolveSize } from './sizing/resolve-size.js';

const verdicts: readonly Verdict[] = ['bolts-straight-in', 'fits-with-work', 'needs-an-answer', 'wont-fit'];

interface Outcome {
  trial: Trial;
  answers: CheckAnswer[];
  spring: SpringForRider | null;
  positionDeg: number | null;
}

/** All checks of one trial, in the order in which they are shown; the sweep only while nothing cheap has failed. */
function runTrial(trial: Trial): Outcome {
  const [eye, stroke] = sizeChecks(trial);
  const rate = springRateCheck(trial);
  const pressure = pressureCheck(trial);
  const cheap = [
    eye,
    stroke,
    mountsCheck(trial),
    hardwareCheck(trial),
    springTypeCheck(trial),
    coilOnYokeCheck(trial),
    rate.answer,
    pressure.answer,
    riderWeightCheck(trial),
    diameterCheck(trial),
    remoteCheck(trial),
    positionCheck(trial),
    eBikeCheck(trial),
    noticesCheck(trial),
    readingConflictCheck(trial),
  ];
  const looked = trial.full || worst(cheap) !== 'fail';
  const room = looked ? reservoirCheck(trial) : null;
  const reservoir = room?.answer ?? answer('reservoir', 'pass', 'reservoir-inline');
  return {
    trial,
    answers: room ? [...cheap.slice(0, 9), reservoir, ...cheap.slice(9)] : cheap,
    spring: trial.shock.spring.kind === 'coil' ? rate.spring : pressure.spring,
    positionDeg: room?.positionDeg ?? null,
  };
}

/** Fewer fails, then fewer unknowns, then less work, then fewer parts. */
function cost({ answers }: Outcome): number[] {
  const count = (rank: number): number => answers.filter(({ answer: kind }) => rankOf(kind) === rank).length;
  return [
    rankOf(worst(answers)),
    count(3),
    count(2),
    count(1),
    answers.reduce((sum, { parts }) => sum + parts.length, 0),
  ];
}

function better(a: Outcome, b: Outcome): Outcome {
  const [costA, costB] = [cost(a), cost(b)];
  const index = costA.findIndex((value, i) => value !== costB[i]);
  return index >= 0 && (costB[index] ?? 0) < (costA[index] ?? 0) ? b : a;
}

function judgeWith(question: FitQuestion, shared: Shared, full: boolean): Judgement {
  const ways = ['body-to-frame', 'body-to-link'] as const;
  const { entries } = question.frame;
  // An entry for another year, size or chip has no say while there is one for this bike.
  const applying = entries.filter((entry) => entryApplies(question, entry) !== 'no');
  const outcomes = (applying.length > 0 ? applying : entries).flatMap((entry) =>
    ways.map((wayRound) => runTrial({ ...question, shared, entry, wayRound, full })),
  );
  const [first, ...others] = outcomes;
  if (!first) throw new RangeError('a frame needs at least one entry');
  const best = others.reduce(better, first);
  const { answers, trial, spring, positionDeg } = best;
  const work = answers.flatMap((given) => given.work);
  return {
    verdict: verdicts[rankOf(worst(answers))] ?? 'wont-fit',
    answers,
    entryId: trial.entry.id,
    wayRound: trial.wayRound,
    reservoirPositionDeg: positionDeg,
    parts: answers.flatMap((given) => given.parts),
    work,
    spring,
    advice: advise(trial),
    selfFitAllowed: !work.some(({ workshopOnly }) => workshopOnly),
  };
}

/** The size of the present shock as far as it bears on this frame. */
function sharedBy({ frame, present }: Pick<FitQuestion, 'frame' | 'present'>): Shared {
  const published = frame.origin === 'sheet' ? frame.entries.flatMap((entry) => entry.sizeKey ?? []) : null;
  const kinds = [present.bodyEndKind, present.shaftEndKind];
  const ends = frame.entries.flatMap((entry) => [entry.frameEnd, entry.linkEnd]);
  const trunnion = kinds.includes('trunnion') || ends.some((end) => end?.mount.kind === 'trunnion');
  const eyelet =
    !trunnion &&
    ((kinds[0] !== null && kinds[1] !== null) || (ends.length > 0 && ends.every((end) => end !== null)));
  return { size: resolveSize(present, published, trunnion ? 'trunnion' : eyelet ? 'eyelet' : null) };
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
