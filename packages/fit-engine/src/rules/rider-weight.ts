import type { AnswerKind, CheckAnswer } from '../answers.js';
import type { Fact, RiderFacts, WeightLimit } from '../facts.js';
import { answer, figure, rankOf, riderSaid, type Trial } from './context.js';
import { known, positive, slack } from './known.js';

type Limited = { of: 'shock' | 'frame'; limit: NonNullable<Fact<WeightLimit>> };

/** Printed weight limits of shock and frame, each on its own basis; at the limit passes. */
export function riderWeightCheck({ shock, frame, rider }: Trial): CheckAnswer {
  const limits = [
    { of: 'shock', limit: shock.riderLimit },
    { of: 'frame', limit: frame.riderLimit },
  ].filter((entry): entry is Limited => entry.limit !== null);
  if (limits.length === 0) return answer('rider-weight', 'pass', 'rider-weight-no-limit', { remark: true });
  const mass = (key: string, kg: number | null) => (known(kg) ? figure(key, kg, 'kg', riderSaid) : null);
  const figures = [
    ...limits.map(({ of, limit }) => figure(`${of}.weightLimit`, limit.value.kg, 'kg', limit.source)),
    mass('rider.weight', rider.riderKg),
    mass('rider.kit', rider.kitKg),
    mass('rider.bike', rider.bikeKg),
  ];
  const judged = limits.map((limited) => ({ ...limited, kind: against(limited.limit.value, rider) }));
  const decides = judged.reduce((bad, one) => (rankOf(one.kind) > rankOf(bad.kind) ? one : bad));
  if (decides.kind === 'fail') return answer('rider-weight', 'fail', 'rider-weight-over', { figures });
  if (decides.kind === 'pass') return answer('rider-weight', 'pass', 'rider-weight-within', { figures });
  const missing = missingMass(decides.limit.value, rider);
  return missing
    ? answer('rider-weight', 'unknown', 'rider-weight-not-known', {
        figures,
        ask: [{ fact: missing, whom: 'rider' }],
      })
    : answer('rider-weight', 'unknown', 'rider-weight-basis-not-printed', {
        figures,
        ask: [
          {
            fact: `${decides.of}.riderLimit`,
            whom: decides.of === 'shock' ? 'shock-maker' : 'frame-maker',
          },
        ],
      });
}

/** The mass that a limit's basis needs and that the rider has not told. */
function missingMass({ basis }: WeightLimit, { riderKg, kitKg, bikeKg }: RiderFacts): string | null {
  if (!positive(riderKg)) return 'rider.riderKg';
  if (basis !== 'rider' && !told(kitKg)) return 'rider.kitKg';
  if (basis !== 'rider' && basis !== 'rider-and-kit' && !told(bikeKg)) return 'rider.bikeKg';
  return null;
}

const told = (kg: number | null): kg is number => known(kg) && kg >= 0;

function against({ kg, basis }: WeightLimit, { riderKg, kitKg, bikeKg }: RiderFacts): AnswerKind {
  const sum = (...parts: (number | null)[]): number | null =>
    parts.every(told) && positive(riderKg)
      ? parts.reduce<number>((total, part) => total + (part ?? 0), 0)
      : null;
  const judged = (mass: number | null): AnswerKind =>
    mass === null || !known(kg) ? 'unknown' : mass <= kg + slack ? 'pass' : 'fail';
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
