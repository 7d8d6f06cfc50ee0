import { fillForSag, leastFillKPa } from '../springs/air.js';
import { answer, computed, figure, practice, riderSaid, type Trial } from './context.js';
import { rideOf } from './ride.js';
import type { SpringAnswer } from './spring-rate.js';

/** The fill for this rider must lie within the printed limits; light riders count too. */
export function pressureCheck(trial: Trial): SpringAnswer {
  const { shock } = trial;
  const { spring } = shock;
  if (spring.kind !== 'air')
    return { answer: answer('pressure', 'pass', 'pressure-not-an-air-shock'), spring: null };
  const known = rideOf(trial);
  if ('missing' in known) {
    return {
      answer: answer('pressure', 'unknown', 'pressure-not-known', { ask: known.missing }),
      spring: null,
    };
  }
  const { curve, window, loadN, lowLoadN, highLoadN, patmKPa } = known.ride;
  const limits = [
    spring.minGaugeKPa === null ? null : figure('shock.minPressure', spring.minGaugeKPa, 'kPa', shock.source),
    spring.maxGaugeKPa === null ? null : figure('shock.maxPressure', spring.maxGaugeKPa, 'kPa', shock.source),
  ];
  const { minGaugeKPa: min, maxGaugeKPa: max } = spring;
  if (min === null || max === null) {
    return {
      answer: answer('pressure', 'unknown', 'pressure-limits-not-printed', {
        figures: limits,
        ask: [{ fact: 'shock.spring', whom: 'shock-maker' }],
      }),
      spring: null,
    };
  }
  const sagMm = (window.midPercent / 100) * curve.strokeMm;
  const shape = { kind: 'air', rateNPerMm: null, rateLbPerIn: null, preloadMm: null } as const;
  const common = [
    ...limits,
    figure('rider.window', `${window.lowPercent}–${window.highPercent}`, '%', practice),
    figure('rider.load', loadN / 9.80665, 'kg', riderSaid),
  ];
  if (!spring.chambers) {
    const least = leastFillKPa(shock.diameterMm, curve, loadN, window.highPercent, patmKPa);
    if (least === null || least > max) {
      return {
        answer: answer('pressure', 'fail', 'pressure-above-limit-whatever-inside', {
          figures: [...common, figure('computed.leastPressure', least, 'kPa', computed)],
        }),
        spring: null,
      };
    }
    return {
      answer: answer('pressure', 'pass', 'pressure-start-from-makers-table', {
        figures: [...common, figure('computed.leastPressure', least, 'kPa', computed)],
        remark: true,
      }),
      spring: { ...shape, gaugeKPa: null, sagPercent: window.midPercent, sagMm, low: null, high: null },
    };
  }
  const chambers = spring.chambers.value;
  const fill = (load: number): number | null => fillForSag(chambers, curve, load, sagMm, patmKPa);
  const gauge = fill(loadN);
  const figures = [...common, figure('computed.pressure', gauge, 'kPa', computed)];
  if (gauge === null) {
    return { answer: answer('pressure', 'fail', 'pressure-no-fill-does-it', { figures }), spring: null };
  }
  const found = {
    ...shape,
    gaugeKPa: gauge,
    sagPercent: window.midPercent,
    sagMm,
    low: fill(lowLoadN),
    high: fill(highLoadN),
  };
  if (gauge > max)
    return { answer: answer('pressure', 'fail', 'pressure-above-limit', { figures }), spring: found };
  if (gauge < min)
    return { answer: answer('pressure', 'fail', 'pressure-below-limit', { figures }), spring: found };
  return { answer: answer('pressure', 'pass', 'pressure-within-limits', { figures }), spring: found };
}
