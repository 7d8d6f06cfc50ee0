import { describe, expect, it } from 'vitest';

import { airEnergyJ, airFromSag, quickExponent } from '../../src/springs/air-energy.js';
import { airForceN } from '../../src/springs/air.js';
import { movedState } from '../../src/springs/air-state.js';
import { fillAtTemperatureKPa } from '../../src/springs/atmosphere.js';
import { sagForRate } from '../../src/springs/coil.js';
import { frequencyHz, wheelForceN, wheelRateNPerMm } from '../../src/springs/wheel.js';
import { makeCurve } from '../../src/kinematics/leverage-curve.js';
import { expectNear } from './near.js';

const chambers = { areaMm2: 1100, negativeAreaMm2: 950, volumeMm3: 105000, negativeVolumeMm3: 16000 };
const [fill, patm, sagMm, endMm] = [1400, 101.325, 15, 55];

/**
 * Work done on a gas from one volume to another: (p2 V2 - p1 V1) / (n - 1), textbook polytropic process (Moran and
 * Shapiro, Fundamentals of Engineering Thermodynamics, chapter 2; from memory). kPa and mm3 give 1e-6 J.
 */
function polytropicWorkJ(p1: number, v1: number, v2: number, n: number): number {
  const p2 = p1 * (v1 / v2) ** n;
  return ((p2 * v2 - p1 * v1) / (n - 1)) * 1e-6;
}

describe('work of the air spring, by the textbook formula for each chamber', () => {
  const volumes = (s: number) => ({ p: 105000 - 1100 * s, n: 16000 + 950 * s });
  const outside = (way: number) => patm * (1100 - 950) * way * 1e-6;

  it.each([1.1, 1.35, 1.4])('from full extension, n = %s', (n) => {
    const [open, closed] = [volumes(0), volumes(endMm)];
    const theirs =
      polytropicWorkJ(fill, open.p, closed.p, n) +
      polytropicWorkJ(fill, open.n, closed.n, n) -
      outside(endMm);
    expectNear(airEnergyJ(chambers, endMm, fill, patm, n), theirs, { rel: 1e-12 });
  });

  it('from sag, quick after a slow start, with gas in the damper', () => {
    const [open, atSag, closed] = [volumes(0), volumes(sagMm), volumes(endMm)];
    // Boyle's law to the sag, then the quick exponent.
    const [pp, pn] = [(fill * open.p) / atSag.p, (fill * open.n) / atSag.n];
    const gasN = 80;
    const theirs =
      polytropicWorkJ(pp, atSag.p, closed.p, quickExponent) +
      polytropicWorkJ(pn, atSag.n, closed.n, quickExponent) -
      outside(endMm - sagMm) +
      (gasN * (endMm - sagMm)) / 1000;
    const found = airFromSag(chambers, { sagMm, endMm }, fill, patm, gasN);
    expectNear(found.energyJ, theirs, { rel: 1e-12 });
    const force =
      (1100 * (pp * (atSag.p / closed.p) ** 1.35 - patm) - 950 * (pn * (atSag.n / closed.n) ** 1.35 - patm)) /
      1000;
    expectNear(found.forceN, force + gasN, { rel: 1e-12 });
  });

  it('is what is put in along the way: the mean force over the way, by Simpson', () => {
    const steps = 2000;
    const at = (i: number) => airForceN(chambers, (endMm * i) / steps, fill, patm, 1.35);
    let sum = at(0) + at(steps);
    for (let i = 1; i < steps; i += 1) sum += (i % 2 === 1 ? 4 : 2) * at(i);
    expectNear(airEnergyJ(chambers, endMm, fill, patm), (sum * endMm) / steps / 3 / 1000, { rel: 1e-9 });
  });

  it('a quick end is firmer than a slow one, by force at full travel over the force at sag', () => {
    const atRest = airForceN(chambers, sagMm, fill, patm, 1);
    const slow = airForceN(chambers, endMm, fill, patm, 1) / atRest;
    const quick = airFromSag(chambers, { sagMm, endMm }, fill, patm).forceN / atRest;
    expect(quick).toBeGreaterThan(slow);
    expect(slow).toBeGreaterThan(1);
  });
});

describe('gas in a tyre', () => {
  // Schaum's Outline of College Physics, 11th edition, chapter 16, problem 3 (seen): 305 kPa gauge at 15 degrees becomes
  // 360 kPa gauge at 327 K, volume unchanged, 101 kPa outside.
  it('warmed at constant volume', () => {
    expectNear(fillAtTemperatureKPa(305 + 101, 288.15, 327) - 101, 360, { abs: 0.5 });
  });

  // A worked problem of a course (fsuguide.weebly.com, seen): 167 kPa gauge, from 13 to 48 degrees, volume 7 % more.
  it('warmed while it grows', () => {
    const warm = fillAtTemperatureKPa(167 + 101.3, 286, 321);
    const tyre = { areaMm2: 1, negativeAreaMm2: 0, volumeMm3: 100, negativeVolumeMm3: 0 };
    const grown = movedState({ ...tyre, positiveKPa: warm, negativeKPa: 0 }, -7, 1);
    expectNear(grown.positiveKPa, 281.4, { abs: 0.05 });
  });
});

describe('a rider on a coil', () => {
  // Static deflection and natural frequency of a single mass, f = sqrt(g / deflection) / 2 pi (Den Hartog, Mechanical
  // Vibrations, chapter 2; from memory): constant leverage and no preload make the wheel such a mass.
  it.each([2, 2.5, 3])('swings as its static deflection says, leverage %s', (ratio) => {
    const made = makeCurve(null, ratio * 60, 60);
    if (!made.ok) throw new Error(made.reason);
    const loadN = 560;
    const sag = sagForRate(made.curve, loadN, 90, 0);
    if (sag.state !== 'ok') throw new Error(sag.state);
    const deflectionM = made.curve.wheelTravelAt(sag.sagMm) / 1000;
    const wheelRate = wheelRateNPerMm(made.curve, sag.sagMm, 90 * sag.sagMm, 90);
    expectNear(wheelForceN(made.curve, sag.sagMm, 90 * sag.sagMm), loadN, { rel: 1e-9 });
    const theirs = Math.sqrt(9.80665 / deflectionM) / (2 * Math.PI);
    expectNear(frequencyHz(wheelRate, loadN / 9.80665), theirs, { rel: 1e-9 });
  });
});
