import type { CheckAnswer } from '../answers.js';
import { answer, endsOf, figure, type Trial } from './context.js';

/** The maker's statement on springs; silence lets air pass and leaves coil open. */
export function springTypeCheck({ frame, shock }: Trial): CheckAnswer {
  const statement = frame.springStatement;
  const figures = [
    statement && figure('frame.springs', statement.value, null, statement.source),
    figure('shock.spring', shock.spring.kind, null, shock.source),
  ];
  if (statement?.value === 'air-only' && shock.spring.kind === 'coil') {
    return answer('spring-type', 'fail', 'spring-type-air-only', { figures });
  }
  if (statement?.value === 'coil-only' && shock.spring.kind === 'air') {
    return answer('spring-type', 'fail', 'spring-type-coil-only', { figures });
  }
  if (statement) return answer('spring-type', 'pass', 'spring-type-allowed', { figures });
  if (shock.spring.kind === 'air')
    return answer('spring-type', 'pass', 'spring-type-air-unstated', { figures });
  return answer('spring-type', 'unknown', 'spring-type-coil-unstated', {
    figures,
    ask: [{ fact: 'frame.springStatement', whom: 'frame-maker' }],
  });
}

/**
 * A yoke puts side load on the shaft: a coil there needs the frame maker's word. Decisions: a refusal wins even
 * where the yoke is not known; a permission speaks of a yoke, so it counts only where there is known to be one.
 */
export function coilOnYokeCheck(trial: Trial): CheckAnswer {
  const { frame, shock } = trial;
  if (shock.spring.kind === 'air') return answer('coil-on-yoke', 'pass', 'coil-on-yoke-not-a-coil');
  const yokes = endsOf(trial).map((end) => end.frame?.yoke ?? null);
  const word = frame.coilOnYoke;
  const figures = word ? [figure('frame.coilOnYoke', word.value, null, word.source)] : [];
  if (yokes.every((yoke) => yoke === false)) return answer('coil-on-yoke', 'pass', 'coil-on-yoke-no-yoke');
  if (word?.value === 'refused') return answer('coil-on-yoke', 'fail', 'coil-on-yoke-refused', { figures });
  if (!yokes.includes(true)) {
    const ask = [{ fact: yokes[0] === null ? 'entry.frameEnd' : 'entry.linkEnd', whom: 'rider' }] as const;
    return answer('coil-on-yoke', 'unknown', 'coil-on-yoke-yoke-not-known', { figures, ask });
  }
  if (word?.value === 'allowed') return answer('coil-on-yoke', 'pass', 'coil-on-yoke-allowed', { figures });
  return answer('coil-on-yoke', 'unknown', 'coil-on-yoke-no-word', {
    ask: [{ fact: 'frame.coilOnYoke', whom: 'frame-maker' }],
  });
}
