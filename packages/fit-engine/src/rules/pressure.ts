import type { CheckAnswer, SpringForRider } from '../answers.js';
import type { AirChambers, Fact, ShockSpring } from '../facts.js';
import { fillForSag, leastFillKPa } from '../springs/air.js';
import { answer, computed, figure, type SpringAnswer, type Trial } from './context.js';
import { known, positive, slack } from './known.js';
import { rideFigures } from './ride-figures.js';
import { rideOf, type Ride } from './ride.js';

type AirShock = Extract<ShockSpring, { kind: 'air' }>;
const alone = (answered: CheckAnswer): SpringAnswer => ({ answer: answered, spring: null });
const askShockMaker = [{ fact: 'shock.spring', whom: 'shock-maker' }] as const;
const noRate = { kind: 'air', rateNPerMm: null, rateLbPerIn: null, preloadMm: null } as const;

/** The fill for this rider must lie within the printed limits; light riders count too. */
export function pressureCheck(trial: Trial): SpringAnswer {
  const { spring } = trial.shock;
  if (spring.kind !== 'air') return alone(answer('pressure', 'pass', 'pressure-not-an-air-shock'));
  const found = rideOf(trial);
  if ('missing' in found) {
    return alone(answer('pressure', 'unknown', 'pressure-not-known', { ask: found.missing }));
  }
  const { ride } = found;
  if (!known(spring.minGaugeKPa) || !known(spring.maxGaugeKPa)) {
    const figures = limitFigures(trial, spring);
    return alone(
      answer('pressure', 'unknown', 'pressure-limits-not-printed', { figures, ask: askShockMaker }),
    );
  }
  const chambers = soundChambers(spring.chambers, ride.curve.strokeMm);
  const limits = { min: spring.minGaugeKPa, max: spring.maxGaugeKPa };
  return chambers ? byChambers(trial, ride, chambers, limits) : byBound(trial, ride, limits);
}

const limitFigures = ({ shock }: Trial, { minGaugeKPa, maxGaugeKPa }: AirShock) => [
  known(minGaugeKPa) ? figure('shock.minPressure', minGaugeKPa, 'kPa', shock.source) : null,
  known(maxGaugeKPa) ? figure('shock.maxPressure', maxGaugeKPa, 'kPa', shock.source) : null,
];

/** Chamber data that can be true: all positive, and air left at the end of the stroke. Others count as not published. */
function soundChambers(fact: Fact<AirChambers>, strokeMm: number): AirChambers | null {
  if (!fact) return null;
  const { areaMm2, negativeAreaMm2, volumeMm3, negativeVolumeMm3 } = fact.value;
  const sound = [areaMm2, negativeAreaMm2, volumeMm3, negativeVolumeMm3].every(positive);
  return sound && volumeMm3 - areaMm2 * strokeMm > 0 ? fact.value : null;
}

function byChambers(
  trial: Trial,
  ride: Ride,
  chambers: AirChambers,
  { min, max }: { min: number; max: number },
): SpringAnswer {
  const { curve, window, loadN, lowLoadN, highLoadN, patmKPa } = ride;
  const sagMm = (window.midPercent / 100) * curve.strokeMm;
  const fill = (load: number): number | null => fillForSag(chambers, curve, load, sagMm, patmKPa);
  const [gauge, low, high] = [fill(loadN), fill(lowLoadN), fill(highLoadN)];
  const shown = (name: string, value: number | null) =>
    value === null ? null : figure(name, value, 'kPa', computed);
  const figures = [
    ...limitFigures(trial, trial.shock.spring as AirShock),
    ...rideFigures(trial, ride),
    shown('computed.pressure', gauge),
    shown('computed.pressureLow', low),
    shown('computed.pressureHigh', high),
  ];
  if (gauge === null) return alone(answer('pressure', 'fail', 'pressure-no-fill-does-it', { figures }));
  const spring: SpringForRider = {
    ...noRate,
    gaugeKPa: gauge,
    sagPercent: window.midPercent,
    sagMm,
    low,
    high,
  };
  if (gauge > max + slack)
    return { answer: answer('pressure', 'fail', 'pressure-above-limit', { figures }), spring };
  if (gauge < min - slack)
    return { answer: answer('pressure', 'fail', 'pressure-below-limit', { figures }), spring };
  return { answer: answer('pressure', 'pass', 'pressure-within-limits', { figures }), spring };
}

/** Chambers not published: no pressure is shown, only that even the least it could need is too much, or is not. */
function byBound(trial: Trial, ride: Ride, { max }: { max: number }): SpringAnswer {
  const { curve, window, loadN, patmKPa } = ride;
  const least = leastFillKPa(trial.shock.diameterMm, curve, loadN, window.highPercent, patmKPa);
  const common = [
    ...limitFigures(trial, trial.shock.spring as AirShock),
    ...rideFigures(trial, ride),
    least === null ? null : figure('computed.leastPressure', least, 'kPa', computed),
  ];
  if (least === null) {
    return alone(
      answer('pressure', 'unknown', 'pressure-limits-not-printed', { figures: common, ask: askShockMaker }),
    );
  }
  if (least > max + slack) {
    return alone(answer('pressure', 'fail', 'pressure-above-limit-whatever-inside', { figures: common }));
  }
  return {
    answer: answer('pressure', 'pass', 'pressure-start-from-makers-table', { figures: common, remark: true }),
    spring: {
      ...noRate,
      gaugeKPa: null,
      sagPercent: window.midPercent,
      sagMm: (window.midPercent / 100) * curve.strokeMm,
      low: null,
      high: null,
    },
  };
}
