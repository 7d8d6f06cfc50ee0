import type { FrameOutline, FrameRoom } from '../facts.js';
import { longestWay, partMover, placed, shockMover, type Mover, type SweptShock } from './motion.js';
import { polygonDistance } from './polygon-distance.js';

export type { SweptShock } from './motion.js';

export interface SweepResult {
  /** Least distance that can be vouched for, mm, over all parts that are drawn; null where none could be judged. */
  distanceMm: number | null;
  atShockTravelMm: number;
  part: string;
  /** A part or table that is missing or no use, so that the distance does not speak for everything; null: none. */
  incomplete: string | null;
}

/** Steps of the sweep, mm of shock travel, and how finely it is refined where the distance is least. */
const stepMm = 0.5;
const finestMm = 0.5 / 64;

const finite = (rows: readonly (readonly number[])[]): boolean =>
  rows.every((row) => row.every((value) => Number.isFinite(value)));
const rising = (rows: readonly (readonly number[])[]): boolean =>
  rows.every((row, i) => i === 0 || (row[0] ?? NaN) > (rows[i - 1]?.[0] ?? NaN));
/** A table that can be read from 0 to the stroke; half a millimetre short is read as held. */
const covers = (rows: readonly (readonly number[])[], strokeMm: number): boolean =>
  rows.length > 0 &&
  finite(rows) &&
  rising(rows) &&
  (rows[0]?.[0] ?? NaN) <= 0 &&
  (rows.at(-1)?.[0] ?? NaN) >= strokeMm - 0.5;

const drawn = (part: FrameOutline, strokeMm: number): boolean =>
  part.polygon.length >= 3 &&
  finite(part.polygon) &&
  part.toleranceMm >= 0 &&
  Number.isFinite(part.toleranceMm) &&
  (part.poses ? covers(part.poses, strokeMm) : !part.moves);

/** Travels at which the distance is taken: every half millimetre and every row of a table, since motion bends there. */
function travels(room: FrameRoom, parts: readonly FrameOutline[], strokeMm: number): number[] {
  const rows = [room.swing, ...parts.map(({ poses }) => poses ?? [])].flatMap((table) =>
    table.map((row) => row[0] ?? 0),
  );
  const steps = Math.ceil(strokeMm / stepMm);
  const even = Array.from({ length: steps + 1 }, (_, i) => Math.min(i * stepMm, strokeMm));
  return [...new Set([...even, ...rows.filter((s) => s > 0 && s < strokeMm)])].sort((a, b) => a - b);
}

interface Nearest {
  mm: number;
  at: number;
}

/** Least distance of two movers that can be vouched for, less the tolerance, looked at more finely where it is least. */
function nearest(a: Mover, b: Mover, at: readonly number[], toleranceMm: number): Nearest {
  const freeAt = (s: number): number =>
    Math.max(0, polygonDistance(placed(a, a.poseAt(s)), placed(b, b.poseAt(s))) - toleranceMm);
  // Between two travels no point comes nearer than half of what both have lost and gained together.
  const bound = (s0: number, d0: number, s1: number, d1: number): number => {
    const way = longestWay(a, a.poseAt(s0), a.poseAt(s1)) + longestWay(b, b.poseAt(s0), b.poseAt(s1));
    return Math.max(0, Math.min(d0, d1, (d0 + d1 - way) / 2));
  };
  const seen = at.map((s) => ({ s, free: freeAt(s) }));
  let least = Math.min(...seen.map(({ free }) => free));
  let found: Nearest = { mm: Infinity, at: 0 };
  const look = (s0: number, d0: number, s1: number, d1: number): void => {
    const mm = bound(s0, d0, s1, d1);
    if (mm >= Math.min(least, found.mm)) return;
    if (s1 - s0 <= finestMm) {
      found = { mm, at: d0 <= d1 ? s0 : s1 };
      return;
    }
    const mid = (s0 + s1) / 2;
    const free = freeAt(mid);
    least = Math.min(least, free);
    look(s0, d0, mid, free);
    look(mid, free, s1, d1);
  };
  for (const { s, free } of seen) if (free <= least) found = { mm: free, at: s };
  for (let i = 1; i < seen.length && found.mm > 0; i += 1) {
    const [p, q] = [seen[i - 1], seen[i]];
    if (p && q) look(p.s, p.free, q.s, q.free);
  }
  return found;
}

/**
 * The least distance of the shock's body to the frame's parts over the stroke, mm: steps of at most 0.5 mm, refined
 * where it is least, less what a step can hide and less each part's stated tolerance; never below 0. A moving part
 * without a pose table that spans the stroke, or an outline or swing that cannot be used, makes it incomplete.
 */
export function sweep(room: FrameRoom, shock: SweptShock): SweepResult {
  const { strokeMm, eyeToEyeMm, body } = shock;
  const nothing = { distanceMm: null, atShockTravelMm: 0, part: '' };
  const usable = body.length >= 3 && finite(body) && strokeMm > 0 && eyeToEyeMm > strokeMm;
  if (!usable) return { ...nothing, incomplete: 'shock' };
  if (!covers(room.swing, strokeMm)) return { ...nothing, incomplete: 'swing' };
  const parts = room.outlines.filter((part) => drawn(part, strokeMm));
  const left = room.outlines.find((part) => !drawn(part, strokeMm));
  const at = travels(room, parts, strokeMm);
  const mover = shockMover(room, shock);
  const results = parts.map((part) => ({
    part: part.name,
    ...nearest(mover, partMover(part), at, part.toleranceMm),
  }));
  const [first, ...others] = results;
  if (!first) return { ...nothing, incomplete: left?.name ?? 'outlines' };
  const least = others.reduce((best, one) => (one.mm < best.mm ? one : best), first);
  return {
    distanceMm: least.mm,
    atShockTravelMm: least.at,
    part: least.part,
    incomplete: left?.name ?? null,
  };
}
