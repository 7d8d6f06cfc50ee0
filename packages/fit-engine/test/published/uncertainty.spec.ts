import { describe, expect, it } from 'vitest';

import { gauss5 } from '../../src/kinematics/gauss.js';
import { logNormal, sharesFromLogs } from '../../src/sizing/posterior.js';
import { readingUncertaintyMm } from '../../src/sizing/reading-uncertainty.js';
import { expectNear } from './near.js';

const density = (z: number): number => Math.exp(logNormal(z, 1)) / Math.sqrt(2 * Math.PI);
/** Area under the resolver's density, by the engine's own quadrature over fortieths. */
const area = (from: number, to: number): number =>
  Array.from({ length: 40 }, (_, i) => from + ((to - from) * i) / 40).reduce(
    (sum, start) => sum + gauss5(density, start, start + (to - from) / 40),
    0,
  );

describe('normal distribution', () => {
  // Abramowitz and Stegun, table 26.1 (from memory; reproduced with R and SciPy).
  it.each([
    [0.5, 0.691462461274013],
    [1, 0.841344746068543],
    [1.96, 0.97500210485178],
    [2, 0.977249868051821],
    [3, 0.99865010196837],
  ])('P(%s), Abramowitz and Stegun table 26.1', (z, published) => {
    expectNear(0.5 + area(0, z), published, { abs: 1e-13 });
  });

  // NIST TN 1297, section 4.3 (seen): coverage factors of 95 % and 99 %.
  it.each([
    [1.96, 0.95],
    [2.576, 0.99],
  ])('plus and minus %s standard deviations hold %s', (factor, share) => {
    expectNear(area(-factor, factor), share, { abs: 5e-5 });
  });

  // Bolstad, Introduction to Bayesian Statistics, 2nd edition, chapter 11 (from memory): a normal prior of mean 30 and
  // standard deviation 4, twelve readings of mean 32 and standard deviation 2.
  it('a prior and a reading combine as in the textbook', () => {
    const sizes = Array.from({ length: 4001 }, (_, i) => 20 + i * 0.005);
    const u = 2 / Math.sqrt(12);
    const shares = sharesFromLogs(sizes.map((size) => logNormal(size - 30, 4) + logNormal(32 - size, u)));
    const mean = shares.reduce((sum, share, i) => sum + share * (sizes[i] ?? NaN), 0);
    const variance = shares.reduce((sum, share, i) => sum + share * ((sizes[i] ?? NaN) - mean) ** 2, 0);
    expectNear(mean, 31.96, { abs: 0.005 });
    expectNear(Math.sqrt(variance), 0.5714, { abs: 5e-5 });
  });
});

describe('uncertainty of a reading', () => {
  // GUM (JCGM 100:2008) 5.1.2 (from memory): independent components add in quadrature.
  it.each(['caliper', 'ruler', 'tape', 'print'] as const)(
    '%s in the frame adds 0.5 mm in quadrature',
    (tool) => {
      const [plain, awkward] = [false, true].map((turned) =>
        readingUncertaintyMm({ mm: 210, tool, awkward: turned }),
      );
      expectNear((awkward ?? NaN) ** 2 - (plain ?? NaN) ** 2, 0.25, { abs: 1e-12 });
    },
  );

  // GUM F.2.2.1 (from memory): a resolution d alone makes 0.29 d. The figures by tool are common practice and must not
  // promise more than the tool's own graduation: caliper 0.02 mm, ruler 1 mm, tape 1/16 in.
  it.each([
    ['caliper', 0.02],
    ['ruler', 1],
    ['tape', 25.4 / 16],
  ] as const)('%s is not said to be better than its graduation', (tool, graduation) => {
    const u = readingUncertaintyMm({ mm: 210, tool, awkward: false });
    expect(u).toBeGreaterThan(0.29 * graduation);
  });
});
