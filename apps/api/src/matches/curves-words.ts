import type { RideView } from '@linkfell/contracts';
import {
  formatPressure,
  g0,
  nPerMmPerLbPerIn,
  plainNumber,
  type RiderLoad,
  type ShockFacts,
  type SpringFigures,
  type SpringToDraw,
} from '@linkfell/fit-engine';

/** One shock as it is drawn, with what that rests on. */
export interface Drawn {
  view: RideView;
  constant: boolean;
  spring: SpringToDraw | null;
  /** The coil is one on sale; otherwise its rate was worked out for the sag. */
  rateChosen: boolean;
}

export const shockName = ({ makerName, modelName, sizeKey }: ShockFacts): string =>
  `${makerName} ${modelName} ${sizeKey}`;

/** Why a curve is missing, for the rider. */
export const notDrawnWords = {
  rider:
    'No spring is drawn: weight, bike or riding style are not told yet. The leverage is the frame’s own.',
  frame: (shock: ShockFacts) =>
    `The ${shockName(shock)} is not drawn: the frame’s travel at this size is not known.`,
  size: (shock: ShockFacts) =>
    `The ${shockName(shock)} is not drawn: the frame does not take its size, so there is nothing to compare.`,
  spring: (shock: ShockFacts) =>
    shock.spring.kind === 'air'
      ? `The spring of the ${shockName(shock)} is not drawn: its maker does not publish the volumes of its air chambers, or no pressure in them carries you at this sag.`
      : `The spring of the ${shockName(shock)} is not drawn: no rate carries you at this sag.`,
  presentSize: 'Your present shock is not drawn: its size is not settled yet.',
  presentNotListed: (key: string) =>
    `Your present shock is not drawn: the frame sheet has no figures for a ${key}.`,
  presentFrame: 'Your present shock is not drawn: the frame’s travel at its size is not known.',
  presentSpring: (spring: 'air' | 'coil' | null) =>
    spring === 'air'
      ? 'The spring of your present shock is not drawn: without its model the volumes of its air chambers are not known. If it is in our list, choose it.'
      : 'The spring of your present shock is not drawn: we have not been told what it is. If it is in our list, choose it.',
} as const;

/** The spring as it is drawn. */
export function springText({ gaugeKPa, coilNPerMm, sagPercent }: SpringFigures): string {
  const sag = `${plainNumber(sagPercent, 1)} % sag`;
  return gaugeKPa !== null
    ? `air at ${formatPressure(gaugeKPa)}, ${sag}`
    : `coil of ${plainNumber((coilNPerMm ?? NaN) / nPerMmPerLbPerIn, 0)} lb/in, ${sag}`;
}

/** What the curves rest on, said once each. */
export function assumedIn(load: RiderLoad | null, drawn: readonly (Drawn | null)[]): string[] {
  const sides = drawn.filter((one) => one !== null);
  const coils = sides.flatMap(({ spring, rateChosen }) =>
    spring?.kind === 'coil' ? [{ ...spring, rateChosen }] : [],
  );
  const worked = coils.some(({ rateChosen }) => !rateChosen);
  return [
    'Friction and the push of the damper’s gas are left out: the force at the wheel is the spring’s force over the leverage.',
    load &&
      `60 % of the weight stands on the rear wheel, and the suspension carries 60 % of the bike’s mass: ${plainNumber(load.loadN / g0, 0)} kg on the wheel.`,
    sides.some(({ spring }) => spring?.kind === 'air') &&
      'An air spring settles slowly to the sag and is drawn as it answers quick movements from there (gas exponent 1.35); near the top its negative chamber may then pull a little.',
    coils.length > 0 &&
      `A coil is drawn with one turn of preload, ${[...new Set(coils.map(({ preloadMm }) => plainNumber(preloadMm, 1)))].join(' and ')} mm.`,
    worked && 'Where a coil’s rate is not known, the rate that gives the sag aimed at is drawn.',
    sides.some(({ constant }) => constant) &&
      'The sheet has no leverage table that agrees with its travel: the mean of travel and stroke is drawn, and how it changes is not known.',
  ].filter((line) => typeof line === 'string');
}
