import type { AnswerKind, Verdict } from '@linkfell/contracts';

export const verdictWords: Record<Verdict, string> = {
  'bolts-straight-in': 'Bolts straight in',
  'fits-with-work': 'Fits with parts or work',
  'needs-an-answer': 'Needs an answer first',
  'wont-fit': 'Won’t fit',
};

export type VerdictTone = 'moss' | 'gorse' | 'heather' | 'brick';

export const verdictTones: Record<Verdict, VerdictTone> = {
  'bolts-straight-in': 'moss',
  'fits-with-work': 'gorse',
  'needs-an-answer': 'heather',
  'wont-fit': 'brick',
};

/** The verdict that a single check's answer would give alone. */
export const verdictOfAnswer: Record<AnswerKind, Verdict> = {
  pass: 'bolts-straight-in',
  work: 'fits-with-work',
  unknown: 'needs-an-answer',
  fail: 'wont-fit',
};
