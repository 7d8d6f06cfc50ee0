import type { QuestionKey, Step } from '@linkfell/contracts';
import { frameSpecs } from './frame-specs';
import { riderSpecs } from './rider-specs';
import { shockSpecs } from './shock-specs';
import type { QuestionSpec } from './spec';

/** Every question but the frame's own, which has a page of its own making. */
export const specs: Record<Exclude<QuestionKey, 'frame'>, QuestionSpec> = {
  ...frameSpecs,
  ...shockSpecs,
  ...riderSpecs,
};

export const stepNames: Record<Step, string> = {
  frame: 'Frame',
  'present-shock': 'Present shock',
  spring: 'Spring',
  rider: 'You and your riding',
  check: 'Check and match',
};
