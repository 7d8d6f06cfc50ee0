/**
 * Check values of the trade. Status of all of them: common practice, as experienced riders and workshops state it; no
 * single published source.
 */
import { describe, expect, it } from 'vitest';

import { endHardware } from '../../src/hardware/end-hardware.js';
import { judge } from '../../src/judge.js';
import { makeCurve } from '../../src/kinematics/leverage-curve.js';
import { resolveSize } from '../../src/sizing/resolve-size.js';
import { findSizeKey, sizeOf } from '../../src/sizing/sizes.js';
import { sagWindow, usualShares } from '../../src/springs/load.js';
import {
  aFrame,
  anEntry,
  aPinEnd,
  aPresentShock,
  aQuestion,
  aShock,
  someParts,
} from '../judging/questions.js';

describe('common practice', () => {
  it('an eye has a bore of about 15 mm: a pin of 15 mm goes straight in, hardware for it is on sale', () => {
    const eye = { kind: 'eyelet', boreMm: 15 } as const;
    expect(judge(aQuestion({ shock: aShock({ bodyEnd: eye, shaftEnd: eye }) })).verdict).toBe(
      'bolts-straight-in',
    );
    const end = aPinEnd({ mount: { kind: 'hardware', widthMm: 24, boltMm: 8 } });
    expect(endHardware(end, eye, null, someParts().kits)).toMatchObject({ kind: 'kit' });
  });

  it('hardware 24x8 is 24 mm across, for an 8 mm bolt', () => {
    const end = aPinEnd({ mount: { kind: 'hardware', widthMm: 24, boltMm: 8 } });
    const found = endHardware(end, { kind: 'eyelet', boreMm: 15 }, null, someParts().kits);
    expect(found).toMatchObject({ kind: 'kit', kit: { name: '24x8', widthMm: 24, boltMm: 8 } });
  });

  it('190x50 is eye-to-eye 190, stroke 50: from inches 7.5 x 2.0, and the longer number first', () => {
    const size = sizeOf('190x50');
    expect(size?.eyeToEyeMm).toBeCloseTo(190.5, 9);
    expect(size?.strokeMm).toBeCloseTo(50.8, 9);
    for (const label of ['190x50', '190 x 51', '7.5 x 2', '50x190'])
      expect(findSizeKey(label)).toBe('190x50');
  });

  it('120 mm of travel on a stroke of 50 mm is a mean leverage of 2.4; 150 on 60 is 2.5', () => {
    for (const [travel, stroke, mean] of [
      [120, 50, 2.4],
      [150, 60, 2.5],
    ] as const) {
      const made = makeCurve(null, travel, stroke);
      expect(made.ok && made.curve.meanRatio).toBeCloseTo(mean, 12);
    }
  });

  it('a frame whose maker lists 52.5 and 55 takes both; one that lists only 52.5 refuses 55', () => {
    const listing = (...keys: string[]) =>
      aFrame({ entries: keys.map((sizeKey) => anEntry({ id: sizeKey, sizeKey })) });
    const verdict = (frame: ReturnType<typeof listing>, sizeKey: string) =>
      judge(aQuestion({ frame, shock: aShock({ sizeKey }) })).verdict;
    const both = listing('210x52.5', '210x55');
    expect(verdict(both, '210x52.5')).toBe('bolts-straight-in');
    expect(verdict(both, '210x55')).toBe('bolts-straight-in');
    expect(verdict(listing('210x52.5'), '210x55')).toBe('wont-fit');
  });

  it('stroke is the difference of two eye-to-eye readings, extended and compressed', () => {
    const caliper = (mm: number) => ({ mm, tool: 'caliper', awkward: false }) as const;
    for (const [extended, compressed, key] of [
      [210, 155, '210x55'],
      [210, 160, '210x50'],
      [230, 165, '230x65'],
      [250, 175, '250x75'],
    ] as const) {
      const read = aPresentShock({ eyeToEye: caliper(extended), compressed: caliper(compressed) });
      // Half a millimetre of rubber at the end of the stroke is usual.
      const soft = { ...read, compressed: caliper(compressed + 0.5) };
      const [first] = resolveSize(soft, null, 'eyelet').candidates;
      expect(first?.sizeKey).toBe(key);
      expect(first?.share).toBeGreaterThan(0.95);
      expect(extended - compressed).toBe(sizeOf(key)?.strokeMm);
    }
  });

  it('sag at the shock by style, and what the rear wheel carries', () => {
    const windows = {
      'cross-country': [20, 25],
      trail: [25, 30],
      enduro: [28, 33],
      downhill: [30, 35],
    } as const;
    for (const style of ['cross-country', 'trail', 'enduro', 'downhill'] as const) {
      const window = sagWindow(style, null);
      expect([window?.lowPercent, window?.highPercent]).toEqual(windows[style]);
    }
    expect(usualShares).toEqual({ rearShare: 0.6, sprungShare: 0.6 });
  });

  it('a trunnion shock is 25 mm shorter than the eyelet shock of the same stroke', () => {
    for (const [eyelet, trunnion] of [
      ['190x45', '165x45'],
      ['210x55', '185x55'],
      ['230x65', '205x65'],
      ['250x75', '225x75'],
    ] as const) {
      expect((sizeOf(eyelet)?.eyeToEyeMm ?? NaN) - (sizeOf(trunnion)?.eyeToEyeMm ?? NaN)).toBe(25);
    }
  });
});
