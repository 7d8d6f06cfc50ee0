import type { FrameRoom } from '../facts.js';
import { drawnRoom, finite } from './drawn-room.js';
import { shockMover, waysOf, type SweptShock } from './motion.js';
import { begin, nearest, type Nearest } from './nearest.js';
import { cornersOf } from './polygon-distance.js';

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

/**
 * The least distance of the shock's body to the frame's parts over the stroke, mm: steps of at most 0.5 mm wherever
 * something nearer might hide, finer where it is least, less what a step can hide and less each part's stated
 * tolerance; never below 0. A moving part without a pose table that spans the stroke, or an outline or swing that
 * cannot be used, makes it incomplete.
 * @param floorMm above 0: a distance of this or less is of no interest; it is given as first seen, perhaps without
 *   part and travel
 */
export function sweep(room: FrameRoom, shock: SweptShock, floorMm = 0): SweepResult {
  const { strokeMm, eyeToEyeMm } = shock;
  const { parts, left, swingDrawn, movementNotDrawn } = drawnRoom(room, strokeMm);
  const nothing = { distanceMm: null, atShockTravelMm: 0, part: '', movementNotDrawn };
  const usable =
    shock.body.length >= 3 &&
    finite(shock.body) &&
    strokeMm > 0 &&
    eyeToEyeMm > strokeMm &&
    eyeToEyeMm < Infinity;
  if (!usable) return { ...nothing, incomplete: 'shock' };
  if (!swingDrawn) return { ...nothing, incomplete: 'swing' };
  const mover = shockMover(room, shock);
  const body = { mover, corners: cornersOf(mover.outline) };
  const begun = parts.map((part) => ({ part, looks: begin(body, part, strokeMm, part.toleranceMm) }));
  // Parts that stay further away all along than what is seen at the ends of the stroke need no closer look.
  const seenMm = Math.min(...begun.map(({ looks: { atEnds } }) => Math.min(atEnds[0].free, atEnds[1].free)));
  if (floorMm > 0 && seenMm <= floorMm) {
    return { distanceMm: seenMm, atShockTravelMm: 0, part: '', incomplete: left, movementNotDrawn };
  }
  // Parts that stand still share their bends.
  let [bends, waysA]: readonly (readonly number[])[] = [];
  let least: (Nearest & { part: string }) | null = null;
  for (const { part, looks } of begun) {
    const beatMm = Math.min(least?.mm ?? Infinity, seenMm);
    if (part.bends !== bends) [bends, waysA] = [part.bends, waysOf(mover, part.bends)];
    const along = { at: part.bends, waysA: waysA ?? [], waysB: part.ways };
    const found = nearest(body, part, along, looks, { beatMm, floorMm });
    if (!least || found.mm < least.mm) least = { ...found, part: part.name };
    if (least.mm <= floorMm) break;
  }
  if (!least) return { ...nothing, incomplete: left ?? 'outlines' };
  return {
    distanceMm: least.mm,
    atShockTravelMm: least.at,
    part: least.part,
    incomplete: left,
    movementNotDrawn,
  };
}
