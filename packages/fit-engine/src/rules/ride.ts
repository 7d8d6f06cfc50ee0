import type { AskNeed } from '../answers.js';
import { makeCurve, type Curve } from '../kinematics/leverage-curve.js';
import { sagWindow, usualShares, wheelLoadN, type SagWindow } from '../springs/load.js';
import { patmAtHeightKPa } from '../springs/atmosphere.js';
import { sizeOf } from '../sizing/sizes.js';
import type { Trial } from './context.js';

/** All that a spring's figures rest on. */
export interface Ride {
  curve: Curve;
  window: SagWindow;
  loadN: number;
  /** The same with the rear share 0.05 less and more. */
  lowLoadN: number;
  highLoadN: number;
  patmKPa: number;
}

const positive = (value: number | null): value is number =>
  value !== null && Number.isFinite(value) && value > 0;

/** The rider's load, window and curve, or what is missing of them. */
export function rideOf(trial: Trial): { ride: Ride } | { missing: AskNeed[] } {
  const { rider, frame, entry, shock, shared } = trial;
  const missing: AskNeed[] = [];
  const ask = (fact: string, whom: AskNeed['whom'] = 'rider'): void => void missing.push({ fact, whom });
  const { riderKg, kitKg, bikeKg } = rider;
  if (!positive(riderKg)) ask('rider.riderKg');
  if (kitKg === null || !(kitKg >= 0)) ask('rider.kitKg');
  if (!positive(bikeKg)) ask('rider.bikeKg');
  const window = sagWindow(rider.style, frame.sagTargetPercent?.value ?? null);
  if (!window) ask('rider.style');
  // The stroke that the frame works with; travel spacers bring the shock to it.
  const key =
    entry.sizeKey ?? (shared.size.state === 'settled' ? shared.size.sizeKey : null) ?? shock.sizeKey;
  const made = makeCurve(entry.curve, entry.travelMm, sizeOf(key)?.strokeMm ?? NaN);
  if (!made.ok) ask('entry.travelMm', frame.origin === 'sheet' ? 'frame-maker' : 'rider');
  if (missing.length > 0 || !made.ok || !window || riderKg === null || kitKg === null || bikeKg === null) {
    return { missing };
  }
  const load = (shift: number): number =>
    wheelLoadN(riderKg, kitKg, bikeKg, { ...usualShares, rearShare: usualShares.rearShare + shift });
  return {
    ride: {
      curve: made.curve,
      window,
      loadN: load(0),
      lowLoadN: load(-0.05),
      highLoadN: load(0.05),
      patmKPa: patmAtHeightKPa(Number.isFinite(rider.fillingHeightM) ? rider.fillingHeightM : 0),
    },
  };
}
