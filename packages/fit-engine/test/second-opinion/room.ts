import type { FitQuestion, FrameOutline, SheetEntry } from '../../src/facts.js';
import { rowOf } from './sizes.js';
import { TooClose, type Kind } from './kinds.js';

/** Room as measured by the rider, 3 mm on every side. */
function measured({ frame, shock }: FitQuestion): 'fits' | 'small' | 'doubt' | null {
  if (!frame.reservoirRoom || !shock.reservoir) return null;
  const { diameterMm, lengthMm, uncertaintyMm: u } = frame.reservoirRoom.value;
  const across = diameterMm - shock.reservoir.diameterMm - 6;
  const along = lengthMm - shock.reservoir.lengthMm - 6;
  if (across < -2 * u || along < -2 * u) return 'small';
  return across >= 2 * u && along >= 2 * u ? 'fits' : 'doubt';
}

type Point = readonly [number, number];
const overlap = (a: readonly Point[], b: readonly Point[], axis: 0 | 1): number => {
  const [x, y] = [a, b].map((polygon) => polygon.map((point) => point[axis])) as [number[], number[]];
  return Math.max(Math.min(...x) - Math.max(...y), Math.min(...y) - Math.max(...x));
};

/** Distance of upright boxes that only slide; the drawings of the tests are nothing else. */
function free(
  body: readonly Point[],
  part: FrameOutline,
  eye: number,
  stroke: number,
  atLink: boolean,
): number {
  const [, from = [0, 0, 0, 0], to = [1, 0, 0, 0]] = [0, ...(part.poses ?? [])] as const;
  let least = Infinity;
  for (let s = 0; s <= stroke; s += 0.1) {
    const share = (s - from[0]) / (to[0] - from[0]);
    const moved = part.polygon.map(([x, y]): Point => [
      x + from[1] + share * (to[1] - from[1]),
      y + from[2] + share * (to[2] - from[2]),
    ]);
    const placed = atLink ? body.map(([x, y]): Point => [eye - s - x, -y]) : body;
    const [dx, dy] = [overlap(placed, moved, 0), overlap(placed, moved, 1)];
    least = Math.min(least, dx > 0 && dy > 0 ? Math.hypot(dx, dy) : Math.max(dx, dy, 0));
  }
  return least;
}

export function roomKind(q: FitQuestion, entry: SheetEntry, way: string): Kind {
  const { frame, shock } = q;
  const { reservoir } = shock;
  if (!reservoir) return 'pass';
  const word = frame.reservoirStatement?.value;
  if (word === 'inline-only') return 'fail';
  const may = reservoir.positionsDeg.filter((deg) => !frame.refusedPositions?.value.includes(deg));
  if (may.length === 0) return 'fail';
  const room = measured(q);
  const row = rowOf(entry.sizeKey ?? shock.sizeKey);
  if (frame.room && row) {
    const gap = frame.room.outlines.some((part) => part.moves && !part.poses);
    const drawn = may.flatMap((deg) => reservoir.outlines.filter((outline) => outline.positionDeg === deg));
    const parts = frame.room.outlines.filter((part) => !part.moves || part.poses);
    const best = Math.max(
      ...drawn.map(({ polygon }) =>
        Math.min(
          ...parts.map((p) => free(polygon, p, row[2], row[3], way === 'body-to-link') - p.toleranceMm),
        ),
      ),
    );
    if (Math.abs(best - 3) < 0.1) throw new TooClose();
    if (drawn.length > 0 && best < 3) return word || drawn.length < may.length ? 'unknown' : 'fail';
    // A part that moves in a way nobody has drawn: whatever is said, it may meet the reservoir.
    if (gap) return 'unknown';
    if (drawn.length > 0) return room === 'small' ? 'unknown' : 'pass';
    // No position is drawn: the maker's word stands, the rider's measure does not see motion.
    if (word !== 'fits') return 'unknown';
  }
  if (word === 'fits') return room === 'small' ? 'unknown' : 'pass';
  if (room === 'small') return 'fail';
  return room === 'fits' ? 'pass' : 'unknown';
}
