import type { FrameOutline, FrameRoom } from '../facts.js';
import { partMover, waysOf, type Mover } from './motion.js';
import { cornersOf, type Corners } from './polygon-distance.js';

/** A part of the frame whose outline and motion can be used over a whole stroke. */
export interface DrawnPart {
  name: string;
  mover: Mover;
  corners: Corners;
  toleranceMm: number;
  /** Both ends of the stroke and every travel at which its motion or the shock's swing bends, ascending. */
  bends: readonly number[];
  /** The longest way that any point of it has gone at each bend, mm. */
  ways: readonly number[];
}

/** The drawings of a frame for one stroke, looked through once for all shocks of that stroke. */
export interface DrawnRoom {
  swingDrawn: boolean;
  parts: readonly DrawnPart[];
  /** The first part that cannot be used, by name. */
  left: string | null;
  /** A part that moves in a way nobody has drawn from 0 to the stroke. */
  movementNotDrawn: boolean;
}

type Rows = readonly (readonly number[])[];

export const finite = (rows: Rows): boolean =>
  rows.every((row) => row.every((value) => Number.isFinite(value)));
const rising = (rows: Rows): boolean =>
  rows.every((row, i) => i === 0 || (row[0] ?? NaN) > (rows[i - 1]?.[0] ?? NaN));
/** A table that can be read from 0 to the stroke; half a millimetre short is read as held. */
const covers = (rows: Rows, strokeMm: number): boolean =>
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
function bendsOf(tables: readonly Rows[], strokeMm: number): number[] {
  const rows = tables.flatMap((table) => table.map((row) => row[0] ?? 0));
  return [...new Set([0, strokeMm, ...rows.filter((s) => s > 0 && s < strokeMm)])].sort((p, q) => p - q);
}

function lookThrough(room: FrameRoom, strokeMm: number): DrawnRoom {
  const usable = room.outlines.filter((part) => drawn(part, strokeMm));
  const swingBends = bendsOf([room.swing], strokeMm);
  return {
    swingDrawn: covers(room.swing, strokeMm),
    parts: usable.map((part) => {
      const mover = partMover(part);
      const bends = part.poses ? bendsOf([room.swing, part.poses], strokeMm) : swingBends;
      return {
        name: part.name,
        mover,
        corners: cornersOf(part.polygon),
        toleranceMm: part.toleranceMm,
        bends,
        ways: waysOf(mover, bends),
      };
    }),
    left: room.outlines.find((part) => !drawn(part, strokeMm))?.name ?? null,
    movementNotDrawn: room.outlines.some(
      ({ moves, poses }) => (moves || poses) && !(poses && covers(poses, strokeMm)),
    ),
  };
}

const lookedThrough = new WeakMap<FrameRoom, Map<number, DrawnRoom>>();

/** What the drawings of a frame are worth for one stroke; facts never change, so it is kept as long as they are. */
export function drawnRoom(room: FrameRoom, strokeMm: number): DrawnRoom {
  const byStroke = lookedThrough.get(room) ?? new Map<number, DrawnRoom>();
  lookedThrough.set(room, byStroke);
  const made = byStroke.get(strokeMm) ?? lookThrough(room, strokeMm);
  byStroke.set(strokeMm, made);
  return made;
}
