import { describe, expect, it } from 'vitest';

import {
  aCoilShock,
  aFrame,
  anEntry,
  aPinEnd,
  aQuestion,
  aRider,
  aShock,
  fact,
  someParts,
} from '../../test/judging/questions.js';
import type { CheckId } from '../answers.js';
import type { FitQuestion } from '../facts.js';
import { judge } from '../judge.js';

const codeOf = (check: CheckId, over: Partial<FitQuestion>): string | undefined =>
  judge(aQuestion(over), { full: true }).answers.find((given) => given.check === check)?.code;

describe('a coil', () => {
  const on = (yokes: readonly (boolean | null)[], word: 'allowed' | 'refused' | null) => {
    const [frameEnd, linkEnd] = yokes.map((yoke) => aPinEnd({ yoke }));
    const entry = anEntry({ frameEnd: frameEnd ?? null, linkEnd: linkEnd ?? null });
    return codeOf('coil-on-yoke', {
      frame: aFrame({ entries: [entry], coilOnYoke: word && fact(word) }),
      shock: aCoilShock(),
    });
  };

  it.each([
    [[false, false], null, 'coil-on-yoke-no-yoke'],
    [[false, false], 'refused', 'coil-on-yoke-no-yoke'],
    [[false, true], 'allowed', 'coil-on-yoke-allowed'],
    [[false, true], 'refused', 'coil-on-yoke-refused'],
    [[false, true], null, 'coil-on-yoke-no-word'],
    [[null, true], 'allowed', 'coil-on-yoke-allowed'],
    [[false, null], 'allowed', 'coil-on-yoke-yoke-not-known'],
    [[null, null], null, 'coil-on-yoke-yoke-not-known'],
    [[null, null], 'refused', 'coil-on-yoke-refused'],
  ] as const)('on yokes %j with the maker’s word %s: %s', (yokes, word, code) =>
    expect(on(yokes, word)).toBe(code),
  );

  it('of unstated springs is not known, an air shock passes unless only coils do', () => {
    const frame = aFrame({ springStatement: null });
    expect(codeOf('spring-type', { frame, shock: aCoilShock() })).toBe('spring-type-coil-unstated');
    expect(codeOf('spring-type', { frame })).toBe('spring-type-air-unstated');
    expect(codeOf('spring-type', { frame: aFrame({ springStatement: fact('coil-only') }) })).toBe(
      'spring-type-coil-only',
    );
  });

  it('is given the spring nearest to the middle of the window, worked out by hand', () => {
    const { spring, answers, parts } = judge(aQuestion({ shock: aCoilShock() }));
    // 9.80665 x (78 + 5 + 0.6 x 14.5) x 0.6 = 539.6 N; x 145/55 over 27.5 % of 55 mm + 1.5 mm preload = 85.57 N/mm.
    const load = 9.80665 * (78 + 5 + 0.6 * 14.5) * 0.6;
    const rate = (load * (145 / 55)) / (0.275 * 55 + 1.5) / 0.17512683524647638;
    const figure = (key: string) =>
      answers.flatMap(({ figures }) => figures).find((one) => one.key === key)?.value;
    expect(figure('computed.rate')).toBeCloseTo(rate, 6);
    expect([figure('sale.rate1'), figure('sale.rate2')]).toEqual([500, 475]);
    expect(spring).toMatchObject({ kind: 'coil', rateLbPerIn: 500, preloadMm: 1.5 });
    expect(parts.map(({ partId }) => partId)).toEqual(['coil-500']);
    expect(spring?.low).toBeCloseTo((rate * 0.55) / 0.6, 6);
    expect(spring?.high).toBeCloseTo((rate * 0.65) / 0.6, 6);
  });

  it('fails for a rider whom no spring on sale gives a sag inside the window', () => {
    expect(codeOf('spring-rate', { shock: aCoilShock(), rider: aRider({ riderKg: 150 }) })).toBe(
      'spring-rate-none-in-window',
    );
    const far = someParts({ coils: someParts().coils.filter(({ rateLbPerIn }) => rateLbPerIn < 425) });
    expect(codeOf('spring-rate', { shock: aCoilShock(), sale: far })).toBe('spring-rate-none-in-window');
  });

  it('takes no spring of another inside diameter, too long, or too short in travel', () => {
    for (const over of [{ insideMm: 38 }, { freeLengthMm: 151 }, { travelMm: 56.4 }]) {
      const sale = someParts({ coils: someParts().coils.map((coil) => ({ ...coil, ...over })) });
      expect(codeOf('spring-rate', { shock: aCoilShock(), sale })).toBe('spring-rate-no-spring-on-sale');
    }
    const sale = someParts({ coils: someParts().coils.map((coil) => ({ ...coil, travelMm: 56.5 })) });
    expect(codeOf('spring-rate', { shock: aCoilShock(), sale })).toBe('spring-rate-found');
  });

  it.each([
    { riderKg: null },
    { kitKg: null },
    { bikeKg: null },
    { style: null },
    { riderKg: 0 },
    { riderKg: -5 },
  ])('has no rate for %j', (missing) =>
    expect(codeOf('spring-rate', { shock: aCoilShock(), rider: aRider(missing) })).toBe(
      'spring-rate-not-known',
    ),
  );

  it('needs no style where the sheet prints a sag, which wins', () => {
    const frame = aFrame({ sagTargetPercent: fact(30) });
    const { spring } = judge(aQuestion({ frame, shock: aCoilShock(), rider: aRider({ style: null }) }));
    expect(spring?.sagPercent).toBeGreaterThanOrEqual(28);
    expect(spring?.sagPercent).toBeLessThanOrEqual(32);
  });
});

describe('pressure', () => {
  const { spring } = aShock();
  if (spring.kind !== 'air') throw new Error('an air shock');
  const withLimits = (minGaugeKPa: number | null, maxGaugeKPa: number | null, chambers = spring.chambers) =>
    codeOf('pressure', { shock: aShock({ spring: { ...spring, minGaugeKPa, maxGaugeKPa, chambers } }) });
  const fill = judge(aQuestion()).spring?.gaugeKPa ?? NaN;

  it('passes at the printed limits and fails beyond, for light riders too', () => {
    expect(fill).toBeGreaterThan(800);
    expect(withLimits(fill, fill)).toBe('pressure-within-limits');
    expect(withLimits(100, fill - 0.01)).toBe('pressure-above-limit');
    expect(withLimits(fill + 0.01, 3000)).toBe('pressure-below-limit');
  });

  it('is gauge where the shock is filled: thinner air outside, more on the gauge by the area that feels it', () => {
    const high = judge(aQuestion({ rider: aRider({ fillingHeightM: 2500 }) })).spring?.gaugeKPa ?? NaN;
    expect(high).not.toBe(fill);
    expect(Math.abs(high - fill)).toBeLessThan(30);
  });

  it('of chambers not published is bounded, never shown', () => {
    expect(withLimits(100, 2400, null)).toBe('pressure-start-from-makers-table');
    expect(withLimits(100, 400, null)).toBe('pressure-above-limit-whatever-inside');
    const judged = judge(aQuestion({ shock: aShock({ spring: { ...spring, chambers: null } }) }));
    expect(judged.spring?.gaugeKPa).toBeNull();
  });

  it('of chambers that cannot be true counts as not published', () => {
    const chambers = fact({
      areaMm2: 1100,
      negativeAreaMm2: 950,
      volumeMm3: 50000,
      negativeVolumeMm3: 16000,
    });
    expect(withLimits(100, 2400, chambers)).toBe('pressure-start-from-makers-table');
  });

  it('without printed limits is not known', () => {
    expect(withLimits(null, 2400)).toBe('pressure-limits-not-printed');
    expect(withLimits(100, null)).toBe('pressure-limits-not-printed');
  });
});
