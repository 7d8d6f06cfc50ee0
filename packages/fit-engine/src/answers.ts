import type { Source } from './facts.js';

export const checkIds = [
  'eye-to-eye',
  'stroke',
  'mounts',
  'hardware',
  'spring-type',
  'coil-on-yoke',
  'spring-rate',
  'pressure',
  'rider-weight',
  'reservoir',
  'diameter',
  'remote',
  'position',
  'e-bike',
  'notices',
  'reading-conflict',
] as const;
export type CheckId = (typeof checkIds)[number];

/** pass < work < unknown < fail; the verdict is the worst of all answers. */
export type AnswerKind = 'pass' | 'work' | 'unknown' | 'fail';

export type Verdict = 'bolts-straight-in' | 'fits-with-work' | 'needs-an-answer' | 'wont-fit';

/** A figure that was compared, ready to be shown with its source. */
export interface Figure {
  /** Message key of its name, e.g. "frame.eyeToEye". */
  key: string;
  value: number | string | null;
  unit: 'mm' | 'kg' | 'N/mm' | 'lb/in' | 'kPa' | 'psi' | '%' | 'm' | 'deg' | 'g' | 'h' | null;
  source: Source;
}

export type WorkId =
  | 'press-in-kit'
  | 'press-in-reuse'
  | 'travel-spacer'
  | 'fit-coil'
  | 'fit-remote'
  | 'route-external'
  | 'hold-open-part'
  | 'fit-shock';

export interface PartNeed {
  kind: 'kit' | 'coil' | 'remote' | 'hold-open';
  partId: string;
  name: string;
  end: 'frame' | 'link' | null;
  quantity: number;
  /** A kit proposed from a rider's reading is confirmed at fitting. */
  confirmAtFitting: boolean;
}

export interface WorkNeed {
  id: WorkId;
  end: 'frame' | 'link' | null;
  /** Needs tools or skill that only a workshop has: self-fit is not offered. */
  workshopOnly: boolean;
}

/** What a rider can do about "not known". */
export interface AskNeed {
  /** Key of the measure-up question or sheet field that would answer it. */
  fact: string;
  whom: 'rider' | 'frame-maker' | 'shock-maker' | 'workshop';
}

export interface CheckAnswer {
  check: CheckId;
  answer: AnswerKind;
  /** Reason code, key of the message catalogue; one code has one sentence. */
  code: string;
  figures: readonly Figure[];
  /** Pass with something worth saying. */
  remark: boolean;
  parts: readonly PartNeed[];
  work: readonly WorkNeed[];
  ask: readonly AskNeed[];
}

export interface SpringForRider {
  kind: 'air' | 'coil';
  /** Fill pressure, gauge; null when the chamber data are unknown. */
  gaugeKPa: number | null;
  rateNPerMm: number | null;
  rateLbPerIn: number | null;
  sagPercent: number | null;
  sagMm: number | null;
  preloadMm: number | null;
  /** Range over the assumptions (rear share +/- 0.05). */
  low: number | null;
  high: number | null;
}

/** Never part of the verdict. */
export interface Advice {
  code: string;
  figures: readonly Figure[];
  weight: number;
}

export interface Judgement {
  verdict: Verdict;
  answers: readonly CheckAnswer[];
  /** The sheet entry that decided, and which way round the shock goes. */
  entryId: string | null;
  wayRound: 'body-to-frame' | 'body-to-link' | null;
  reservoirPositionDeg: number | null;
  parts: readonly PartNeed[];
  work: readonly WorkNeed[];
  spring: SpringForRider | null;
  advice: readonly Advice[];
  selfFitAllowed: boolean;
}

/** A shock that the cheap checks refuse, as short as it can be told; `judge` tells the rest. */
export interface Refusal {
  verdict: 'wont-fit';
  /** The first check that fails where the shock comes nearest to fitting, with its code. */
  check: CheckId;
  code: string;
  entryId: string;
  wayRound: 'body-to-frame' | 'body-to-link';
}
