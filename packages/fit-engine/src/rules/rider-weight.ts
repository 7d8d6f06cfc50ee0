import type { AnswerKind, CheckAnswer } from '../answers.js';
import type { Fact, RiderFacts, WeightLimit } from '../facts.js';
import { answer, figure, rankOf, riderSaid, type Trial } from './context.js';

/** Printed weight limits of shock and frame, each on its own basis; at the limit passes. */
export function riderWeightCheck({ shock, frame, rider }: Trial): CheckAnswer {
  const limits = [
    { of: 'shock', limit: shock.riderLimit },
    { of: 'frame', limit: frame.riderLimit },
  ].filter((entry): entry is { of: string; limit: NonNullable<Fact<WeightLimit>> } => entry.limit !== null);
  if (limits.length === 0) return answer('rider-weight', 'pass', 'rider-weight-no-limit', { remark: true });
  const figures = [
    ...limits.map(({ of, limit }) => figure(`${of}.weightLimit`, limit.value.kg, 'kg', limit.source)),
    figure('rider.weight', rider.riderKg, 'kg', riderSaid),
  ];
  const kinds = limits.map(({ limit }) => against(limit.value, rider));
  const worst = kinds.reduce<AnswerKind>((bad, kind) => (rankOf(kind) > rankOf(bad) ? kind : bad), 'pass');
  if (worst === 'fail') return answer('rider-weight', 'fail', 'rider-weight-over', { figures });
  if (worst === 'pass') return answer('rider-weight', 'pass', 'rider-weight-within', { figures });
  const noBasis = limits.some(({ limit }) => limit.value.basis === null) && rider.riderKg !== null;
  return answer(
    'rider-weight',
    'unknown',
    noBasis ? 'rider-weight-basis-not-printed' : 'rider-weight-not-known',
    {
      figures,
      ask: [
        { fact: noBasis ? 'shock.riderLimit' : 'rider.riderKg', whom: noBasis ? 'shock-maker' : 'rider' },
      ],
    },
  );
}

function against({ kg, basis }: WeightLimit, { riderKg, kitKg, bikeKg }: RiderFacts): AnswerKind {
  const sum = (...parts: (number | null)[]): number | null =>
    parts.reduce(
      (total, part) => (total === null || part === null || !Number.isFinite(part) ? null : total + part),
      0,
    );
  const judged = (mass: number | null): AnswerKind =>
    mass === null ? 'unknown' : mass <= kg ? 'pass' : 'fail';
  switch (basis) {
    case 'rider':
      return judged(sum(riderKg));
    case 'rider-and-kit':
      return judged(sum(riderKg, kitKg));
    case 'with-bike':
      return judged(sum(riderKg, kitKg, bikeKg));
    case null: {
      // Read as rider and kit; where counting the bike as well would change the answer, it is not known.
      const light = judged(sum(riderKg, kitKg));
      if (light !== 'pass') return light;
      return judged(sum(riderKg, kitKg, bikeKg)) === 'pass' ? 'pass' : 'unknown';
    }
  }
}
