import { describe, expect, it } from 'vitest';

import { parseLengthMm, parseMassKg, parsePressureKPa } from './parse.js';
import { parseNumber } from './parse-number.js';

describe('parseNumber', () => {
  it.each([
    ['55', 55],
    ['52.5', 52.5],
    ['52,5', 52.5],
    ['.5', 0.5],
    ['7/8', 0.875],
    ['7 7/8', 7.875],
    ['7-7/8', 7.875],
    ['7⅞', 7.875],
    ['2 ¼', 2.25],
    ['½', 0.5],
    [' 210 ', 210],
  ])('reads %s', (text, value) => expect(parseNumber(text)).toBe(value));

  it.each([
    '',
    ' ',
    'abc',
    '-5',
    '1e3',
    '1/0',
    '1,234.5',
    '1.2.3',
    '5 5',
    'NaN',
    'Infinity',
    '0x10',
    '9'.repeat(400),
  ])('refuses "%s"', (text) => expect(parseNumber(text)).toBeNull());
});

describe('parseLengthMm', () => {
  it.each([
    ['209.6', 209.6],
    ['209,6 mm', 209.6],
    ['20.5 cm', 205],
    ['7.875 in', 200.025],
    ['7.875in.', 200.025],
    ['7 7/8"', 200.025],
    ['7⅞ ”', 200.025],
    ['10 inches', 254],
  ])('reads %s', (text, mm) => expect(parseLengthMm(text)).toBeCloseTo(mm, 9));

  it('takes a bare number in the unit of the field', () => {
    expect(parseLengthMm('7.875', 'in')).toBeCloseTo(200.025, 9);
    expect(parseLengthMm('200', 'mm')).toBe(200);
  });

  it.each(['7.875 ft', '210 x 55', '12 constructor', 'mm', '-3 mm'])('refuses "%s"', (text) =>
    expect(parseLengthMm(text)).toBeNull(),
  );
});

describe('parseMassKg', () => {
  it.each([
    ['80', 80],
    ['80,5 kg', 80.5],
    ['176 lb', 176 * 0.45359237],
    ['12 st', 168 * 0.45359237],
    ['11 st 6', 160 * 0.45359237],
    ['11st 6lb', 160 * 0.45359237],
    ['11 stone 6.5 lbs', 160.5 * 0.45359237],
  ])('reads %s', (text, kg) => expect(parseMassKg(text)).toBeCloseTo(kg, 9));

  it('refuses fourteen pounds over a stone, which is a slip', () => {
    expect(parseMassKg('11 st 14')).toBeNull();
    expect(parseMassKg('11 st 13.9')).not.toBeNull();
  });
});

describe('parsePressureKPa', () => {
  it.each([
    ['220psi', 1516.846604],
    ['220', 1516.846604],
    ['12.1 bar', 1210],
    ['12,1 bar', 1210],
    ['830 kPa', 830],
  ])('reads %s', (text, kPa) => expect(parsePressureKPa(text)).toBeCloseTo(kPa, 5));
});
