import type { FrameOutline, FrameRoom, Point } from '../facts.js';

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

/** Linear between rows of [travel, value...]; held at the ends. */
function between(table: readonly (readonly number[])[], travel: number, column: number): number {
  const last = table.length - 1;
  const value = (row: number, of: number): number => table[row]?.[of] ?? NaN;
  if (travel <= value(0, 0)) return value(0, column);
  for (let row = 1; row <= last; row += 1) {
    if (value(row, 0) >= travel) {
      const t = (travel - value(row - 1, 0)) / (value(row, 0) - value(row - 1, 0));
      return value(row - 1, column) + t * (value(row, column) - value(row - 1, column));
    }
  }
  return value(last, column);
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
      const deg = between(room.swing, travel, 1);
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
    poseAt: (travel) =>
      poses
        ? { x: between(poses, travel, 1), y: between(poses, travel, 2), deg: between(poses, travel, 3) }
        : still,
  };
}

export function placed({ outline }: Mover, { x, y, deg }: Pose): readonly Point[] {
  if (deg === 0 && x === 0 && y === 0) return outline;
  const [c, s] = [Math.cos((deg * Math.PI) / 180), Math.sin((deg * Math.PI) / 180)];
  return outline.map(([px, py]): Point => [c * px - s * py + x, s * px + c * py + y]);
}

/**
 * The longest way that any point of an outline can go between two poses, mm: the arc at its reach plus the shift of
 * its origin. The origin itself runs along a line, or, at the shock's far end, along an arc that the angle bounds.
 */
export function longestWay({ reachMm }: Mover, from: Pose, to: Pose): number {
  const turn = (Math.abs(to.deg - from.deg) * Math.PI) / 180;
  const radial = Math.abs(Math.hypot(to.x, to.y) - Math.hypot(from.x, from.y));
  const arc = turn * Math.max(Math.hypot(to.x, to.y), Math.hypot(from.x, from.y));
  return turn * reachMm + Math.max(Math.hypot(to.x - from.x, to.y - from.y), radial + arc);
}
