import type { AirChambers, LeverageTable, RiderFacts } from '../facts.js';
import type { Curve } from '../kinematics/curve.js';
import { curveForSprings } from '../kinematics/leverage-curve.js';
import { airFromSag, quickExponent } from '../springs/air-energy.js';
import { filledState, movedState, stateForceN, stateStiffnessNPerMm } from '../springs/air-state.js';
import { fillForSag } from '../springs/air.js';
import { patmAtHeightKPa } from '../springs/atmosphere.js';
import { rateForSag, sagForRate } from '../springs/coil.js';
import { sagWindow, wheelLoadN } from '../springs/load.js';
import { frequencyHz, wheelForceN, wheelRateNPerMm } from '../springs/wheel.js';
import { g0 } from '../units/factors.js';

/** What presses on the wheel, N, and the sag aimed at, % of stroke. */
export interface RiderLoad {
  loadN: number;
  midPercent: number;
  patmKPa: number;
}

/** A spring as it is to be drawn; a coil without a rate is drawn with the rate that gives the sag aimed at. */
export type SpringToDraw =
  { kind: 'air'; chambers: AirChambers } | { kind: 'coil'; rateNPerMm: number | null; preloadMm: number };

export interface RidePoint {
  wheelMm: number;
  shockMm: number;
  ratio: number;
  /** At the wheel, without friction; null where no spring is drawn. */
  forceN: number | null;
  rateNPerMm: number | null;
}
export interface SpringFigures {
  gaugeKPa: number | null;
  coilNPerMm: number | null;
  sagPercent: number;
  sagMm: number;
  sagWheelMm: number;
  /** At sag, for quick movements. */
  frequencyHz: number;
  /** Wheel force at full travel over the static load. */
  endToStatic: number;
  /** From sag to full travel, J. */
  energyJ: number;
}
export interface RideSeries {
  strokeMm: number;
  travelMm: number;
  meanRatio: number;
  progressionPercent: number | null;
  /** Leverage of travel and stroke alone. */
  constant: boolean;
  points: readonly RidePoint[];
  spring: SpringFigures | null;
}

/** Points of a series: one per so many parts of the wheel travel, both ends included. */
const parts = 48;

/** Load and sag for a rider, or null while weight, bike or style are not told. */
export function riderLoad(rider: RiderFacts, printedSagPercent: number | null): RiderLoad | null {
  const { riderKg, kitKg, bikeKg, style, fillingHeightM } = rider;
  const window = sagWindow(style, printedSagPercent);
  if (riderKg === null || kitKg === null || bikeKg === null || !window) return null;
  const load = {
    loadN: wheelLoadN(riderKg, kitKg, bikeKg),
    midPercent: window.midPercent,
    patmKPa: patmAtHeightKPa(fillingHeightM),
  };
  return load.loadN > 0 && Object.values(load).every(Number.isFinite) ? load : null;
}

/**
 * Leverage, wheel force and wheel rate over the wheel's travel, at equal steps of wheel travel, so that two shocks of
 * one frame stand on one grid. Virtual work, friction and the damper's gas neglected. An air spring settles slowly
 * to the sag (n = 1) and is drawn as it answers to quick movements about it (n = 1.35).
 * @returns null where travel and stroke make no curve
 */
export function rideSeries(
  { table, travelMm, strokeMm }: { table: LeverageTable | null; travelMm: number | null; strokeMm: number },
  load: RiderLoad | null,
  spring: SpringToDraw | null,
): RideSeries | null {
  const made = curveForSprings(table, travelMm, strokeMm);
  if (!made.ok) return null;
  const { curve } = made;
  const about = load && spring ? springAbout(curve, load, spring) : null;
  const points = Array.from({ length: parts + 1 }, (_, i): RidePoint => {
    const wheelMm = (curve.totalTravelMm * i) / parts;
    const shockMm = curve.shockTravelAt(wheelMm);
    const at = { wheelMm, shockMm, ratio: curve.ratioAt(shockMm) };
    if (!about) return { ...at, forceN: null, rateNPerMm: null };
    const [forceN, rate] = [about.forceN(shockMm), about.rateNPerMm(shockMm)];
    return {
      ...at,
      forceN: wheelForceN(curve, shockMm, forceN),
      rateNPerMm: wheelRateNPerMm(curve, shockMm, forceN, rate),
    };
  });
  const { totalTravelMm, meanRatio, progressionPercent, constant } = curve;
  const series = { strokeMm, travelMm: totalTravelMm, meanRatio, progressionPercent, constant, points };
  const sound = points.every((point) =>
    Object.values(point).every((value) => value === null || Number.isFinite(value)),
  );
  return sound ? { ...series, spring: about?.figures ?? null } : null;
}

interface About {
  forceN: (shockMm: number) => number;
  rateNPerMm: (shockMm: number) => number;
  figures: SpringFigures;
}

function springAbout(curve: Curve, load: RiderLoad, spring: SpringToDraw): About | null {
  if (!Object.values(load).every(Number.isFinite)) return null;
  const about = spring.kind === 'air' ? airAbout(curve, load, spring) : coilAbout(curve, load, spring);
  return about && Object.values(about.figures).every((value) => value === null || Number.isFinite(value))
    ? about
    : null;
}

function airAbout(curve: Curve, load: RiderLoad, { chambers }: { chambers: AirChambers }): About | null {
  const { loadN, midPercent, patmKPa } = load;
  const sagMm = (midPercent / 100) * curve.strokeMm;
  const gaugeKPa = fillForSag(chambers, curve, loadN, sagMm, patmKPa);
  if (gaugeKPa === null) return null;
  const atSag = movedState(filledState(chambers, gaugeKPa + patmKPa), sagMm, 1);
  const quick = (s: number) => movedState(atSag, s - sagMm, quickExponent);
  const { energyJ } = airFromSag(chambers, { sagMm, endMm: curve.strokeMm }, gaugeKPa + patmKPa, patmKPa);
  return finish(curve, loadN, sagMm, {
    forceN: (s) => stateForceN(quick(s), patmKPa),
    rateNPerMm: (s) => stateStiffnessNPerMm(quick(s), quickExponent),
    energyJ,
    gaugeKPa,
    coilNPerMm: null,
  });
}

function coilAbout(
  curve: Curve,
  { loadN, midPercent }: RiderLoad,
  { rateNPerMm, preloadMm }: { rateNPerMm: number | null; preloadMm: number },
): About | null {
  const target = (midPercent / 100) * curve.strokeMm;
  const coilNPerMm = rateNPerMm ?? rateForSag(curve, loadN, target, preloadMm);
  if (coilNPerMm === null) return null;
  const found = sagForRate(curve, loadN, coilNPerMm, preloadMm);
  if (found.state !== 'ok') return null;
  const forceN = (s: number): number => coilNPerMm * (s + preloadMm);
  const { sagMm } = found;
  const energyJ = ((curve.strokeMm - sagMm) * (forceN(sagMm) + forceN(curve.strokeMm))) / 2000;
  return finish(curve, loadN, sagMm, {
    forceN,
    rateNPerMm: () => coilNPerMm,
    energyJ,
    gaugeKPa: null,
    coilNPerMm,
  });
}

function finish(
  curve: Curve,
  loadN: number,
  sagMm: number,
  {
    forceN,
    rateNPerMm,
    energyJ,
    gaugeKPa,
    coilNPerMm,
  }: Omit<About, 'figures'> & Pick<SpringFigures, 'energyJ' | 'gaugeKPa' | 'coilNPerMm'>,
): About {
  const rateAtSag = wheelRateNPerMm(curve, sagMm, forceN(sagMm), rateNPerMm(sagMm));
  return {
    forceN,
    rateNPerMm,
    figures: {
      gaugeKPa,
      coilNPerMm,
      sagPercent: (100 * sagMm) / curve.strokeMm,
      sagMm,
      sagWheelMm: curve.wheelTravelAt(sagMm),
      frequencyHz: frequencyHz(rateAtSag, loadN / g0),
      endToStatic: wheelForceN(curve, curve.strokeMm, forceN(curve.strokeMm)) / loadN,
      energyJ,
    },
  };
}
