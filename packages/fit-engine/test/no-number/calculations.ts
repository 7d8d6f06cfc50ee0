import * as lateral from '../../src/clearance/lateral.js';
import * as polygons from '../../src/clearance/polygon-distance.js';
import { sweep } from '../../src/clearance/sweep.js';
import type { Point } from '../../src/facts.js';
import * as curves from '../../src/kinematics/curve.js';
import * as gauss from '../../src/kinematics/gauss.js';
import * as leverage from '../../src/kinematics/leverage-curve.js';
import * as posterior from '../../src/sizing/posterior.js';
import * as energy from '../../src/springs/air-energy.js';
import * as state from '../../src/springs/air-state.js';
import * as air from '../../src/springs/air.js';
import * as atmosphere from '../../src/springs/atmosphere.js';
import * as choice from '../../src/springs/choose-coil.js';
import * as coil from '../../src/springs/coil.js';
import * as balance from '../../src/springs/equilibrium.js';
import * as helical from '../../src/springs/helical.js';
import * as load from '../../src/springs/load.js';
import * as wheel from '../../src/springs/wheel.js';
import { asIfUntold, givesNoNumber, refusesText, type Complaints } from './complaints.js';
import { torqueSlipRange } from '../../src/springs/torque.js';

const table = {
  by: 'shock-travel',
  points: [
    [0, 3],
    [27, 2.7],
    [55, 2.4],
  ],
} as const;
const byWheel = {
  by: 'wheel-travel',
  points: [
    [0, 3],
    [80, 2.7],
    [148, 2.4],
  ],
} as const;
const made = leverage.makeCurve(table, 148, 55);
if (!made.ok) throw new Error(made.reason);
const { curve } = made;
const chambers = { areaMm2: 1100, negativeAreaMm2: 950, volumeMm3: 105000, negativeVolumeMm3: 16000 };
const filled = state.filledState(chambers, 1500);
const square: Point[] = [
  [0, 0],
  [10, 0],
  [10, 10],
  [0, 10],
];
const away: Point[] = square.map(([x, y]) => [x + 30, y]);
const tube = { name: 'tube', polygon: away, toleranceMm: 0.5, poses: null, moves: false };
const room = {
  outlines: [tube],
  swing: [
    [0, 0],
    [55, 2],
  ] as const,
};
const spring = {
  id: 'c',
  name: 'c',
  rateNPerMm: 80,
  rateLbPerIn: 450,
  travelMm: 60,
  insideMm: 36,
  freeLengthMm: 150,
};
const window = { lowPercent: 25, highPercent: 30, midPercent: 27.5, printed: false };

/** Every calculation of the engine, by module and name. The curve is sound: what spoils a curve is a table. */
export const calculations: Readonly<Record<string, Record<string, Complaints>>> = {
  'springs/wheel': {
    wheelForceN: givesNoNumber((s: number, f: number) => wheel.wheelForceN(curve, s, f), 15, 1800),
    wheelRateNPerMm: givesNoNumber(
      (s: number, f: number, k: number) => wheel.wheelRateNPerMm(curve, s, f, k),
      15,
      1800,
      80,
    ),
    frequencyHz: givesNoNumber(wheel.frequencyHz, 12, 58),
  },
  'springs/air': {
    airForceN: givesNoNumber(air.airForceN, chambers, 15, 1500, 101, 1.35, 20),
    airStiffnessNPerMm: givesNoNumber(air.airStiffnessNPerMm, chambers, 15, 1500, 1.35),
    fillForSag: givesNoNumber(
      (c: typeof chambers, ...rest: [number, number, number, number]) => {
        const [loadN, sagMm, patmKPa, gasN] = rest;
        return air.fillForSag(c, curve, loadN, sagMm, patmKPa, gasN);
      },
      chambers,
      540,
      15,
      101,
      20,
    ),
    fillForForce: givesNoNumber(air.fillForForce, chambers, 1500, 15, 101),
    sagForFill: givesNoNumber(
      (c: typeof chambers, ...rest: [number, number, number, number]) => {
        const [loadN, gaugeKPa, patmKPa, gasN] = rest;
        return air.sagForFill(c, curve, loadN, gaugeKPa, patmKPa, gasN);
      },
      chambers,
      540,
      1400,
      101,
      20,
    ),
    leastFillKPa: givesNoNumber(
      (d: number, f: number, sag: number, patm: number) => air.leastFillKPa(d, curve, f, sag, patm),
      55,
      540,
      30,
      101,
    ),
    leastFillForForce: givesNoNumber(air.leastFillForForce, 55, 1500, 0.3, 101),
  },
  'springs/air-energy': {
    airEnergyJ: givesNoNumber(energy.airEnergyJ, chambers, 40, 1500, 101, 1.35),
    airFromSag: givesNoNumber(energy.airFromSag, chambers, { sagMm: 15, endMm: 55 }, 1500, 101, 0, 1.35),
  },
  'springs/air-state': {
    // A state is its input with two pressures: what counts is the force that comes of it.
    filledState: givesNoNumber((p: number) => state.stateForceN(state.filledState(chambers, p), 101), 1500),
    movedState: givesNoNumber(
      (s: typeof filled, by: number, n: number) => state.stateForceN(state.movedState(s, by, n), 101),
      filled,
      15,
      1.35,
    ),
    // It reads no volumes.
    stateForceN: givesNoNumber(
      ({ areaMm2, positiveKPa }: { areaMm2: number; positiveKPa: number }, patm: number) =>
        state.stateForceN({ ...filled, areaMm2, positiveKPa }, patm),
      { areaMm2: 1100, positiveKPa: 1500 },
      101,
    ),
    stateStiffnessNPerMm: givesNoNumber(
      ({ areaMm2, positiveKPa }: { areaMm2: number; positiveKPa: number }, n: number) =>
        state.stateStiffnessNPerMm({ ...filled, areaMm2, positiveKPa }, n),
      { areaMm2: 1100, positiveKPa: 1500 },
      1.35,
    ),
    stateEnergyJ: givesNoNumber(
      (by: number, patm: number, n: number) => state.stateEnergyJ(filled, by, patm, n),
      15,
      101,
      1.35,
    ),
  },
  'springs/atmosphere': {
    patmAtHeightKPa: givesNoNumber(atmosphere.patmAtHeightKPa, 1500),
    geopotentialM: givesNoNumber(atmosphere.geopotentialM, 1500),
    fillAtTemperatureKPa: givesNoNumber(atmosphere.fillAtTemperatureKPa, 1500, 293, 273),
  },
  'springs/coil': {
    rateForSag: givesNoNumber(
      (f: number, sag: number, pre: number, gas: number) => coil.rateForSag(curve, f, sag, pre, gas),
      540,
      15,
      1,
      20,
    ),
    sagForRate: givesNoNumber(
      (f: number, rate: number, pre: number, gas: number) => coil.sagForRate(curve, f, rate, pre, gas),
      540,
      80,
      1,
      20,
    ),
  },
  'springs/choose-coil': {
    chooseCoil: givesNoNumber(
      (rate: number, f: number, pre: number) =>
        choice.chooseCoil([{ ...spring, rateNPerMm: rate }], curve, f, window, pre).best?.sagPercent,
      90,
      540,
      1,
    ),
  },
  'springs/equilibrium': {
    equilibrium: givesNoNumber(
      (f: number, rate: number) => balance.equilibrium(curve, f, (s) => rate * (s + 1)),
      540,
      80,
    ),
  },
  'springs/helical': {
    activeCoils: givesNoNumber((turns: number) => helical.activeCoils(turns, 'squared'), 8),
    helicalRateNPerMm: givesNoNumber(helical.helicalRateNPerMm, 12, 52, 6, 78500),
    curvatureFactor: givesNoNumber(helical.curvatureFactor, 12, 52),
    helicalStressNPerMm2: givesNoNumber(helical.helicalStressNPerMm2, 12, 52, 3000),
    solidLengthMm: givesNoNumber((d: number, n: number) => helical.solidLengthMm(d, n, 'squared'), 12, 8),
    springMassKg: givesNoNumber(helical.springMassKg, 12, 52, 8, 7.85e-6),
  },
  'springs/load': {
    wheelLoadN: givesNoNumber(load.wheelLoadN, 78, 5, 14, { rearShare: 0.6, sprungShare: 0.6 }),
    // A printed target that is no number counts as not printed: the style's window, or none.
    sagWindow: asIfUntold(
      (by) => [load.sagWindow('trail', by), load.sagWindow(null, by)],
      () => [load.sagWindow('trail', null), load.sagWindow(null, null)],
    ),
  },
  'springs/torque': {
    torqueSlipRange: refusesText(
      torqueSlipRange,
      (by) => `M${by}`,
      (by) => by,
    ),
  },
  'kinematics/curve': {
    within: givesNoNumber((value: number) => curves.within(value, 55), 15),
    inverseOf: givesNoNumber((w: number, end: number) => curves.inverseOf((x) => 2 * x, w, end), 40, 55),
  },
  'kinematics/leverage-curve': {
    makeCurve: givesNoNumber(
      (points: (typeof table)['points'], travel: number, stroke: number) => {
        const result = leverage.makeCurve({ by: 'shock-travel', points }, travel, stroke);
        // A travel that is no number counts as not told; a table or a stroke that is none is refused.
        return result.ok && Number.isFinite(travel) ? result.curve.meanRatio : null;
      },
      table.points,
      148,
      55,
    ),
    curveForSprings: givesNoNumber(
      (travel: number, stroke: number) => {
        const result = leverage.curveForSprings(null, travel, stroke);
        return result.ok ? result.curve.meanRatio : null;
      },
      148,
      55,
    ),
    'curve by shock travel': givesNoNumber((x: number) => everyFigureAt(curve, x), 15),
    'curve by wheel travel': givesNoNumber((x: number) => {
      const result = leverage.makeCurve(byWheel, 148, 55);
      return result.ok ? everyFigureAt(result.curve, x) : null;
    }, 15),
    'curve of travel and stroke': givesNoNumber((x: number) => {
      const result = leverage.makeCurve(null, 148, 55);
      // Its ratio is the same everywhere, its slope 0: neither reads where.
      return result.ok ? [result.curve.wheelTravelAt(x), result.curve.shockTravelAt(x)] : null;
    }, 15),
  },
  'kinematics/gauss': {
    gauss5: givesNoNumber((from: number, to: number) => gauss.gauss5((x) => x * x, from, to), 0, 2),
  },
  'sizing/posterior': {
    sharesFromLogs: (by) =>
      posterior.sharesFromLogs([0, by, -1]).some((share) => share > 0 && by !== -Infinity) ? ['a share'] : [],
    logNormal: givesNoNumber(posterior.logNormal, 0.5, 0.25),
    logMeanExp: givesNoNumber((from: number, to: number) => posterior.logMeanExp((x) => -x, from, to), 0, 2),
  },
  'clearance/lateral': {
    lateralOk: (by) =>
      [lateral.lateralOk(by, 70), lateral.lateralOk(55, by)].some((ok) => ok) ? ['says there is room'] : [],
  },
  'clearance/polygon-distance': {
    polygonDistance: givesNoNumber(polygons.polygonDistance, square, away),
  },
  'clearance/sweep': {
    sweep: givesNoNumber(
      (outlines: (typeof tube)[], body: Point[], eyeToEyeMm: number, strokeMm: number) =>
        sweep({ ...room, outlines }, { body, eyeToEyeMm, strokeMm, wayRound: 'body-to-frame' }).distanceMm,
      [tube],
      square,
      210,
      55,
    ),
  },
};

function everyFigureAt(of: typeof curve, x: number): number[] {
  return [of.ratioAt(x), of.slopeAt(x), of.wheelTravelAt(x), of.shockTravelAt(x)];
}
