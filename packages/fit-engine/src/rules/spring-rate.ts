import type { CheckAnswer, SpringForRider } from '../answers.js';
import type { CoilOnSale, ShockSpring } from '../facts.js';
import { chooseCoil } from '../springs/choose-coil.js';
import { rateForSag } from '../springs/coil.js';
import { nPerMmPerLbPerIn } from '../units/factors.js';
import { answer, computed, figure, practice, type SpringAnswer, type Trial } from './context.js';
import { known, positive } from './known.js';
import { rideFigures } from './ride-figures.js';
import { rideOf, type Ride } from './ride.js';

type CoilShock = Extract<ShockSpring, { kind: 'coil' }>;

/** The gas of the damper pushes on the shaft with 0 to this, N; unknown, so both ends are shown. */
const gasBoundN = 150;
const toLb = (rate: number): number => rate / nPerMmPerLbPerIn;
const alone = (answered: CheckAnswer): SpringAnswer => ({ answer: answered, spring: null });

/** A coil's rate for this rider: the two nearest springs on sale, the one that gives a sag inside the window. */
export function springRateCheck(trial: Trial): SpringAnswer {
  const { shock, shared } = trial;
  const { spring } = shock;
  if (spring.kind !== 'coil') return alone(answer('spring-rate', 'pass', 'spring-rate-not-a-coil'));
  const found = rideOf(trial);
  if ('missing' in found) {
    return alone(answer('spring-rate', 'unknown', 'spring-rate-not-known', { ask: found.missing }));
  }
  const key = `${spring.springInsideMm}|${longestFor(trial.sale.coils, spring)}|${spring.collarPitchMm}`;
  const ofRide = shared.coils.get(found.ride) ?? new Map<string, SpringAnswer>();
  shared.coils.set(found.ride, ofRide);
  const chosen = ofRide.get(key) ?? choose(trial, found.ride, spring);
  ofRide.set(key, chosen);
  return chosen;
}

/** The longest spring on sale that goes in: shocks that take it and none longer have the same choice. */
const longestFor = (all: readonly CoilOnSale[], { maxFreeLengthMm }: CoilShock): number =>
  all.reduce((most, { freeLengthMm: mm }) => (mm <= maxFreeLengthMm && mm > most ? mm : most), -Infinity);

/** Springs that go on this shock: inside diameter, length, and travel for the whole stroke and the preload. */
const springsFor = (all: readonly CoilOnSale[], spring: CoilShock, leastTravelMm: number): CoilOnSale[] =>
  all.filter(
    ({ insideMm, freeLengthMm, travelMm, rateNPerMm }) =>
      Math.abs(insideMm - spring.springInsideMm) <= 0.01 &&
      freeLengthMm <= spring.maxFreeLengthMm &&
      travelMm >= leastTravelMm &&
      positive(rateNPerMm),
  );

function choose(trial: Trial, ride: Ride, spring: CoilShock): SpringAnswer {
  const { curve, window, loadN } = ride;
  // One turn of the collar (common practice: one to two); 1 mm where the pitch is not printed.
  const preloadMm = positive(spring.collarPitchMm) ? spring.collarPitchMm : 1;
  const goes = springsFor(trial.sale.coils, spring, curve.strokeMm + preloadMm);
  if (goes.length === 0) {
    const ask = [{ fact: 'sale.coils', whom: 'workshop' }] as const;
    return alone(answer('spring-rate', 'unknown', 'spring-rate-no-spring-on-sale', { ask }));
  }
  const { wantedNPerMm, nearest, best } = chooseCoil(goes, curve, loadN, window, preloadMm);
  const targetMm = (window.midPercent / 100) * curve.strokeMm;
  const rate = (load: number, gasN = 0): number | null => {
    const found = rateForSag(curve, load, targetMm, preloadMm, gasN);
    return found === null ? null : toLb(found);
  };
  const shown = (name: string, value: number | null) =>
    value === null ? null : figure(name, value, 'lb/in', computed);
  const [low, high] = [rate(ride.lowLoadN), rate(ride.highLoadN)];
  const figures = [
    shown('computed.rate', wantedNPerMm === null ? null : toLb(wantedNPerMm)),
    shown('computed.rateLow', low),
    shown('computed.rateHigh', high),
    shown('computed.rateWithGas', rate(loadN, gasBoundN)),
    ...nearest.flatMap(({ coil, sagPercent }, i) => [
      figure(`sale.rate${i + 1}`, coil.rateLbPerIn, 'lb/in', { kind: 'maker', label: coil.name, date: null }),
      known(sagPercent) ? figure(`computed.sag${i + 1}`, sagPercent, '%', computed) : null,
    ]),
    ...rideFigures(trial, ride),
    positive(spring.collarPitchMm) ? null : figure('assumed.preload', preloadMm, 'mm', practice),
  ];
  if (!best || !known(best.sagPercent)) {
    return alone(answer('spring-rate', 'fail', 'spring-rate-none-in-window', { figures }));
  }
  const { coil, sagPercent } = best;
  const chosen: SpringForRider = {
    kind: 'coil',
    gaugeKPa: null,
    rateNPerMm: coil.rateNPerMm,
    rateLbPerIn: coil.rateLbPerIn,
    sagPercent,
    sagMm: (sagPercent / 100) * curve.strokeMm,
    preloadMm,
    low,
    high,
  };
  return {
    answer: answer('spring-rate', 'work', 'spring-rate-found', {
      figures: [
        ...figures,
        figure('chosen.rate', coil.rateLbPerIn, 'lb/in', computed),
        figure('chosen.sag', sagPercent, '%', computed),
      ],
      parts: [
        { kind: 'coil', partId: coil.id, name: coil.name, end: null, quantity: 1, confirmAtFitting: false },
      ],
      work: [{ id: 'fit-coil', end: null, workshopOnly: false }],
    }),
    spring: chosen,
  };
}
