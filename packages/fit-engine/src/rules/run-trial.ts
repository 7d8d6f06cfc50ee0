import type { CheckAnswer, CheckId, SpringForRider } from '../answers.js';
import { rankOf, worst, type Trial } from './context.js';
import { diameterCheck } from './diameter.js';
import { hardwareCheck } from './hardware.js';
import { mountsCheck } from './mounts.js';
import { eBikeCheck, noticesCheck, positionCheck, readingConflictCheck } from './others.js';
import { pressureCheck } from './pressure.js';
import { remoteCheck } from './remote.js';
import { reservoirCheck } from './reservoir.js';
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

export function begin(trial: Trial): Begun {
  const [eye, stroke] = sizeChecks(trial);
  const rate = springRateCheck(trial);
  const pressure = pressureCheck(trial);
  const before = [
    eye,
    stroke,
    mountsCheck(trial),
    hardwareCheck(trial),
    springTypeCheck(trial),
    coilOnYokeCheck(trial),
    rate.answer,
    pressure.answer,
    riderWeightCheck(trial),
  ];
  const after = [
    diameterCheck(trial),
    remoteCheck(trial),
    positionCheck(trial),
    eBikeCheck(trial),
    noticesCheck(trial),
    readingConflictCheck(trial),
  ];
  const spring = trial.shock.spring.kind === 'coil' ? rate.spring : pressure.spring;
  return { trial, before, after, spring, cost: costOf([...before, ...after]) };
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

/** The worst answer, then how many fail, are not known, need work; then parts. */
export function costOf(answers: readonly CheckAnswer[]): number[] {
  const counts = [0, 0, 0, 0];
  let parts = 0;
  for (const given of answers) {
    counts[rankOf(given.answer)] = (counts[rankOf(given.answer)] ?? 0) + 1;
    parts += given.parts.length;
  }
  return [rankOf(worst(answers)), counts[3] ?? 0, counts[2] ?? 0, counts[1] ?? 0, parts];
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
