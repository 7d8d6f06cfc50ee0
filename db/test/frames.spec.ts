import { sizeOf } from '@linkfell/fit-engine';
import { describe, expect, it } from 'vitest';

import { leverageOf } from './support/leverage.js';
import { endKeys, entryKeys, frameFactKeys, keysOf, sourcesIn } from './support/shape.js';
import { readScenario, type Frame } from '../src/seed/scenario.js';

const { frames, makers } = readScenario();

/** Everything about a frame but its names, years and papers. */
function fingerprint({ sheet }: Frame): string {
  const drop = new Set(['id', 'source', 'modelYears', 'title']);
  return JSON.stringify(sheet, (key, value: unknown) =>
    drop.has(key) || key === 'publishedOn' || key === 'version' ? undefined : value,
  );
}

describe('frames', () => {
  it('are forty by six makers, each with a reason of its own', () => {
    expect(frames).toHaveLength(40);
    const byFrameMakers = makers.filter(({ makes }) => makes === 'frames').map(({ id }) => id);
    expect(new Set(frames.map(({ makerId }) => makerId))).toEqual(new Set(byFrameMakers));
    expect(byFrameMakers).toHaveLength(6);
    expect(new Set(frames.map(({ reason }) => reason)).size).toBe(40);
    expect(new Set(frames.map(({ id }) => id)).size).toBe(40);
    for (const { reason } of frames) expect(reason).toMatch(/^[A-Z].{20,110}\.$/);
  });

  it('do not differ in name or year only', () => {
    expect(new Set(frames.map(fingerprint)).size).toBe(40);
  });

  it('have leverage tables and outlines in number', () => {
    const withCurve = frames.filter(({ sheet }) => sheet.entries.some(({ curve }) => curve));
    expect(withCurve.length).toBeGreaterThanOrEqual(30);
    const withRoom = frames.filter(({ sheet }) => sheet.facts.room);
    expect(withRoom.length).toBeGreaterThanOrEqual(12);
  });

  describe.each(frames.map((frame) => [frame.id, frame] as const))('%s', (id, frame) => {
    const { facts, entries } = frame.sheet;

    it('has the shape of a sheet, and a source for each figure', () => {
      expect(id.startsWith(`${frame.makerId}-`)).toBe(true);
      expect(keysOf(facts)).toEqual(frameFactKeys);
      expect(entries.length).toBeGreaterThan(0);
      const sources = sourcesIn(frame.sheet);
      expect(sources.length).toBeGreaterThan(entries.length);
      for (const { path, source } of sources) {
        expect(source, path).toEqual({
          kind: expect.stringMatching(/^(maker|curator)$/) as string,
          label: expect.stringMatching(/.{10,}/) as string,
          date: expect.stringMatching(/^20[12]\d-\d\d-\d\d$/) as string,
        });
      }
    });

    it.each(entries.map((entry) => [entry.id, entry] as const))('%s is plausible', (_entryId, entry) => {
      expect(keysOf(entry)).toEqual(entryKeys);
      const size = sizeOf(entry.sizeKey);
      expect(size?.key).toBe(entry.sizeKey);
      const strokeMm = size?.strokeMm ?? NaN;
      const travelMm = entry.travelMm ?? NaN;
      expect(travelMm).toBeGreaterThanOrEqual(80);
      expect(travelMm).toBeLessThanOrEqual(210);
      expect(travelMm / strokeMm).toBeGreaterThanOrEqual(1.8);
      expect(travelMm / strokeMm).toBeLessThanOrEqual(3.4);
      if (entry.curve) {
        const { endsAtMm, integralMm, lowest, highest } = leverageOf(entry.curve);
        const wanted = entry.curve.by === 'shock-travel' ? strokeMm : travelMm;
        expect(Math.abs(endsAtMm - wanted)).toBeLessThanOrEqual(
          entry.curve.by === 'shock-travel' ? 0.5 : 0.01 * wanted,
        );
        const meant = entry.curve.by === 'shock-travel' ? travelMm : strokeMm;
        expect(Math.abs(integralMm - meant)).toBeLessThanOrEqual(0.03 * meant);
        expect(lowest).toBeGreaterThan(1.6);
        expect(highest).toBeLessThan(3.8);
      }
      expect(entry.modelYears?.from).toBeGreaterThanOrEqual(frame.yearFrom);
      expect(entry.modelYears?.to).toBeLessThanOrEqual(frame.yearTo);
      const trunnionSize = size?.family === 'trunnion';
      const kinds = [entry.frameEnd, entry.linkEnd].map((end) => end?.mount.kind);
      expect(kinds.includes('trunnion')).toBe(trunnionSize);
      for (const end of [entry.frameEnd, entry.linkEnd]) {
        if (!end) throw new Error('a listed frame names both its ends');
        expect(keysOf(end)).toEqual(endKeys);
        const { mount } = end;
        if (mount.kind === 'hardware') {
          expect(mount.widthMm).toBeGreaterThanOrEqual(19);
          expect(mount.widthMm).toBeLessThanOrEqual(70);
          expect([6, 8, 10, 12]).toContain(mount.boltMm);
        }
        if (end.torqueNm !== null) expect(end.torqueNm).toBeGreaterThan(3);
        if (end.torqueNm !== null) expect(end.thread).toMatch(/^M(6|8|10)$/);
      }
    });

    it('has outlines that lie about the shock', () => {
      const { room } = facts;
      const longest = Math.max(...entries.map(({ sizeKey }) => sizeOf(sizeKey)?.eyeToEyeMm ?? 0));
      const stroke = Math.max(...entries.map(({ sizeKey }) => sizeOf(sizeKey)?.strokeMm ?? 0));
      for (const { polygon, poses, moves, toleranceMm } of room?.outlines ?? []) {
        expect(polygon.length).toBeGreaterThanOrEqual(3);
        for (const [x, y] of polygon) {
          expect(x).toBeGreaterThan(-100);
          expect(x).toBeLessThan(longest + 100);
          expect(Math.abs(y)).toBeLessThan(260);
        }
        expect(toleranceMm).toBeGreaterThan(0);
        if (!moves) expect(poses).toBeNull();
        if (poses) {
          expect(poses[0]).toEqual([0, 0, 0, 0]);
          expect(Math.abs((poses.at(-1)?.[0] ?? 0) - stroke)).toBeLessThan(0.01);
          expect(poses.every(([s], i) => i === 0 || s > (poses[i - 1]?.[0] ?? 0))).toBe(true);
          expect(poses.every(([, , , degrees]) => Math.abs(degrees) < 70)).toBe(true);
          // The rocker carries the shock's eye: turned by its pose it lies the shortened length from the pivot.
          for (const [s, x, y, degrees] of poses) {
            const turn = (degrees * Math.PI) / 180;
            const eye = [longest * Math.cos(turn) + x, longest * Math.sin(turn) + y] as const;
            expect(Math.abs(Math.hypot(...eye) - (longest - s))).toBeLessThan(0.02);
          }
        }
      }
      for (const [s, degrees] of room?.swing ?? []) {
        expect(s).toBeLessThanOrEqual(stroke + 1e-9);
        expect(Math.abs(degrees)).toBeLessThan(20);
      }
    });
  });
});
