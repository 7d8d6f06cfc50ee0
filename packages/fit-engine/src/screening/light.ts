import type { AnswerKind, CheckAnswer, CheckId } from '../answers.js';

/**
 * What a check says, without figures and needs. Costs add up, and a smaller sum is the better way of putting a shock
 * in: fewer fails, then fewer open questions, less work, fewer parts; six bits for each of the last three.
 */
export interface Light {
  check: CheckId;
  code: string;
  cost: number;
}

const costs: Record<AnswerKind, number> = { pass: 0, work: 1 << 6, unknown: 1 << 12, fail: 1 << 18 };

/** From this sum on, something fails. */
export const failCost = costs.fail;
export const costOf = ({ answer, parts }: Pick<CheckAnswer, 'answer' | 'parts'>): number =>
  costs[answer] + parts.length;
export const lightOf = (given: CheckAnswer): Light => ({
  check: given.check,
  code: given.code,
  cost: costOf(given),
});
