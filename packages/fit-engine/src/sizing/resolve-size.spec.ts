import { describe, expect, it } from 'vitest';

import type { PresentShock, Reading, Tool } from '../facts.js';
import { resolveSize } from './resolve-size.js';
import { sizes } from './sizes.js';

const none: PresentShock = {
  printedSizeKey: null,
  eyeToEye: null,
  compressed: null,
  shaftTravel: null,
  bodyEndKind: null,
  shaftEndKind: null,
  frameEndHardware: null,
  linkEndHardware: null,
  diameterMm: null,
  spring: null,
  remoteAction: null,
  remoteLine: null,
  soldWithBike: null,
};
const by = (tool: Tool, mm: number): Reading => ({ mm, tool, awkward: false });
const shares = (found: ReturnType<typeof resolveSize>): Record<string, number> =>
  Object.fromEntries(found.candidates.map(({ sizeKey, share }) => [sizeKey, share]));

describe('the check that the model came with: trunnion, extended 185, compressed 131.5', () => {
  const read = (tool: Tool) =>
    resolveSize({ ...none, eyeToEye: by(tool, 185), compressed: by(tool, 131.5) }, null, 'trunnion');

  it('by tape is 74 % for 55 and 26 % for 52.5: not settled', () => {
    const found = read('tape');
    expect(found.state).toBe('measure-again');
    expect(shares(found)['185x55']).toBeCloseTo(0.74, 2);
    expect(shares(found)['185x52.5']).toBeCloseTo(0.26, 2);
    expect(found.measureNext).toBe('stroke-compressed');
  });

  it('by caliper is settled on 55', () => {
    expect(read('caliper')).toMatchObject({ state: 'settled', sizeKey: '185x55' });
  });
});

/** Phi by Abramowitz and Stegun 7.1.26 (from memory; |error| < 1.5e-7): B integrated in closed form instead of by steps. */
function phi(z: number): number {
  const x = Math.abs(z) / Math.SQRT2;
  const t = 1 / (1 + 0.3275911 * x);
  const poly =
    t * (0.254829592 + t * (-0.284496736 + t * (1.421413741 + t * (-1.453152027 + t * 1.061405429))));
  const erf = 1 - poly * Math.exp(-x * x);
  return z < 0 ? (1 - erf) / 2 : (1 + erf) / 2;
}

describe('what keeps a shock from closing', () => {
  it.each(['caliper', 'ruler', 'tape'] as const)(
    'is integrated out as the closed form has it (%s)',
    (tool) => {
      const u = { caliper: 0.25, ruler: 0.7, tape: 1.2 }[tool];
      const [open, closed] = [210.2, 157.9];
      const weights = sizes
        .filter(({ family }) => family !== 'trunnion')
        .map(({ key, eyeToEyeMm: e, strokeMm: s }) => {
          const off = closed - (e - s);
          return {
            key,
            weight: Math.exp(-0.5 * ((open - e) / u) ** 2) * ((phi(off / u) - phi((off - 2) / u)) / 2),
          };
        });
      const sum = weights.reduce((total, { weight }) => total + weight, 0);
      const found = resolveSize(
        { ...none, eyeToEye: by(tool, open), compressed: by(tool, closed) },
        null,
        'eyelet',
      );
      for (const { sizeKey, share } of found.candidates) {
        const expected = (weights.find(({ key }) => key === sizeKey)?.weight ?? NaN) / sum;
        expect(share).toBeCloseTo(expected, 3);
      }
    },
  );

  it('must not decide: settled only if a limit of 1, 2 and 3 mm agree', () => {
    // 54.1 on the shaft: 55 with 0.9 mm left, or 52.5 read 1.6 mm too long; only the caliper can tell.
    const read = (tool: Tool) =>
      resolveSize({ ...none, eyeToEye: by(tool, 210), shaftTravel: by(tool, 54.1) }, null, 'eyelet');
    expect(read('tape').state).toBe('measure-again');
    expect(read('caliper')).toMatchObject({ state: 'settled', sizeKey: '210x55' });
    // 52.4 by caliper: 52.5 closed fully, or 55 held open by 2.6 mm, which a limit of 3 allows.
    expect(
      resolveSize(
        { ...none, eyeToEye: by('caliper', 210), shaftTravel: by('caliper', 52.4) },
        null,
        'eyelet',
      ),
    ).toMatchObject({ sizeKey: null });
  });
});

describe('settling', () => {
  it.each(sizes.map((size) => [size.key, size] as const))(
    '%s read by caliper is itself or asks again, never another',
    (_key, size) => {
      for (const bump of [0, 0.7, 1.4, 2]) {
        const compressed = by('caliper', size.eyeToEyeMm - size.strokeMm + bump);
        const family = size.family === 'trunnion' ? 'trunnion' : 'eyelet';
        const found = resolveSize(
          { ...none, eyeToEye: by('caliper', size.eyeToEyeMm), compressed },
          null,
          family,
        );
        expect([size.key, null]).toContain(found.sizeKey);
      }
    },
  );

  it('does not ask for the stroke of a length that has one stroke', () => {
    expect(resolveSize({ ...none, eyeToEye: by('caliper', 216) }, null, 'eyelet')).toMatchObject({
      state: 'settled',
      sizeKey: '216x63',
    });
  });

  it('lets the published sizes share nine tenths', () => {
    const found = resolveSize({ ...none, eyeToEye: by('caliper', 210) }, ['210x55'], 'eyelet');
    // One published against three of the same length that share a tenth with all the others: 0.9 : 3 x 0.1 / 26.
    expect(shares(found)['210x55']).toBeCloseTo(0.9 / (0.9 + 0.3 / 26), 6);
    expect(found.state).toBe('settled');
  });

  it('knows aliases of the published sizes', () => {
    const present = { ...none, eyeToEye: by('caliper', 190.5) };
    expect(resolveSize(present, ['190x51'], 'eyelet')).toEqual(resolveSize(present, ['190x50'], 'eyelet'));
  });

  it('says nothing of no reading, and works far out where plain numbers underflow', () => {
    expect(resolveSize(none, null, null).state).toBe('nothing-yet');
    const far = resolveSize({ ...none, eyeToEye: by('caliper', 500) }, null, null);
    expect(far.state).toBe('no-such-size');
    expect(far.candidates[0]).toEqual({ sizeKey: '267x89', share: 1 });
  });
});

describe('readings that do not agree', () => {
  it('are no size beyond four uncertainties, at the one B that suits both closed readings', () => {
    const read = (compressed: number, shaft: number) =>
      resolveSize(
        {
          ...none,
          eyeToEye: by('caliper', 210),
          compressed: by('caliper', compressed),
          shaftTravel: by('caliper', shaft),
        },
        null,
        'eyelet',
      ).state;
    // 155 closed means 55 closed fully, 53 on the shaft means 2 mm left: B = 1 misses each by 1 mm, exactly four.
    expect(read(155, 53)).not.toBe('no-such-size');
    expect(read(154.9, 52.85)).toBe('no-such-size');
  });

  it('conflict with the published sizes beyond three, and are shown beside them', () => {
    const found = resolveSize({ ...none, eyeToEye: by('caliper', 211) }, ['210x55'], 'eyelet');
    expect(found.conflicts).toEqual([{ reading: 'eyeToEye', mm: 211, nearestPublished: '210x55' }]);
    expect(resolveSize({ ...none, eyeToEye: by('caliper', 210.7) }, ['210x55'], 'eyelet').conflicts).toEqual(
      [],
    );
  });

  it('unsettle the print', () => {
    const printed = { ...none, printedSizeKey: '210x55' };
    expect(resolveSize(printed, null, 'eyelet')).toMatchObject({
      state: 'settled',
      sizeKey: '210x55',
      fromPrint: true,
    });
    expect(resolveSize({ ...printed, eyeToEye: by('tape', 212) }, null, 'eyelet').state).toBe('settled');
    expect(resolveSize({ ...printed, eyeToEye: by('caliper', 212) }, null, 'eyelet')).toMatchObject({
      state: 'measure-again',
      sizeKey: null,
      measureNext: 'eye-to-eye',
    });
    expect(resolveSize({ ...printed, shaftTravel: by('caliper', 50) }, null, 'eyelet')).toMatchObject({
      state: 'measure-again',
      measureNext: 'stroke-compressed',
    });
    expect(resolveSize(printed, null, 'trunnion').state).toBe('measure-again');
  });
});

describe('the reading to take next', () => {
  it('parts the leading sizes', () => {
    expect(resolveSize({ ...none, eyeToEye: by('caliper', 210) }, null, 'eyelet').measureNext).toBe(
      'stroke-compressed',
    );
    expect(resolveSize({ ...none, shaftTravel: by('caliper', 54.9) }, null, null).measureNext).toBe(
      'eye-to-eye',
    );
  });
});
