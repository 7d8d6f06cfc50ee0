import type { AnswerValue, MeasureUpView, QuestionKey, StoredAnswer } from '@linkfell/contracts';
import { resolveSize, tellSize, type PresentShock, type Reading } from '@linkfell/fit-engine';
import { lengthOf } from './read';
import type { Raw } from './spec';

export interface LiveSize {
  say: string;
  conflicts: readonly string[];
}

type Readings = Pick<PresentShock, 'eyeToEye' | 'compressed' | 'shaftTravel'>;

const nothing: PresentShock = {
  ...{ printedSizeKey: null, eyeToEye: null, compressed: null, shaftTravel: null },
  ...{ bodyEndKind: null, shaftEndKind: null, frameEndHardware: null, linkEndHardware: null },
  ...{ diameterMm: null, spring: null, remoteAction: null, remoteLine: null, soldWithBike: null },
};

function kept<K extends QuestionKey>(view: MeasureUpView, key: K): AnswerValue<K> | null {
  const stored = view.answers[key] as StoredAnswer<K> | undefined;
  return stored?.state === 'known' ? stored.value : null;
}

const strokeIs = (method: string | undefined, reading: Reading | null): Omit<Readings, 'eyeToEye'> => ({
  compressed: method === 'compressed' ? reading : null,
  shaftTravel: method === 'shaft' ? reading : null,
});

function typed(raw: Raw, name: string): Reading | null {
  const mm = lengthOf(raw, name);
  if (mm === undefined || !(mm > 0)) return null;
  return { mm, tool: (raw.tool ?? 'caliper') as Reading['tool'], awkward: raw.awkward === 'yes' };
}

/**
 * What the readings say while one is typed: the same engine and the same facts as the server's, the reading in hand
 * in the place of the one that was kept. Null while nothing that can be read stands in the field.
 */
export function liveSize(view: MeasureUpView, question: 'eye-to-eye' | 'stroke', raw: Raw): LiveSize | null {
  const inHand = typed(raw, question === 'eye-to-eye' ? 'length' : 'stroke');
  if (!inHand) return null;
  const stroke = kept(view, 'stroke');
  const readings: Readings =
    question === 'eye-to-eye'
      ? { eyeToEye: inHand, ...strokeIs(stroke?.method, stroke?.reading ?? null) }
      : { eyeToEye: kept(view, 'eye-to-eye'), ...strokeIs(raw.method, inHand) };
  const printedSizeKey = kept(view, 'printed-size')?.sizeKey ?? null;
  const listed = view.sheet && [...new Set(view.sheet.entries.map(({ sizeKey }) => sizeKey))];
  const size = resolveSize({ ...nothing, ...readings, printedSizeKey }, listed, view.size.family);
  const own: readonly (keyof Readings)[] =
    question === 'eye-to-eye' ? ['eyeToEye'] : ['compressed', 'shaftTravel'];
  return {
    say: tellSize(size),
    conflicts: size.conflicts
      .filter(({ reading }) => own.includes(reading))
      .map(
        ({ mm }) =>
          `The frame’s maker lists ${listed?.join(' and ') ?? ''}; you read ${Number(mm.toFixed(2))} mm.`,
      ),
  };
}
