import { describe, expect, it } from 'vitest';
import { sagWindow, wheelLoadN } from './load.js';

describe('load on the rear wheel', () => {
  it('is g (rider + kit + 0.6 bike) 0.6', () => {
    expect(wheelLoadN(80, 5, 15)).toBeCloseTo(9.80665 * 94 * 0.6, 10);
  });
  it('takes either share', () => {
    expect(wheelLoadN(80, 5, 15, { rearShare: 0.5 })).toBeCloseTo(9.80665 * 94 * 0.5, 10);
    expect(wheelLoadN(80, 5, 15, { sprungShare: 0.75 })).toBeCloseTo(9.80665 * 96.25 * 0.6, 10);
  });
  it('of an unknown mass is no number', () => expect(wheelLoadN(NaN, 5, 15)).toBeNaN());
});

describe('sag window', () => {
  it.each([
    ['cross-country', 20, 25],
    ['trail', 25, 30],
    ['enduro', 28, 33],
    ['downhill', 30, 35],
  ] as const)('%s: %s to %s %%', (style, lowPercent, highPercent) => {
    const midPercent = (lowPercent + highPercent) / 2;
    expect(sagWindow(style, null)).toEqual({ lowPercent, highPercent, midPercent, printed: false });
  });
  it('printed wins, two points either way', () => {
    const printed = { lowPercent: 26, highPercent: 30, midPercent: 28, printed: true };
    expect(sagWindow('downhill', 28)).toEqual(printed);
    expect(sagWindow(null, 28)).toEqual(printed);
  });
  it.each([NaN, Infinity, 0, -5, 61])('a target of %s counts as not printed', (percent) => {
    expect(sagWindow(null, percent)).toBeNull();
    expect(sagWindow('trail', percent)?.printed).toBe(false);
  });
});
