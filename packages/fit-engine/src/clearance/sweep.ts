import type { FrameOutline, FrameRoom } from '../facts.js';
import { partMover, shockMover, type SweptShock } from './motion.js';
import { nearest, type Nearest } from './nearest.js';

export type { SweptShock } from './motion.js';

export interface SweepResult {
  /** Least distance that can be vouched for, mm, over all parts that are drawn; null where none could be judged. */
  distanceMm: number | null;
  atShockTravelMm: number;
  part: string;
  /** A part or table that is missing or no use, so that the distance does not speak for everything; null: none. */
  incomplete: string | null;
  /** A part that moves in a way nobody has drawn from 0 to the stroke. */
  movementNotDrawn: boolean;
}

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

/** Both ends of the stroke and every row of a table, since motion bends there. */
function bendsOf(room: FrameRoom, parts: readonly FrameOutline[], strokeMm: number): number[] {
  const rows = [room.swing, ...parts.map(({ poses }) => poses ?? [])].flatMap((table) =>
    table.map((row) => row[0] ?? 0),
  );
  return [...new Set([0, strokeMm, ...rows.filter((s) => s > 0 && s < strokeMm)])].sort((p, q) => p - q);
}

/**
 * The least distance of the shock's body to the frame's parts over the stroke, mm: steps of at most 0.5 mm wherever
 * something nearer might hide, finer where it is least, less what a step can hide and less each part's stated tolerance; never below 0. A moving part
 * without a pose table that spans the stroke, or an outline or swing that cannot be used, makes it incomplete.
 */
export function sweep(room: FrameRoom, shock: SweptShock): SweepResult {
  const { strokeMm, eyeToEyeMm, body } = shock;
  const movementNotDrawn = room.outlines.some(
    ({ moves, poses }) => (moves || poses) && !(poses && covers(poses, strokeMm)),
  );
  const nothing = { distanceMm: null, atShockTravelMm: 0, part: '', movementNotDrawn };
  const usable = body.length >= 3 && finite(body) && strokeMm > 0 && eyeToEyeMm > strokeMm;
  if (!usable) return { ...nothing, incomplete: 'shock' };
  if (!covers(room.swing, strokeMm)) return { ...nothing, incomplete: 'swing' };
  const parts = room.outlines.filter((part) => drawn(part, strokeMm));
  const left = room.outlines.find((part) => !drawn(part, strokeMm));
  const mover = shockMover(room, shock);
  let least: (Nearest & { part: string }) | null = null;
  for (const part of parts) {
    const bends = bendsOf(room, [part], strokeMm);
    const found = nearest(mover, partMover(part), bends, part.toleranceMm, least?.mm);
    if (!least || found.mm < least.mm) least = { ...found, part: part.name };
  }
  if (!least) return { ...nothing, incomplete: left?.name ?? 'outlines' };
  return {
    distanceMm: least.mm,
    atShockTravelMm: least.at,
    part: least.part,
    incomplete: left?.name ?? null,
    movementNotDrawn,
  };
}
