import type { FrameOutline, FrameRoom, Point } from '../facts.js';
import type { Corners } from './polygon-distance.js';

/** Where a rigid outline is at a shock travel: turned about its origin, then shifted. */
export interface Pose {
  x: number;
  y: number;
  deg: number;
}
export interface Mover {
  outline: readonly Point[];
  /** Greatest distance of a vertex from the origin the outline turns about, mm. */
  reachMm: number;
  poseAt(travelMm: number): Pose;
}

export interface SweptShock {
  /** Body with reservoir, x from the body-end eye towards the shaft end. */
  body: readonly Point[];
  eyeToEyeMm: number;
  strokeMm: number;
  wayRound: 'body-to-frame' | 'body-to-link';
}

/** The first row of a table at or after a travel, or its last. */
function rowAt(table: readonly (readonly number[])[], travel: number): number {
  let row = 0;
  while (row < table.length - 1 && !((table[row]?.[0] ?? NaN) >= travel)) row += 1;
  return row;
}

/** Linear between rows of [travel, value...]; held at the ends. */
function between(table: readonly (readonly number[])[], row: number, travel: number, column: number): number {
  const [to, from] = [table[row], table[row - 1]];
  const value = to?.[column] ?? NaN;
  const end = to?.[0] ?? NaN;
  if (!from || travel >= end) return value;
  const start = from[0] ?? NaN;
  const t = (travel - start) / (end - start);
  return (from[column] ?? NaN) + t * (value - (from[column] ?? NaN));
}

const reachOf = (outline: readonly Point[]): number =>
  Math.max(0, ...outline.map(([x, y]) => Math.hypot(x, y)));

/** The shock's body: it swings about the frame-side pivot; with the body at the link it also comes nearer by the travel. */
export function shockMover(room: FrameRoom, shock: SweptShock): Mover {
  const atFrame = shock.wayRound === 'body-to-frame';
  // Turned by half a turn for the link end, so that its x runs from the link-side eye to the frame.
  const outline = atFrame ? shock.body : shock.body.map(([x, y]): Point => [-x, -y]);
  return {
    outline,
    reachMm: reachOf(outline),
    poseAt(travel) {
      const deg = between(room.swing, rowAt(room.swing, travel), travel, 1);
      const out = atFrame ? 0 : shock.eyeToEyeMm - travel;
      const rad = (deg * Math.PI) / 180;
      return { x: out * Math.cos(rad), y: out * Math.sin(rad), deg };
    },
  };
}

const still: Pose = { x: 0, y: 0, deg: 0 };

export function partMover({ polygon, poses }: FrameOutline): Mover {
  return {
    outline: polygon,
    reachMm: reachOf(polygon),
    poseAt(travel) {
      if (!poses) return still;
      const row = rowAt(poses, travel);
      const at = (column: number): number => between(poses, row, travel, column);
      return { x: at(1), y: at(2), deg: at(3) };
    },
  };
}

export function placed({ outline }: Mover, { x, y, deg }: Pose): readonly Point[] {
  if (deg === 0 && x === 0 && y === 0) return outline;
  const [c, s] = [Math.cos((deg * Math.PI) / 180), Math.sin((deg * Math.PI) / 180)];
  return outline.map(([px, py]): Point => [c * px - s * py + x, s * px + c * py + y]);
}

/** The same from corners into corners, so that nothing is allocated. */
export function placeCorners(from: Corners, { x, y, deg }: Pose, into: Corners): void {
  const turn = (deg * Math.PI) / 180;
  const c = Math.cos(turn);
  const s = Math.sin(turn);
  for (let i = 0; i < from.length; i += 2) {
    const px = from[i] as number;
    const py = from[i + 1] as number;
    into[i] = c * px - s * py + x;
    into[i + 1] = s * px + c * py + y;
  }
}

/**
 * The longest way that any point of an outline can go between two poses, mm: the arc at its reach plus the shift of
 * its origin. The origin itself runs along a line, or, at the shock's far end, along an arc that the angle bounds.
 */
export function longestWay({ reachMm }: Mover, from: Pose, to: Pose): number {
  if (from === to) return 0;
  const turn = (Math.abs(to.deg - from.deg) * Math.PI) / 180;
  const [near, far] = [lengthOf(from.x, from.y), lengthOf(to.x, to.y)];
  const arc = turn * Math.max(far, near);
  return turn * reachMm + Math.max(lengthOf(to.x - from.x, to.y - from.y), Math.abs(far - near) + arc);
}

/** The longest way from the first of some travels to each of them, along all between, mm. */
export function waysOf(mover: Mover, travels: readonly number[]): number[] {
  let gone = 0;
  let before: Pose | null = null;
  return travels.map((travel) => {
    const pose = mover.poseAt(travel);
    if (before) gone += longestWay(mover, before, pose);
    before = pose;
    return gone;
  });
}

const lengthOf = (x: number, y: number): number => Math.sqrt(x * x + y * y);
