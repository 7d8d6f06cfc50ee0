import type { AnswerKind, AskNeed, CheckAnswer } from '../answers.js';
import type { Source } from '../facts.js';
import { sizeOf } from '../sizing/sizes.js';
import { answer, computed, figure, type Trial } from './context.js';
import { entryApplies } from './entry-applies.js';
import { positive } from './known.js';

const fromYourShock: Source = {
  kind: 'rider',
  label: 'From your shock, not from the maker',
  date: null,
};
const askMaker: AskNeed = { fact: 'frame.entries', whom: 'frame-maker' };
const askRider = (fact: string): AskNeed => ({ fact, whom: 'rider' });

/** Eye-to-eye and stroke against one entry: by key, with no "close enough". */
export function sizeChecks(trial: Trial): [CheckAnswer, CheckAnswer] {
  const { entry, frame, rider } = trial;
  if (frame.origin === 'described') return describedSize(trial);
  const applies = trial.shared.applies.get(entry) ?? entryApplies(frame, rider, entry);
  if (applies.state === 'no' || entry.sizeKey === null) {
    const ask = { figures: [figure('frame.size', entry.sizeKey, null, entry.source)], ask: [askMaker] };
    return [
      answer('eye-to-eye', 'unknown', 'size-no-entry-for-this-bike', ask),
      answer('stroke', 'unknown', 'size-no-entry-for-this-bike', ask),
    ];
  }
  const [eye, stroke] = compare(trial, entry.sizeKey, false);
  if (applies.state === 'unsure' && stroke.answer !== 'fail' && eye.answer !== 'fail') {
    return [
      eye,
      answer('stroke', 'unknown', 'stroke-depends-on-frame', {
        figures: stroke.figures,
        ask: applies.missing.map((fact) => askRider(`rider.${fact}`)),
      }),
    ];
  }
  return [eye, stroke];
}

function describedSize(trial: Trial): [CheckAnswer, CheckAnswer] {
  const { shared, present } = trial;
  const { size } = shared;
  if (size.state !== 'settled' || size.sizeKey === null) {
    const ask = { ask: [askRider('present.eyeToEye'), askRider('present.compressed')] };
    return [
      answer('eye-to-eye', 'unknown', 'size-of-yours-not-settled', ask),
      answer('stroke', 'unknown', 'size-of-yours-not-settled', ask),
    ];
  }
  if (present.soldWithBike !== 'yes') {
    const ask = { ask: [askRider('present.soldWithBike'), askMaker] };
    return [
      answer('eye-to-eye', 'unknown', 'size-yours-may-be-changed', ask),
      answer('stroke', 'unknown', 'size-yours-may-be-changed', ask),
    ];
  }
  return compare(trial, size.sizeKey, true);
}

/** @param fromShock the size comes from the rider's shock, not from the maker: at best "with work", confirmed at fitting */
function compare(trial: Trial, key: string, fromShock: boolean): [CheckAnswer, CheckAnswer] {
  const { entry, shock } = trial;
  const [wanted, offered] = [sizeOf(key), sizeOf(shock.sizeKey)];
  const sizes = [
    figure('frame.size', key, null, fromShock ? fromYourShock : entry.source),
    figure('shock.size', shock.sizeKey, null, shock.source),
  ];
  if (!wanted || !offered) {
    const ask = { figures: sizes, ask: [askMaker] };
    return [
      answer('eye-to-eye', 'unknown', 'size-not-in-our-tables', ask),
      answer('stroke', 'unknown', 'size-not-in-our-tables', ask),
    ];
  }
  // A spacer shortens the stroke and nothing else, whatever a table may say.
  const spaced =
    shock.spacedToKeys.some((other) => sizeOf(other)?.key === wanted.key) &&
    wanted.eyeToEyeMm === offered.eyeToEyeMm &&
    wanted.strokeMm < offered.strokeMm;
  if (wanted.key === offered.key || spaced) {
    const kind: AnswerKind = fromShock ? 'work' : 'pass';
    return [
      answer('eye-to-eye', kind, fromShock ? 'eye-to-eye-from-your-shock' : 'eye-to-eye-agrees', {
        figures: sizes,
      }),
      spaced && wanted.key !== offered.key
        ? answer('stroke', 'work', 'stroke-by-spacer', {
            figures: sizes,
            work: [{ id: 'travel-spacer', end: null, workshopOnly: true }],
          })
        : answer('stroke', kind, fromShock ? 'stroke-from-your-shock' : 'stroke-agrees', { figures: sizes }),
    ];
  }
  const sameEye = wanted.eyeToEyeMm === offered.eyeToEyeMm;
  const travel = travelWith(trial, offered.strokeMm, wanted.strokeMm);
  return [
    sameEye
      ? answer('eye-to-eye', 'pass', 'eye-to-eye-agrees', { figures: sizes })
      : answer(
          'eye-to-eye',
          'fail',
          offered.eyeToEyeMm > wanted.eyeToEyeMm ? 'eye-to-eye-longer' : 'eye-to-eye-shorter',
          { figures: sizes },
        ),
    wanted.strokeMm === offered.strokeMm
      ? answer('stroke', 'pass', 'stroke-agrees', { figures: sizes })
      : answer('stroke', 'fail', offered.strokeMm > wanted.strokeMm ? 'stroke-longer' : 'stroke-shorter', {
          figures: [...sizes, travel],
        }),
  ];
}

/** The wheel travel a stroke would give at the entry's mean leverage, for the sentence of a refusal. */
function travelWith({ entry }: Trial, strokeMm: number, ownStrokeMm: number) {
  if (!positive(entry.travelMm)) return null;
  return figure('computed.travel', (entry.travelMm / ownStrokeMm) * strokeMm, 'mm', computed);
}
