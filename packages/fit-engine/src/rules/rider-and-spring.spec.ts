import { describe, expect, it } from 'vitest';

import {
  aCoilShock,
  aFrame,
  anEntry,
  aPinEnd,
  aPresentShock,
  aQuestion,
  aRider,
  aShock,
  fact,
  someParts,
} from '../../test/judging/questions.js';
import type { CheckId } from '../answers.js';
import type { FitQuestion, RiderFacts, WeightLimit } from '../facts.js';
import { judge } from '../judge.js';

const codeOf = (check: CheckId, over: Partial<FitQuestion>): string | undefined =>
  judge(aQuestion(over), { full: true }).answers.find((given) => given.check === check)?.code;

describe('rider weight', () => {
  const limited = (limit: WeightLimit, rider: Partial<RiderFacts> = {}): string | undefined =>
    codeOf('rider-weight', { shock: aShock({ riderLimit: fact(limit) }), rider: aRider(rider) });

  it.each([
    ['rider', 78, 77.9],
    ['rider-and-kit', 83, 82.9],
    ['with-bike', 97.5, 97.4],
  ] as const)('counts on its basis, %s: %s passes, %s does not', (basis, at, below) => {
    expect(limited({ kg: at, basis })).toBe('rider-weight-within');
    expect(limited({ kg: below, basis })).toBe('rider-weight-over');
  });

  it('at the limit passes in fractions that binary cannot hold', () => {
    expect(limited({ kg: 0.3 + 80, basis: 'rider-and-kit' }, { riderKg: 80.1, kitKg: 0.2 })).toBe(
      'rider-weight-within',
    );
  });

  it('without a basis is not known within the bike’s mass of the limit', () => {
    expect(limited({ kg: 97.5, basis: null })).toBe('rider-weight-within');
    expect(limited({ kg: 97.4, basis: null })).toBe('rider-weight-basis-not-printed');
    expect(limited({ kg: 83, basis: null })).toBe('rider-weight-basis-not-printed');
    expect(limited({ kg: 82.9, basis: null })).toBe('rider-weight-over');
  });

  it('not told is not known where a limit is printed, a remark where none is', () => {
    expect(limited({ kg: 200, basis: 'rider' }, { riderKg: null })).toBe('rider-weight-not-known');
    expect(codeOf('rider-weight', {})).toBe('rider-weight-no-limit');
  });

  it('holds the frame’s limit as well', () => {
    const frame = aFrame({ riderLimit: fact({ kg: 70, basis: 'rider' }) });
    expect(
      codeOf('rider-weight', { frame, shock: aShock({ riderLimit: fact({ kg: 120, basis: 'rider' }) }) }),
    ).toBe('rider-weight-over');
  });
});

describe('remote', () => {
  const lock = { action: 'pull-to-lock', line: 'cable', holdOpenPartId: null } as const;
  const open = { action: 'pull-to-open', line: 'cable', holdOpenPartId: 'clip' } as const;
  const ask = (
    remote: FitQuestion['shock']['remote'],
    rider: Partial<RiderFacts>,
    more: Partial<FitQuestion> = {},
  ) => codeOf('remote', { shock: aShock({ remote }), rider: aRider(rider), ...more });
  const none = { frame: aFrame({ cableRouting: fact('none') }) };

  it('wanted and not there does not do what was asked', () => {
    expect(ask(null, { wantsRemote: true })).toBe('remote-wanted-has-none');
    expect(ask(null, { wantsRemote: false })).toBe('remote-none');
  });

  it.each([null, lock, open])('not answered is asked for', (remote) => {
    expect(ask(remote, { wantsRemote: null })).toBe('remote-wish-not-known');
  });

  it('without routing waits for the rider to accept external', () => {
    expect(ask(lock, { wantsRemote: true }, none)).toBe('remote-no-routing');
    const own = aPresentShock({ remoteAction: 'pull-to-lock', remoteLine: 'cable' });
    const accepted = { wantsRemote: true, acceptsExternalRouting: true };
    expect(ask(lock, accepted, { ...none, present: own })).toBe('remote-external-routing');
    expect(ask(lock, { wantsRemote: true }, { frame: aFrame({ cableRouting: null }) })).toBe(
      'remote-routing-not-known',
    );
  });

  it('adds a lever where the rider’s own disagrees or is not known', () => {
    for (const present of [
      aPresentShock(),
      aPresentShock({ remoteAction: 'pull-to-open', remoteLine: 'cable' }),
    ]) {
      expect(ask(lock, { wantsRemote: true }, { present })).toBe('remote-lever-added');
    }
    expect(ask(lock, { wantsRemote: true }, { sale: someParts({ remotes: [] }) })).toBe(
      'remote-no-lever-on-sale',
    );
  });

  it('not wanted stays open when pulled to lock, and needs a part when pulled to open', () => {
    expect(ask(lock, { wantsRemote: false })).toBe('remote-stays-open');
    expect(ask(open, { wantsRemote: false })).toBe('remote-stays-closed');
    expect(ask(open, { wantsRemote: false }, { sale: someParts({ otherPartIds: ['clip'] }) })).toBe(
      'remote-held-open',
    );
  });
});

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

describe('e-bikes and notices', () => {
  it.each([
    [false, null, 'e-bike-not-one'],
    [true, true, 'e-bike-approved'],
    [true, false, 'e-bike-refused'],
    [true, null, 'e-bike-no-word'],
    [null, true, 'e-bike-approved'],
    [null, false, 'e-bike-not-told'],
    [null, null, 'e-bike-not-told'],
  ] as const)('bike %s, shock %s: %s', (bike, word, code) => {
    const frame = aFrame({ eBike: bike === null ? null : fact(bike) });
    const shock = aShock({ eBikeApproved: word === null ? null : fact(word) });
    expect(codeOf('e-bike', { frame, shock })).toBe(code);
  });

  it('a recall on either stops the sale and is the one that is named', () => {
    const { source } = fact(0);
    const remark = { id: 'a', title: 'Read the note', effect: 'remark', source } as const;
    const recall = { id: 'b', title: 'Recall of the eye', effect: 'stop', source } as const;
    const { verdict, answers } = judge(
      aQuestion({ frame: aFrame({ notices: [remark] }), shock: aShock({ notices: [recall] }) }),
    );
    expect(verdict).toBe('wont-fit');
    expect(answers.find(({ check }) => check === 'notices')?.figures[0]?.value).toBe('Recall of the eye');
    expect(codeOf('notices', { frame: aFrame({ notices: [remark] }) })).toBe('notices-remark');
  });
});
