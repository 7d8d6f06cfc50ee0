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

/** All checks of one trial, in the order in which they are shown; the sweep only while nothing cheap has failed. */
export function runTrial(trial: Trial): Outcome {
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
  const open = trial.full || (worst(before) !== 'fail' && worst(after) !== 'fail');
  const room = open ? reservoirCheck(trial) : null;
  return {
    trial,
    answers: room ? [...before, room.answer, ...after] : [...before, ...after],
    spring: trial.shock.spring.kind === 'coil' ? rate.spring : pressure.spring,
    positionDeg: room?.positionDeg ?? null,
  };
}

/** Fewer fails, then fewer unknowns, then less work, then fewer parts. */
function cost({ answers }: Outcome): number[] {
  const counts = [0, 0, 0, 0];
  let parts = 0;
  for (const given of answers) {
    counts[rankOf(given.answer)] = (counts[rankOf(given.answer)] ?? 0) + 1;
    parts += given.parts.length;
  }
  return [rankOf(worst(answers)), counts[3] ?? 0, counts[2] ?? 0, counts[1] ?? 0, parts];
}

/** The better of two outcomes; on a tie the first entry by id, body to the frame, so that no order of input matters. */
export function better(a: Outcome, b: Outcome): Outcome {
  const [costA, costB] = [cost(a), cost(b)];
  for (let i = 0; i < costA.length; i += 1) {
    if (costA[i] !== costB[i]) return (costB[i] ?? 0) < (costA[i] ?? 0) ? b : a;
  }
  if (a.trial.entry.id !== b.trial.entry.id) return b.trial.entry.id < a.trial.entry.id ? b : a;
  return a.trial.wayRound === 'body-to-frame' ? a : b;
}
