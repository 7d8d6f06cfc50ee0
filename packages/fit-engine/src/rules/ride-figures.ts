import type { Figure } from '../answers.js';
import { g0 } from '../units/factors.js';
import { computed, figure, practice, type Trial } from './context.js';
import type { Ride } from './ride.js';

/** What a spring's answer rests on, for the rider to see: window, weight on the wheel, leverage where it is assumed. */
export function rideFigures({ frame }: Trial, { window, loadN, curve }: Ride): (Figure | null)[] {
  const printed = window.printed ? frame.sagTargetPercent?.source : null;
  return [
    figure('rider.window', `${window.lowPercent}–${window.highPercent}`, '%', printed ?? practice),
    figure('rider.load', loadN / g0, 'kg', computed),
    curve.constant ? figure('assumed.leverage', curve.meanRatio, null, computed) : null,
  ];
}
