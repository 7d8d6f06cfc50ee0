import type { FrameOutline, FrameRoom, Point } from '../facts.js';
import { polygonDistance } from './polygon-distance.js';

export type SweepResult =
  | { state: 'known'; distanceMm: number; atShockTravelMm: number; part: string }
  | { state: 'unknown'; part: string };

export interface SweptShock {
  /** Body with reservoir, x from the body-end eye towards the shaft end. */
  body: readonly Point[];
  eyeToEyeMm: number;
  strokeMm: number;
  wayRound: 'body-to-frame' | 'body-to-link';
}

const stepMm = 0.5;

type Row = readonly number[];
/** Linear between rows of [travel, value...]; held at the ends. */
function between(table: readonly Row[], travel: number, column: number): number {
  let before = table[0] as Row;
  for (const row of table) {
    if ((row[0] as number) >= travel) {
      const span = (row[0] as number) - (before[0] as number);
      const t = span === 0 ? 0 : (travel - (before[0] as number)) / span;
      return (before[column] as number) + t * ((row[column] as number) - (before[column] as number));
    }
    before = row;
  }
  return before[column] as number;
}

const turned = (polygon: readonly Point[], degrees: number, x = 0, y = 0): Point[] => {
  const [c, s] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)];
  return polygon.map(([px, py]) => [c * px - s * py + x, s * px + c * py + y] as const);
};

/** The shock's body in the frame's plane at a shock travel; with the body at the link it moves by -s along the axis. */
function bodyAt(room: FrameRoom, shock: SweptShock, travel: number): Point[] {
  const angle = room.swing.length > 0 ? between(room.swing, travel, 1) : 0;
  const along =
    shock.wayRound === 'body-to-frame'
      ? shock.body
      : shock.body.map(([x, y]) => [shock.eyeToEyeMm - travel - x, -y] as const);
  return turned(along, angle);
}

const partAt = (part: FrameOutline, travel: number): readonly Point[] =>
  part.poses
    ? turned(
        part.polygon,
        between(part.poses, travel, 3),
        between(part.poses, travel, 1),
        between(part.poses, travel, 2),
      )
    : part.polygon;

const furthest = (a: readonly Point[], b: readonly Point[]): number =>
  Math.max(0, ...a.map(([x, y], i) => Math.hypot(x - (b[i]?.[0] ?? x), y - (b[i]?.[1] ?? y))));

/**
 * The least distance of the shock's body to the frame's parts over the stroke, less what a step can hide (half of
 * what the vertices move from one step to the next) and less the part's stated tolerance; never below 0.
 * A moving part without pose table that could be near makes the answer unknown.
 */
export function sweep(room: FrameRoom, shock: SweptShock): SweepResult {
  const blind = room.outlines.find((part) => part.moves && !part.poses);
  if (blind) return { state: 'unknown', part: blind.name };
  let least: SweepResult & { state: 'known' } = {
    state: 'known',
    distanceMm: Infinity,
    atShockTravelMm: 0,
    part: '',
  };
  const steps = Math.ceil(shock.strokeMm / stepMm);
  let before: { body: Point[]; parts: (readonly Point[])[] } | null = null;
  for (let i = 0; i <= steps; i += 1) {
    const travel = Math.min(i * stepMm, shock.strokeMm);
    const body = bodyAt(room, shock, travel);
    const parts = room.outlines.map((part) => partAt(part, travel));
    const moved = before ? furthest(body, before.body) : 0;
    room.outlines.forEach((part, k) => {
      const outline = parts[k] as readonly Point[];
      const hidden = before ? (moved + furthest(outline, before.parts[k] ?? outline)) / 2 : 0;
      const free = Math.max(0, polygonDistance(body, outline) - hidden - part.toleranceMm);
      if (!(free >= least.distanceMm)) {
        least = { state: 'known', distanceMm: free, atShockTravelMm: travel, part: part.name };
      }
    });
    before = { body, parts };
  }
  return Number.isFinite(least.distanceMm) ? least : { state: 'unknown', part: 'outline' };
}
