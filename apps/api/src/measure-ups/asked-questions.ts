import { questionOrder, type QuestionKey, type Step } from '@linkfell/contracts';

import { leavesOpen } from '../frames/sheet-view.js';
import type { FrameSheetData } from '../frames/sheet.js';
import { known, type Answers } from './answers.js';

export interface AskedQuestion {
  key: QuestionKey;
  step: Step;
  state: 'open' | 'known' | 'unknown';
  /** Left open it decides nothing, or only a wish. */
  optional: boolean;
}

const describedOnly: ReadonlySet<QuestionKey> = new Set([
  'frame-travel',
  'frame-yoke',
  'frame-end',
  'link-end',
]);
const sheetMayAnswer: ReadonlySet<QuestionKey> = new Set([
  'tunnel-width',
  'reservoir-room',
  'cable-routing',
  'e-bike',
]);
const onlyForUnlisted: ReadonlySet<QuestionKey> = new Set(['sold-with-bike']);
const wishes: ReadonlySet<QuestionKey> = new Set(['budget', 'reservoir-wish', 'spring-wish', 'place']);
/** With a sheet the present shock only has a say in hardware, diameter and contradictions. */
const optionalWithSheet: ReadonlySet<QuestionKey> = new Set([
  'printed-size',
  'eye-to-eye',
  'stroke',
  'mounts',
  'hardware',
  'can-diameter',
  'present-spring',
  'present-remote',
]);

/** The questions that this bike and these answers make necessary, in order. */
export function askedQuestions(
  answers: Answers,
  sheet: FrameSheetData | null,
  readingConflicts: boolean,
): AskedQuestion[] {
  const described = known(answers, 'frame')?.kind === 'described';
  const open = sheet ? new Set(leavesOpen(sheet)) : null;
  const printed = known(answers, 'printed-size') !== null;

  const applies = (key: QuestionKey): boolean => {
    if (describedOnly.has(key)) return described;
    if (sheetMayAnswer.has(key)) return described || (open?.has(key) ?? false);
    if (onlyForUnlisted.has(key)) return described;
    if (key === 'size-confirm') return readingConflicts;
    return true;
  };
  const optional = (key: QuestionKey): boolean =>
    wishes.has(key) ||
    (sheet !== null && optionalWithSheet.has(key)) ||
    // A printed size is published data: readings beside it only confirm.
    (printed && (key === 'eye-to-eye' || key === 'stroke')) ||
    key === 'printed-size';

  return questionOrder
    .filter(({ key }) => applies(key))
    .map(({ key, step }) => ({
      key,
      step,
      state: answers.values[key]?.state ?? 'open',
      optional: optional(key),
    }));
}

/** Enough to judge with: a frame, and whatever else is not answered counts as not known. */
export function readyForMatches(questions: readonly AskedQuestion[]): boolean {
  return questions.some(({ key, state }) => key === 'frame' && state === 'known');
}
