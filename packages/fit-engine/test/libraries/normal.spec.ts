import jStat from 'jstat';
import { describe, expect, it } from 'vitest';

import type { Reading, Tool } from '../../src/facts.js';
import { logNormal } from '../../src/sizing/posterior.js';
import { readingUncertaintyMm } from '../../src/sizing/reading-uncertainty.js';
import { resolveSize } from '../../src/sizing/resolve-size.js';
import { sizes, type Size } from '../../src/sizing/sizes.js';
import { aPresentShock } from '../judging/questions.js';
import { seeded, type Random } from '../judging/seeded.js';

const { pdf, cdf } = jStat.normal;
const trunnions = sizes.filter(({ family }) => family === 'trunnion');
const tools: readonly Tool[] = ['print', 'caliper', 'ruler', 'tape'];
const reading = (r: Random, mm: number): Reading => ({ mm, tool: r.pick(tools), awkward: r.chance(0.3) });

/** Mean of the normal density over what keeps the shock from closing, 0 to 2 mm: a difference of two areas. */
const closed = (off: number, u: number): number => (cdf(off, 0, u) - cdf(off - 2, 0, u)) / 2;

function expectShares(likelihood: (size: Size) => number, found: { sizeKey: string; share: number }[]): void {
  const weights = trunnions.map(likelihood);
  const total = weights.reduce((a, b) => a + b, 0);
  for (const { sizeKey, share } of found) {
    const weight = weights[trunnions.findIndex(({ key }) => key === sizeKey)] ?? NaN;
    // The trapezoid rule of 80 steps against the exact areas.
    expect(Math.abs(share - weight / total), sizeKey).toBeLessThan(1e-3);
  }
}

describe('the normal distribution, against jstat', () => {
  it('has the same density', () => {
    const constant = -0.5 * Math.log(2 * Math.PI);
    for (let x = -5; x <= 5; x += 0.25) {
      for (const u of [0.25, 0.56, 0.7, 1.2, 1.3]) {
        expect(Math.exp(logNormal(x, u) + constant)).toBeCloseTo(pdf(x, 0, u), 12);
      }
    }
  });

  it('gives the same shares of the sizes for 1,500 readings of an extended shock', () => {
    const r = seeded(1);
    for (let i = 0; i < 1500; i += 1) {
      const eyeToEye = reading(r, r.pick(trunnions).eyeToEyeMm + r.between(-2, 2));
      const u = readingUncertaintyMm(eyeToEye);
      const { candidates } = resolveSize(aPresentShock({ eyeToEye }), null, 'trunnion');
      expect(candidates.length).toBeGreaterThan(0);
      expectShares(({ eyeToEyeMm }) => pdf(eyeToEye.mm, eyeToEyeMm, u), candidates);
    }
  });

  it('gives the same shares for 1,500 pairs of extended and compressed, what lies between integrated out', () => {
    const r = seeded(2);
    for (let i = 0; i < 1500; i += 1) {
      const size = r.pick(trunnions);
      const eyeToEye = reading(r, size.eyeToEyeMm + r.between(-0.5, 0.5));
      const compressed = reading(r, size.eyeToEyeMm - size.strokeMm + r.between(-0.5, 2.5));
      const [ue, uc] = [readingUncertaintyMm(eyeToEye), readingUncertaintyMm(compressed)];
      const { candidates } = resolveSize(aPresentShock({ eyeToEye, compressed }), null, 'trunnion');
      expectShares(
        ({ eyeToEyeMm: e, strokeMm: s }) => pdf(eyeToEye.mm, e, ue) * closed(compressed.mm - (e - s), uc),
        candidates,
      );
    }
  });

  it('gives the same shares for 1,500 readings of the shaft by O-ring', () => {
    const r = seeded(3);
    for (let i = 0; i < 1500; i += 1) {
      const shaftTravel = reading(r, r.pick(trunnions).strokeMm - r.between(-0.5, 2.5));
      const u = readingUncertaintyMm(shaftTravel);
      const { candidates } = resolveSize(aPresentShock({ shaftTravel }), null, 'trunnion');
      expectShares(({ strokeMm }) => closed(strokeMm - shaftTravel.mm, u), candidates);
    }
  });
});
