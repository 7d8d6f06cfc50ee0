import { describe, expect, it } from 'vitest';

import { formatLength, formatMass, formatPressure, plainNumber } from './format.js';
import { parseLengthMm, parseMassKg, parsePressureKPa } from './parse.js';

describe('formatting', () => {
  it('writes what the tool would show', () => {
    expect(formatLength(210)).toBe('210 mm');
    expect(formatLength(52.54)).toBe('52.5 mm');
    expect(formatLength(200.025, 'in')).toBe('7.875 in');
    expect(formatMass(80)).toBe('80 kg');
    expect(formatMass(80, 'lb')).toBe('176 lb');
    expect(formatMass(72.5747792, 'st')).toBe('11 st 6 lb');
    expect(formatPressure(1516.85)).toBe('220 psi');
    expect(formatPressure(1210, 'bar')).toBe('12.1 bar');
  });

  it('never carries into fourteen pounds', () =>
    expect(formatMass(13.9999 * 0.45359237 + 69.853, 'st')).toBe('12 st 0 lb'));

  it.each([NaN, Infinity])('says so where there is no number (%s)', (value) => {
    for (const text of [
      plainNumber(value, 1),
      formatLength(value),
      formatMass(value, 'st'),
      formatPressure(value),
    ]) {
      expect(text).toBe('not known');
    }
  });

  it('can be typed back in', () => {
    expect(parseLengthMm(formatLength(200.025, 'in'))).toBeCloseTo(200.025, 9);
    expect(parseMassKg(formatMass(80, 'st'))).toBeCloseTo(80, 0);
    expect(parsePressureKPa(formatPressure(1210, 'bar'))).toBe(1210);
  });
});
