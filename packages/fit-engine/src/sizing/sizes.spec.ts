import { describe, expect, it } from 'vitest';

import { findSizeKey, sizeOf, sizes } from './sizes.js';

describe('the size catalogue', () => {
  it('has 32 metric sizes and 11 from inches, each once', () => {
    expect(sizes).toHaveLength(43);
    expect(new Set(sizes.map(({ key }) => key)).size).toBe(43);
    const labels = sizes.flatMap(({ key, aliases }) => [key, ...aliases]);
    expect(new Set(labels).size).toBe(labels.length);
    expect(new Set(sizes.map(({ eyeToEyeMm, strokeMm }) => `${eyeToEyeMm}|${strokeMm}`)).size).toBe(43);
  });

  it('makes a trunnion 25 mm shorter than the eyelet shock of the same stroke', () => {
    for (const { eyeToEyeMm, strokeMm } of sizes.filter(({ family }) => family === 'trunnion')) {
      const partner = sizes.find((size) => size.family === 'eyelet' && size.strokeMm === strokeMm);
      expect(partner?.eyeToEyeMm).toBe(eyeToEyeMm + 25);
    }
  });

  it('has true lengths of inch sizes, which their labels round', () => {
    expect(sizeOf('240x76')).toMatchObject({
      eyeToEyeMm: expect.closeTo(241.3, 9),
      strokeMm: expect.closeTo(76.2, 9),
    });
    expect(sizeOf('241x76')?.key).toBe('240x76');
    expect(sizeOf('190x51')?.key).toBe('190x50');
    expect(sizeOf('210x54')).toBeNull();
  });
});

describe('findSizeKey', () => {
  it.each([
    ['210x55', '210x55'],
    ['210 x 55', '210x55'],
    ['210 × 52,5 mm', '210x52.5'],
    ['210mm x 52.5mm', '210x52.5'],
    ['55 x 210', '210x55'],
    ['7.875x2.25', '200x57'],
    ['7 7/8 x 2 1/4', '200x57'],
    ['7 7/8" x 2 1/4"', '200x57'],
    ['2.25in x 7.875in', '200x57'],
    ['7.5 X 2.0', '190x50'],
    ['190*51', '190x50'],
  ])('reads %s', (text, key) => expect(findSizeKey(text)).toBe(key));

  it.each(['', '210', '210x54', '210x55.01', '7.875x57', '210 55', '210x55x30', 'NaNx55'])(
    'finds no size in "%s"',
    (text) => expect(findSizeKey(text)).toBeNull(),
  );
});
