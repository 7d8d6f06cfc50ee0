import type { AnswerKind, CheckAnswer, CheckId, SpringForRider } from '../answers.js';
import type { SheetEntry } from '../facts.js';
import { rankOf, type Trial } from './context.js';
import { diameterCheck } from './diameter.js';
import { hardwareCheck } from './hardware.js';
import { mountsCheck } from './mounts.js';
import { eBikeCheck, noticesCheck, positionCheck, readingConflictCheck } from './others.js';
import { pressureCheck } from './pressure.js';
import { remoteCheck } from './remote.js';
import { reservoirCheck, type ReservoirAnswer } from './reservoir.js';
import { riderWeightCheck } from './rider-weight.js';
import { sizeChecks } from './size.js';
import { springRateCheck } from './spring-rate.js';
import { coilOnYokeCheck, springTypeCheck } from './spring-type.js';

/** Every check by itself, as the table of facts and the tests call them. */
export const checks: Readonly<Record<CheckId, (trial: Trial) => CheckAnswer>> = {
  'eye-to-eye': (trial) => sizeChecks(trial)[0],
  stroke: (trial) => sizeChecks(trial)[1],
  mounts: mountsCheck,
  hardware: hardwareCheck,
  'spring-type': springTypeCheck,
  'coil-on-yoke': coilOnYokeCheck,
  'spring-rate': (trial) => springRateCheck(trial).answer,
  pressure: (trial) => pressureCheck(trial).answer,
  'rider-weight': riderWeightCheck,
  reservoir: (trial) => reservoirCheck(trial).answer,
  diameter: diameterCheck,
  remote: remoteCheck,
  position: positionCheck,
  'e-bike': eBikeCheck,
  notices: noticesCheck,
  'reading-conflict': readingConflictCheck,
};

export interface Outcome {
  trial: Trial;
  answers: CheckAnswer[];
  spring: SpringForRider | null;
  positionDeg: number | null;
}

/** A trial with its cheap checks done, in the order in which they are shown; the reservoir comes between. */
export interface Begun {
  trial: Trial;
  before: CheckAnswer[];
  after: CheckAnswer[];
  spring: SpringForRider | null;
  /** The least that it can cost: as if the reservoir passed. */
  cost: number[];
}

export const ways = ['body-to-frame', 'body-to-link'] as const;

/**
 * The cheap checks of a shock against some entries, both ways round. What depends neither on the entry nor on the way
 * is answered once, what depends on the entry alone once for both ways: a catalogue of shocks is judged in one go.
 */
export function beginAll(base: Omit<Trial, 'entry' | 'wayRound'>, entries: readonly SheetEntry[]): Begun[] {
  const [first] = entries;
  if (!first) return [];
  const any: Trial = { ...base, entry: first, wayRound: ways[0] };
  const springType = springTypeCheck(any);
  const weight = riderWeightCheck(any);
  const diameter = diameterCheck(any);
  const remote = remoteCheck(any);
  const others = [eBikeCheck(any), noticesCheck(any), readingConflictCheck(any)];
  return entries.flatMap((entry) => {
    const one: Trial = { ...base, entry, wayRound: ways[0] };
    const [eye, stroke] = sizeChecks(one);
    const yoke = coilOnYokeCheck(one);
    const [rate, pressure] = [springRateCheck(one), pressureCheck(one)];
    const spring = base.shock.spring.kind === 'coil' ? rate.spring : pressure.spring;
    return ways.map((wayRound): Begun => {
      const trial: Trial = { ...base, entry, wayRound };
      const [mounts, hardware] = [mountsCheck(trial), hardwareCheck(trial)];
      const before = [eye, stroke, mounts, hardware, springType, yoke, rate.answer, pressure.answer, weight];
      const after = [diameter, remote, positionCheck(trial), ...others];
      return { trial, before, after, spring, cost: costOf(before, after) };
    });
  });
}

/** The costly check, only while nothing cheap has failed or the whole is asked for. */
export function finish({ trial, before, after, spring, cost }: Begun): Outcome {
  const open = trial.full || cost[0] !== rankOf('fail');
  const room = open ? reservoirCheck(trial) : null;
  return {
    trial,
    answers: room ? [...before, room.answer, ...after] : [...before, ...after],
    spring,
    positionDeg: room?.positionDeg ?? null,
  };
}

/** All answers of one way of putting a shock in, without trying any other. */
export function outcomeOf(trial: Trial, room: ReservoirAnswer | null): Outcome {
  const [eye, stroke] = sizeChecks(trial);
  const [rate, pressure] = [springRateCheck(trial), pressureCheck(trial)];
  const answers = [eye, stroke, mountsCheck(trial), hardwareCheck(trial), springTypeCheck(trial)];
  answers.push(coilOnYokeCheck(trial), rate.answer, pressure.answer, riderWeightCheck(trial));
  if (room) answers.push(room.answer);
  answers.push(diameterCheck(trial), remoteCheck(trial), positionCheck(trial));
  answers.push(eBikeCheck(trial), noticesCheck(trial), readingConflictCheck(trial));
  const spring = trial.shock.spring.kind === 'coil' ? rate.spring : pressure.spring;
  return { trial, answers, spring, positionDeg: room?.positionDeg ?? null };
}

/** The worst answer, then how many fail, are not known, need work; then parts. */
export function costOf(...lists: readonly (readonly CheckAnswer[])[]): number[] {
  let [fail, unknown, work, parts] = [0, 0, 0, 0];
  for (const answers of lists) {
    for (const given of answers) {
      parts += given.parts.length;
      if (given.answer === 'fail') fail += 1;
      else if (given.answer === 'unknown') unknown += 1;
      else if (given.answer === 'work') work += 1;
    }
  }
  const worst: AnswerKind = fail > 0 ? 'fail' : unknown > 0 ? 'unknown' : work > 0 ? 'work' : 'pass';
  return [rankOf(worst), fail, unknown, work, parts];
}

interface Costed {
  cost: readonly number[];
  trial: Trial;
}

/** Order of preference; on a tie the first entry by id, body to the frame, so that no order of input matters. */
export function compare(a: Costed, b: Costed): number {
  for (let i = 0; i < a.cost.length; i += 1) {
    const difference = (a.cost[i] ?? 0) - (b.cost[i] ?? 0);
    if (difference !== 0) return difference;
  }
  if (a.trial.entry.id !== b.trial.entry.id) return a.trial.entry.id < b.trial.entry.id ? -1 : 1;
  if (a.trial.wayRound === b.trial.wayRound) return 0;
  return a.trial.wayRound === 'body-to-frame' ? -1 : 1;
}
