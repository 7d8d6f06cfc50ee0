import type { AnswerKind, CheckAnswer, SpringForRider } from '../answers.js';
import type { AirChambers, Fact, ShockFacts, ShockSpring } from '../facts.js';
import { fillForForce, leastFillForForce } from '../springs/air.js';
import { answer, computed, figure, type SpringAnswer, type Trial } from './context.js';
import { known, positive, slack } from './known.js';
import { rideFigures } from './ride-figures.js';
import { rideOf, type Ride } from './ride.js';

type AirShock = Extract<ShockSpring, { kind: 'air' }>;
const alone = (answered: CheckAnswer): SpringAnswer => ({ answer: answered, spring: null });
const askShockMaker = [{ fact: 'shock.spring', whom: 'shock-maker' }] as const;
const noRate = { kind: 'air', rateNPerMm: null, rateLbPerIn: null, preloadMm: null } as const;

const kinds = {
  'pressure-limits-not-printed': 'unknown',
  'pressure-no-fill-does-it': 'fail',
  'pressure-above-limit': 'fail',
  'pressure-below-limit': 'fail',
  'pressure-within-limits': 'pass',
  'pressure-above-limit-whatever-inside': 'fail',
  'pressure-start-from-makers-table': 'pass',
} as const satisfies Record<string, AnswerKind>;
export type PressureCode = keyof typeof kinds;
export const pressureKind = (code: PressureCode): AnswerKind => kinds[code];

/** The fill for this rider must lie within the printed limits; light riders count too. */
export function pressureCheck(trial: Trial): SpringAnswer {
  const { spring } = trial.shock;
  if (spring.kind !== 'air') return alone(answer('pressure', 'pass', 'pressure-not-an-air-shock'));
  const found = rideOf(trial);
  if ('missing' in found) {
    return alone(answer('pressure', 'unknown', 'pressure-not-known', { ask: found.missing }));
  }
  const { ride } = found;
  const code = pressureCode(trial.shock, spring, ride);
  if (!known(spring.minGaugeKPa) || !known(spring.maxGaugeKPa)) {
    const figures = limitFigures(trial, spring);
    return alone(answer('pressure', kinds[code], code, { figures, ask: askShockMaker }));
  }
  const chambers = soundChambers(spring.chambers, ride.curve.strokeMm);
  return chambers ? byChambers(trial, ride, chambers, code) : byBound(trial, ride, code);
}

/** What the check says of an air shock, without the figures: a catalogue is sifted by it, so nothing is allocated. */
export function pressureCode(shock: ShockFacts, spring: AirShock, ride: Ride): PressureCode {
  const { minGaugeKPa: min, maxGaugeKPa: max } = spring;
  if (!known(min) || !known(max)) return 'pressure-limits-not-printed';
  const chambers = soundChambers(spring.chambers, ride.curve.strokeMm);
  if (chambers) {
    const gauge = fillAt(chambers, ride, ride.loadN);
    if (gauge === null) return 'pressure-no-fill-does-it';
    if (gauge > max + slack) return 'pressure-above-limit';
    return gauge < min - slack ? 'pressure-below-limit' : 'pressure-within-limits';
  }
  const least = leastAt(shock.diameterMm, ride);
  if (least === null) return 'pressure-limits-not-printed';
  return least > max + slack ? 'pressure-above-limit-whatever-inside' : 'pressure-start-from-makers-table';
}

const fillAt = (chambers: AirChambers, { sagRatio, sagMm, patmKPa }: Ride, loadN: number): number | null =>
  fillForForce(chambers, loadN * sagRatio, sagMm, patmKPa);
const leastAt = (diameterMm: number, { loadN, softestRatio, window, patmKPa }: Ride): number | null =>
  leastFillForForce(diameterMm, loadN * softestRatio, window.highPercent / 100, patmKPa);

const limitFigures = ({ shock }: Trial, { minGaugeKPa, maxGaugeKPa }: AirShock) => [
  known(minGaugeKPa) ? figure('shock.minPressure', minGaugeKPa, 'kPa', shock.source) : null,
  known(maxGaugeKPa) ? figure('shock.maxPressure', maxGaugeKPa, 'kPa', shock.source) : null,
];

/** Chamber data that can be true: all positive, and air left at the end of the stroke. Others count as not published. */
function soundChambers(fact: Fact<AirChambers>, strokeMm: number): AirChambers | null {
  if (!fact) return null;
  const { areaMm2, negativeAreaMm2, volumeMm3, negativeVolumeMm3 } = fact.value;
  const sound =
    positive(areaMm2) && positive(negativeAreaMm2) && positive(volumeMm3) && positive(negativeVolumeMm3);
  return sound && volumeMm3 - areaMm2 * strokeMm > 0 ? fact.value : null;
}

function byChambers(trial: Trial, ride: Ride, chambers: AirChambers, code: PressureCode): SpringAnswer {
  const [gauge, low, high] = [
    fillAt(chambers, ride, ride.loadN),
    fillAt(chambers, ride, ride.lowLoadN),
    fillAt(chambers, ride, ride.highLoadN),
  ];
  const shown = (name: string, value: number | null) =>
    value === null ? null : figure(name, value, 'kPa', computed);
  const figures = [
    ...limitFigures(trial, trial.shock.spring as AirShock),
    ...rideFigures(trial, ride),
    shown('computed.pressure', gauge),
    shown('computed.pressureLow', low),
    shown('computed.pressureHigh', high),
  ];
  const given = answer('pressure', kinds[code], code, { figures });
  if (gauge === null) return alone(given);
  const spring: SpringForRider = {
    ...noRate,
    gaugeKPa: gauge,
    sagPercent: ride.window.midPercent,
    sagMm: ride.sagMm,
    low,
    high,
  };
  return { answer: given, spring };
}

/** Chambers not published: no pressure is shown, only that even the least it could need is too much, or is not. */
function byBound(trial: Trial, ride: Ride, code: PressureCode): SpringAnswer {
  const least = leastAt(trial.shock.diameterMm, ride);
  const figures = [
    ...limitFigures(trial, trial.shock.spring as AirShock),
    ...rideFigures(trial, ride),
    least === null ? null : figure('computed.leastPressure', least, 'kPa', computed),
  ];
  if (code === 'pressure-limits-not-printed') {
    return alone(answer('pressure', kinds[code], code, { figures, ask: askShockMaker }));
  }
  if (code === 'pressure-above-limit-whatever-inside') {
    return alone(answer('pressure', kinds[code], code, { figures }));
  }
  return {
    answer: answer('pressure', kinds[code], code, { figures, remark: true }),
    spring: {
      ...noRate,
      gaugeKPa: null,
      sagPercent: ride.window.midPercent,
      sagMm: ride.sagMm,
      low: null,
      high: null,
    },
  };
}
