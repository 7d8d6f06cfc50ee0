import type { Figure } from '../answers.js';
import { g0 } from '../units/factors.js';
import { computed, figure, practice, type Trial } from './context.js';
import type { Ride } from './ride.js';

const made = new WeakMap<Ride, readonly (Figure | null)[]>();

/**
 * What a spring's answer rests on, for the rider to see: window, weight on the wheel, leverage where it is assumed.
 * The same for every shock of one ride, so made once.
 */
export function rideFigures({ frame }: Trial, ride: Ride): readonly (Figure | null)[] {
  const before = made.get(ride);
  if (before) return before;
  const { window, loadN, curve } = ride;
  const printed = window.printed ? frame.sagTargetPercent?.source : null;
  const figures = [
    figure('rider.window', `${window.lowPercent}–${window.highPercent}`, '%', printed ?? practice),
    figure('rider.load', loadN / g0, 'kg', computed),
    curve.constant ? figure('assumed.leverage', curve.meanRatio, null, computed) : null,
  ];
  made.set(ride, figures);
  return figures;
}
