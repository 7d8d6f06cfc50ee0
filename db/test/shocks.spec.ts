import { judge, sizeOf, type FitQuestion } from '@linkfell/fit-engine';
import { describe, expect, it } from 'vitest';

import { frameFacts, readDemoPairs, shockFacts } from '../src/seed/demo-pairs.js';
import { readScenario, type ShockSize } from '../src/seed/scenario.js';
import { keysOf, shockFactKeys, sourcesIn } from './support/shape.js';

const s = readScenario();
const psi = 6.894757;
const usual = readDemoPairs(s)[0]?.question as FitQuestion;

/** Frames with an entry that takes this size, with the entry alone. */
const framesFor = ({ sizeKey, facts }: ShockSize) =>
  s.frames.flatMap(({ id }) => {
    const frame = frameFacts(s, id);
    return frame.entries
      .filter((entry) => [sizeKey, ...facts.spacedToKeys].includes(entry.sizeKey ?? ''))
      .map((entry) => ({ ...frame, entries: [entry] }));
  });

describe('shocks', () => {
  it('are seventy sizes by five makers', () => {
    expect(s.shockSizes).toHaveLength(70);
    const makers = s.makers.filter(({ makes }) => makes === 'shocks').map(({ id }) => id);
    expect(makers).toHaveLength(5);
    expect(new Set(s.shockSizes.map(({ makerId }) => makerId))).toEqual(new Set(makers));
    expect(new Set(s.shockSizes.map(({ id }) => id)).size).toBe(70);
    expect(new Set(s.shockSizes.map(({ modelId }) => modelId))).toEqual(
      new Set(s.shockModels.map(({ id }) => id)),
    );
  });

  it('come with a box, and one maker prints no warranty', () => {
    for (const { inTheBox, spring } of s.shockModels) {
      expect(inTheBox[0]).toMatch(/^Shock/);
      expect(inTheBox.some((line) => /without its spring/.test(line))).toBe(spring === 'coil');
    }
    const silent = s.shockModels.filter(({ warrantyMonths }) => warrantyMonths === null);
    expect(silent.map(({ id }) => id)).toEqual(['hexling-moss-b']);
  });

  it('each have a frame to go in', () => {
    expect(s.shockSizes.filter((size) => framesFor(size).length === 0).map(({ id }) => id)).toEqual([]);
  });

  it.each(s.shockSizes.map((size) => [size.id, size] as const))('%s is plausible', (_id, size) => {
    const { facts, sizeKey } = size;
    expect(keysOf(facts)).toEqual(shockFactKeys);
    const own = sizeOf(sizeKey);
    expect(own?.key).toBe(sizeKey);
    const [eye, stroke] = [own?.eyeToEyeMm ?? NaN, own?.strokeMm ?? NaN];
    for (const key of facts.spacedToKeys) {
      const other = sizeOf(key);
      expect(other?.eyeToEyeMm).toBe(eye);
      expect((stroke - (other?.strokeMm ?? 0)) % 2.5).toBe(0);
      expect(other?.strokeMm).toBeLessThan(stroke);
    }
    expect(facts.bodyEnd.kind === 'trunnion').toBe(own?.family === 'trunnion');
    expect(facts.massG).toBeGreaterThan(150);
    expect(facts.massG).toBeLessThan(900);
    for (const { source } of sourcesIn(facts)) expect(source).toMatchObject({ kind: 'maker' });
    const { spring, reservoir, diameterMm } = facts;
    const model = s.shockModels.find(({ id }) => id === size.modelId);
    expect(model?.spring).toBe(spring.kind);
    if (spring.kind === 'air') {
      expect(spring.minGaugeKPa).toBeLessThan(spring.maxGaugeKPa ?? 0);
      if (spring.chambers) {
        const { areaMm2, negativeAreaMm2, volumeMm3, negativeVolumeMm3 } = spring.chambers.value;
        expect(areaMm2).toBeLessThanOrEqual((Math.PI / 4) * (diameterMm - 4) ** 2);
        expect(negativeAreaMm2).toBeLessThan(areaMm2);
        expect(volumeMm3 / (volumeMm3 - areaMm2 * stroke)).toBeGreaterThan(2);
        expect(volumeMm3 / (volumeMm3 - areaMm2 * stroke)).toBeLessThan(4);
        expect(negativeVolumeMm3).toBeGreaterThan(0);
      }
    } else {
      const goes = s.coils.filter(
        (coil) =>
          coil.insideMm === spring.springInsideMm &&
          coil.freeLengthMm <= spring.maxFreeLengthMm &&
          coil.travelMm >= stroke + (spring.collarPitchMm ?? 1),
      );
      expect(goes.length).toBeGreaterThanOrEqual(8);
      expect(diameterMm).toBeGreaterThan(spring.springInsideMm + 16);
      expect(spring.maxFreeLengthMm).toBeLessThan(eye - 20);
    }
    if (reservoir) {
      expect(reservoir.outlines.map(({ positionDeg }) => positionDeg)).toEqual(reservoir.positionsDeg);
      for (const { polygon } of reservoir.outlines) {
        const xs = polygon.map(([x]) => x);
        const ys = polygon.map(([, y]) => y);
        expect(Math.min(...xs)).toBeGreaterThan(-30);
        expect(Math.max(...xs)).toBeLessThan(eye - stroke);
        expect(Math.max(...ys) - Math.min(...ys)).toBeGreaterThanOrEqual(
          diameterMm / 2 + reservoir.diameterMm,
        );
        expect(polygon.filter(([, y]) => Math.abs(y) > diameterMm / 2 + 1).length).toBeGreaterThan(0);
      }
    }
  });

  it('need a fill from 100 to 250 psi for an 80 kg rider', () => {
    const found: [string, string, number][] = [];
    for (const size of s.shockSizes) {
      for (const frame of framesFor(size)) {
        const stroke = sizeOf(frame.entries[0]?.sizeKey ?? '')?.strokeMm ?? 0;
        const rider = {
          ...usual.rider,
          riderKg: 80,
          bikeKg: frame.eBike?.value ? 23 : 14.5,
          style:
            stroke < 46 ? ('cross-country' as const) : stroke < 58 ? ('trail' as const) : ('enduro' as const),
        };
        const { spring } = judge({ ...usual, frame, rider, shock: shockFacts(s, size.id) });
        if (spring?.gaugeKPa) found.push([frame.id, size.id, spring.gaugeKPa / psi]);
      }
    }
    expect(found.length).toBeGreaterThan(80);
    expect(found.filter(([, , value]) => value < 100 || value > 250)).toEqual([]);
  });
});
