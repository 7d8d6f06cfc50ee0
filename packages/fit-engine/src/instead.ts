import type { CheckAnswer, Judgement } from './answers.js';
import type { FitQuestion, ShockFacts } from './facts.js';
import { judge } from './judge.js';
import { insteadSentences, type InsteadCode } from './messages/instead.en.js';

/** A change that would take one reason of refusal away. */
export interface Instead {
  code: InsteadCode;
  /** Sizes that the sheet lists, for "instead-listed-size". */
  sizeKeys: readonly string[];
  /** Tried with this shock otherwise unchanged: nothing else refuses it then. Null where only a real shock can tell. */
  enough: boolean | null;
}

function codeFor({ check, code }: CheckAnswer, shock: ShockFacts): InsteadCode | null {
  switch (check) {
    case 'eye-to-eye':
    case 'stroke':
      return 'instead-listed-size';
    case 'mounts':
      return 'instead-mounts';
    case 'spring-type':
      return code === 'spring-type-air-only' ? 'instead-air' : 'instead-coil';
    case 'coil-on-yoke':
      return 'instead-air';
    case 'reservoir':
      return 'instead-inline';
    case 'diameter':
      return 'instead-narrower';
    case 'spring-rate':
    case 'pressure':
      return shock.spring.kind === 'coil' ? 'instead-other-spring' : 'instead-other-pressure';
    case 'remote':
      return code === 'remote-wanted-has-none' ? 'instead-with-remote' : 'instead-without-remote';
    case 'e-bike':
      return 'instead-e-bike';
    case 'rider-weight':
      return 'instead-higher-limit';
    case 'position':
      return 'instead-other-way-round';
    case 'notices':
      return 'instead-after-notice';
    case 'hardware':
    case 'reading-conflict':
      return null;
  }
}

/** This shock with one change, where the change leaves nothing to guess; null where it would. */
function changed(shock: ShockFacts, code: InsteadCode, sizeKey: string): ShockFacts | null {
  if (code === 'instead-inline') return { ...shock, reservoir: null };
  if (code === 'instead-without-remote') return { ...shock, remote: null };
  return code === 'instead-listed-size' ? { ...shock, sizeKey, spacedToKeys: [] } : null;
}

/**
 * The changes that would let a refused shock in, in the order of the checks, so that another size comes first: of
 * all changes it alone can take more than one reason away. Empty for any other verdict.
 */
export function fitsInstead(question: FitQuestion, judgement: Judgement): Instead[] {
  if (judgement.verdict !== 'wont-fit') return [];
  const { frame, shock } = question;
  const listed = [...new Set(frame.entries.flatMap((entry) => entry.sizeKey ?? []))];
  const codes = judgement.answers.flatMap((given) =>
    given.answer === 'fail' ? (codeFor(given, shock) ?? []) : [],
  );
  const lets = (code: InsteadCode, sizeKey: string): boolean | null => {
    const other = changed(shock, code, sizeKey);
    return other && judge({ ...question, shock: other }, { full: true }).verdict !== 'wont-fit';
  };
  return [...new Set(codes)].flatMap((code): Instead[] => {
    if (code !== 'instead-listed-size') return [{ code, sizeKeys: [], enough: lets(code, shock.sizeKey) }];
    const good = listed.filter((key) => lets(code, key));
    if (listed.length === 0) return [];
    return [{ code, sizeKeys: good.length > 0 ? good : listed, enough: good.length > 0 }];
  });
}

export function tellInstead({ code, sizeKeys }: Instead): string {
  return insteadSentences[code].replace('{sizes}', sizeKeys.join(' or '));
}

/** What would fit instead of a refused shock, in sentences. */
export const whatWouldFit = (question: FitQuestion, judgement: Judgement): string[] =>
  fitsInstead(question, judgement).map(tellInstead);
