import type { AnswerValue, QuestionKey, StoredAnswer } from '@linkfell/contracts';

/** Everything the rider has answered, with the day of each answer (ISO). */
export interface Answers {
  values: Partial<Record<QuestionKey, StoredAnswer>>;
  days: Partial<Record<QuestionKey, string>>;
}

/** The value of a known answer, or null when it is open or "I don't know". */
export function known<K extends QuestionKey>(answers: Answers, key: K): AnswerValue<K> | null {
  const answer = answers.values[key] as StoredAnswer<K> | undefined;
  return answer?.state === 'known' ? answer.value : null;
}

export const isListed = (answers: Answers): boolean => known(answers, 'frame')?.kind === 'listed';
