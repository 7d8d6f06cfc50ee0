import { longestWay, placeCorners, type Mover, type Pose } from './motion.js';
import { cornersDistance, type Corners } from './polygon-distance.js';

export interface Nearest {
  /** Distance that can be vouched for, mm. */
  mm: number;
  /** Shock travel at which the outlines come that near, mm. */
  at: number;
}

/** Widest step over which a distance is taken, mm of travel, where something nearer might hide; and the finest. */
const stepMm = 0.5;
const finestMm = stepMm / 64;

/** How much may be given away to safety: 0.02 mm and a fiftieth of the distance. */
const givenAway = (mm: number): number => 0.02 + mm / 50;

/** Both outlines at one travel. */
interface Instant {
  s: number;
  a: Pose;
  b: Pose;
  free: number;
}

/** An outline that moves, with its corners. */
export interface Moving {
  mover: Mover;
  corners: Corners;
}

export interface Limits {
  /** Only a distance below this matters to the caller. */
  beatMm: number;
  /** A distance of this or less does not matter either: it is seen, and no closer look taken. */
  floorMm: number;
}

// Where corners are placed, by their number: only while one travel is looked at.
const buffers = new Map<number, [Corners, Corners]>();
function bufferOf({ corners }: Moving, which: 0 | 1): Corners {
  const { length } = corners;
  const pair = buffers.get(length) ?? [new Float64Array(length), new Float64Array(length)];
  buffers.set(length, pair);
  return pair[which];
}

/** Two outlines of which both ends of the stroke have been seen. */
export interface Begun {
  lookAt: (s: number) => Instant;
  atEnds: [Instant, Instant];
}

/** Looks at both ends of the stroke. @param toleranceMm off every distance */
export function begin(a: Moving, b: Moving, strokeMm: number, toleranceMm: number): Begun {
  const lookAt = looker(a, b, toleranceMm);
  return { lookAt, atEnds: [lookAt(0), lookAt(strokeMm)] };
}

function looker(a: Moving, b: Moving, toleranceMm: number): (s: number) => Instant {
  const [bufferA, bufferB] = [bufferOf(a, 0), bufferOf(b, 1)];
  const guess = { a: 0, b: 0 };
  return (s) => {
    const poseA = a.mover.poseAt(s);
    const poseB = b.mover.poseAt(s);
    placeCorners(a.corners, poseA, bufferA);
    const still = poseB.x === 0 && poseB.y === 0 && poseB.deg === 0;
    if (!still) placeCorners(b.corners, poseB, bufferB);
    const free = Math.max(0, cornersDistance(bufferA, still ? b.corners : bufferB, guess) - toleranceMm);
    return { s, a: poseA, b: poseB, free };
  };
}

const wayOf = (a: Moving, b: Moving, p: Instant, q: Instant): number =>
  longestWay(a.mover, p.a, q.a) + longestWay(b.mover, p.b, q.b);
const boundOf = (p: Instant, q: Instant, way: number): number =>
  Math.max(0, Math.min(p.free, q.free, (p.free + q.free - way) / 2));

/** The travels at which a motion bends, and how far each outline has gone there. */
export interface Bends {
  /** Ascending, from 0 to the stroke: no motion bends between two of them. */
  at: readonly number[];
  waysA: readonly number[];
  waysB: readonly number[];
}

/**
 * Whether two outlines stay at least so far apart over the whole travel, by looking at as few of the bends as it
 * takes: ways add up over bends. Every look is kept in `seen`.
 */
function staysClear(
  { at: travels, waysA, waysB }: Bends,
  seen: (Instant | undefined)[],
  lookAt: (s: number) => Instant,
  beatMm: number,
): boolean {
  const at = (i: number): Instant => (seen[i] ??= lookAt(travels[i] as number));
  const way = (i: number): number => (waysA[i] as number) + (waysB[i] as number);
  const clear = (i: number, j: number): boolean => {
    const [p, q] = [at(i), at(j)];
    if (boundOf(p, q, way(j) - way(i)) >= beatMm) return true;
    const mid = Math.floor((i + j) / 2);
    return mid > i && p.free >= beatMm && q.free >= beatMm && clear(i, mid) && clear(mid, j);
  };
  return clear(0, travels.length - 1);
}

/**
 * Least distance of two rigid outlines over a travel, less a tolerance, that can be vouched for at every instant.
 *
 * Between two travels no pair of points can close more than the longest way that any point goes, so the distance in
 * between is at least (d0 + d1 - way) / 2. Intervals whose bound could be the least are halved, down to 1/128 mm;
 * those that cannot are left alone, however long. What is given away is on the safe side.
 */
export function nearest(
  a: Moving,
  b: Moving,
  bends: Bends,
  { lookAt, atEnds }: Begun,
  { beatMm, floorMm }: Limits,
): Nearest {
  let least = beatMm;
  // The nearest that was seen says where; the least bound says how near at worst.
  let found: Nearest = { mm: Infinity, at: 0 };
  let vouched = Infinity;
  const saw = ({ s, free }: Instant): void => {
    least = Math.min(least, free);
    if (free < found.mm) found = { mm: free, at: s };
  };
  const looked: (Instant | undefined)[] = [];
  [looked[0], looked[bends.at.length - 1]] = atEnds;
  const clear = staysClear(bends, looked, lookAt, beatMm);
  const seen = clear ? looked : bends.at.map((s, i) => looked[i] ?? lookAt(s));
  for (const instant of seen) if (instant) saw(instant);
  if (clear) return found;
  const look = (p: Instant, q: Instant): void => {
    if (found.mm <= floorMm) return;
    const bound = boundOf(p, q, wayOf(a, b, p, q));
    if (bound >= least) return;
    const near = bound >= least - givenAway(least) && q.s - p.s <= stepMm;
    if (near || q.s - p.s <= finestMm) {
      vouched = Math.min(vouched, bound);
      return;
    }
    const mid = lookAt((p.s + q.s) / 2);
    saw(mid);
    look(p, mid);
    look(mid, q);
  };
  for (let i = 1; i < seen.length; i += 1) {
    const [p, q] = [seen[i - 1], seen[i]];
    if (p && q) look(p, q);
  }
  return { mm: Math.min(found.mm, vouched), at: found.at };
}
