import type { AskNeed } from '../answers.js';
import type { Curve } from '../kinematics/curve.js';
import { curveForSprings } from '../kinematics/leverage-curve.js';
import { sagWindow, usualShares, wheelLoadN, type SagWindow } from '../springs/load.js';
import { patmAtHeightKPa } from '../springs/atmosphere.js';
import { sizeOf } from '../sizing/sizes.js';
import type { Trial } from './context.js';
import { known, positive } from './known.js';

/** All that a spring's figures rest on. */
export interface Ride {
  curve: Curve;
  window: SagWindow;
  loadN: number;
  /** The same with the rear share 0.05 less and more. */
  lowLoadN: number;
  highLoadN: number;
  patmKPa: number;
  /** The sag aimed at, mm at the shock, and the leverage there and at the softest end of the window. */
  sagMm: number;
  sagRatio: number;
  softestRatio: number;
}
export type RideResult = { ride: Ride } | { missing: AskNeed[] };

/** The rider's load, window and curve, or what is missing of them; worked out once for every shock of one stroke. */
export function rideOf(trial: Trial): RideResult {
  const { entry, shock, shared } = trial;
  // The stroke that the frame works with; travel spacers bring the shock to it.
  const key =
    entry.sizeKey ?? (shared.size.state === 'settled' ? shared.size.sizeKey : null) ?? shock.sizeKey;
  const ofEntry = shared.rides.get(entry) ?? new Map<string, RideResult>();
  shared.rides.set(entry, ofEntry);
  const before = ofEntry.get(key);
  if (before) return before;
  const found = workOut(trial, key);
  ofEntry.set(key, found);
  return found;
}

function workOut({ rider, frame, entry }: Trial, key: string): RideResult {
  const missing: AskNeed[] = [];
  const ask = (fact: string, whom: AskNeed['whom'] = 'rider'): void => void missing.push({ fact, whom });
  const { riderKg, kitKg, bikeKg, fillingHeightM } = rider;
  if (!positive(riderKg)) ask('rider.riderKg');
  if (!known(kitKg) || kitKg < 0) ask('rider.kitKg');
  if (!positive(bikeKg)) ask('rider.bikeKg');
  // Outside this the standard atmosphere's lowest layer says nothing.
  if (!known(fillingHeightM) || fillingHeightM < -5000 || fillingHeightM > 11000) ask('rider.fillingHeightM');
  // A target printed for this frame wins; it was chosen with the leverage in mind, the style's window was not.
  const window = sagWindow(rider.style, frame.sagTargetPercent?.value ?? null);
  if (!window) ask('rider.style');
  const made = curveForSprings(entry.curve, entry.travelMm, sizeOf(key)?.strokeMm ?? NaN);
  if (!made.ok) ask('entry.travelMm', frame.origin === 'sheet' ? 'frame-maker' : 'rider');
  if (missing.length > 0 || !made.ok || !window || riderKg === null || kitKg === null || bikeKg === null) {
    return { missing };
  }
  const load = (shift: number): number =>
    wheelLoadN(riderKg, kitKg, bikeKg, { ...usualShares, rearShare: usualShares.rearShare + shift });
  const { curve } = made;
  const sagMm = (window.midPercent / 100) * curve.strokeMm;
  return {
    ride: {
      curve,
      window,
      loadN: load(0),
      lowLoadN: load(-0.05),
      highLoadN: load(0.05),
      patmKPa: patmAtHeightKPa(fillingHeightM),
      sagMm,
      sagRatio: curve.ratioAt(sagMm),
      softestRatio: curve.ratioAt((window.highPercent / 100) * curve.strokeMm),
    },
  };
}
