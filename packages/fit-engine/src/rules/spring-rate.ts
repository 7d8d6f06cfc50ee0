import type { CheckAnswer, SpringForRider } from '../answers.js';
import type { CoilOnSale, ShockSpring } from '../facts.js';
import { rateForSag, sagForRate } from '../springs/coil.js';
import { nPerMmPerLbPerIn } from '../units/factors.js';
import { answer, computed, figure, practice, riderSaid, type Trial } from './context.js';
import { rideOf, type Ride } from './ride.js';

type CoilShock = Extract<ShockSpring, { kind: 'coil' }>;
export interface SpringAnswer {
  answer: CheckAnswer;
  spring: SpringForRider | null;
}

/** One turn of the collar (common practice: one to two); 1 mm where the pitch is not printed. */
const preloadOf = (spring: CoilShock): number => spring.collarPitchMm ?? 1;

/** A coil's rate for this rider: the two nearest springs on sale, the one that gives a sag inside the window. */
export function springRateCheck(trial: Trial): SpringAnswer {
  const { shock, sale } = trial;
  const { spring } = shock;
  if (spring.kind !== 'coil') {
    return { answer: answer('spring-rate', 'pass', 'spring-rate-not-a-coil'), spring: null };
  }
  const known = rideOf(trial);
  if ('missing' in known) {
    return {
      answer: answer('spring-rate', 'unknown', 'spring-rate-not-known', { ask: known.missing }),
      spring: null,
    };
  }
  const { ride } = known;
  const preloadMm = preloadOf(spring);
  const strokeMm = ride.curve.strokeMm;
  const goes = sale.coils.filter(
    (coil) =>
      coil.insideMm === spring.springInsideMm &&
      coil.freeLengthMm <= spring.maxFreeLengthMm &&
      coil.travelMm >= strokeMm + preloadMm,
  );
  if (goes.length === 0) {
    return {
      answer: answer('spring-rate', 'unknown', 'spring-rate-no-spring-on-sale', {
        ask: [{ fact: 'sale.coils', whom: 'workshop' }],
      }),
      spring: null,
    };
  }
  return choose(ride, goes, preloadMm, spring.collarPitchMm === null);
}

function choose(ride: Ride, coils: readonly CoilOnSale[], preloadMm: number, assumed: boolean): SpringAnswer {
  const { curve, window, loadN } = ride;
  const target = (window.midPercent / 100) * curve.strokeMm;
  const wanted = rateForSag(curve, loadN, target, preloadMm);
  const gasBound = rateForSag(curve, loadN, target, preloadMm, 150);
  if (wanted === null) {
    return { answer: answer('spring-rate', 'fail', 'spring-rate-none-in-window'), spring: null };
  }
  const nearest = [...coils]
    .sort(
      (a, b) => Math.abs(a.rateNPerMm - wanted) - Math.abs(b.rateNPerMm - wanted) || (a.id < b.id ? -1 : 1),
    )
    .slice(0, 2)
    .map((coil) => ({ coil, sag: sagForRate(curve, loadN, coil.rateNPerMm, preloadMm) }));
  const percent = (mm: number): number => (100 * mm) / curve.strokeMm;
  const inside = nearest
    .flatMap(({ coil, sag }) =>
      sag.state === 'ok' ? [{ coil, sagMm: sag.sagMm, sagPercent: percent(sag.sagMm) }] : [],
    )
    .filter(({ sagPercent }) => sagPercent >= window.lowPercent && sagPercent <= window.highPercent)
    .sort((a, b) => Math.abs(a.sagPercent - window.midPercent) - Math.abs(b.sagPercent - window.midPercent));
  const toLb = (rate: number): number => rate / nPerMmPerLbPerIn;
  const figures = [
    figure('computed.rate', toLb(wanted), 'lb/in', computed),
    gasBound === null ? null : figure('computed.rateWithGas', toLb(gasBound), 'lb/in', computed),
    ...nearest.flatMap(({ coil, sag }, i) => [
      figure(`sale.rate${i + 1}`, coil.rateLbPerIn, 'lb/in', { kind: 'maker', label: coil.name, date: null }),
      sag.state === 'ok' ? figure(`computed.sag${i + 1}`, percent(sag.sagMm), '%', computed) : null,
    ]),
    figure('rider.window', `${window.lowPercent}–${window.highPercent}`, '%', practice),
    figure('rider.load', loadN / 9.80665, 'kg', riderSaid),
    assumed ? figure('assumed.preload', preloadMm, 'mm', practice) : null,
  ];
  const [best] = inside;
  if (!best)
    return { answer: answer('spring-rate', 'fail', 'spring-rate-none-in-window', { figures }), spring: null };
  const bound = (load: number): number | null => {
    const rate = rateForSag(curve, load, target, preloadMm);
    return rate === null ? null : toLb(rate);
  };
  return {
    answer: answer('spring-rate', 'work', 'spring-rate-found', {
      figures: [
        ...figures,
        figure('chosen.rate', best.coil.rateLbPerIn, 'lb/in', computed),
        figure('chosen.sag', best.sagPercent, '%', computed),
      ],
      parts: [
        {
          kind: 'coil',
          partId: best.coil.id,
          name: best.coil.name,
          end: null,
          quantity: 1,
          confirmAtFitting: false,
        },
      ],
      work: [{ id: 'fit-coil', end: null, workshopOnly: false }],
    }),
    spring: {
      kind: 'coil',
      gaugeKPa: null,
      rateNPerMm: best.coil.rateNPerMm,
      rateLbPerIn: best.coil.rateLbPerIn,
      sagPercent: best.sagPercent,
      sagMm: best.sagMm,
      preloadMm,
      low: bound(ride.lowLoadN),
      high: bound(ride.highLoadN),
    },
  };
}
