import { longestWay, placed, type Mover } from './motion.js';
import { polygonDistance } from './polygon-distance.js';

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

/**
 * Least distance of two rigid outlines over a travel, less a tolerance, that can be vouched for at every instant.
 *
 * Between two travels no pair of points can close more than the longest way that any point goes, so the distance in
 * between is at least (d0 + d1 - way) / 2. Intervals whose bound could be the least are halved, down to 1/128 mm;
 * those that cannot are left alone, however long. What is given away is on the safe side.
 * @param bends travels at which a motion bends, ascending, from 0 to the stroke: no interval spans one
 * @param beat only a distance below this matters to the caller
 */
export function nearest(
  a: Mover,
  b: Mover,
  bends: readonly number[],
  toleranceMm: number,
  beat = Infinity,
): Nearest {
  const freeAt = (s: number): number =>
    Math.max(0, polygonDistance(placed(a, a.poseAt(s)), placed(b, b.poseAt(s))) - toleranceMm);
  const seen = bends.map((s) => ({ s, free: freeAt(s) }));
  let least = beat;
  // The nearest that was seen says where; the least bound says how near at worst.
  let found: Nearest = { mm: Infinity, at: 0 };
  let vouched = Infinity;
  const saw = (s: number, free: number): void => {
    least = Math.min(least, free);
    if (free < found.mm) found = { mm: free, at: s };
  };
  for (const { s, free } of seen) saw(s, free);
  const look = (s0: number, d0: number, s1: number, d1: number): void => {
    const way = longestWay(a, a.poseAt(s0), a.poseAt(s1)) + longestWay(b, b.poseAt(s0), b.poseAt(s1));
    const bound = Math.max(0, Math.min(d0, d1, (d0 + d1 - way) / 2));
    if (bound >= least || found.mm === 0) return;
    const near = bound >= least - givenAway(least) && s1 - s0 <= stepMm;
    if (near || s1 - s0 <= finestMm) {
      vouched = Math.min(vouched, bound);
      return;
    }
    const mid = (s0 + s1) / 2;
    const free = freeAt(mid);
    saw(mid, free);
    look(s0, d0, mid, free);
    look(mid, free, s1, d1);
  };
  for (let i = 1; i < seen.length; i += 1) {
    const [p, q] = [seen[i - 1], seen[i]];
    if (p && q) look(p.s, p.free, q.s, q.free);
  }
  return { mm: Math.min(found.mm, vouched), at: found.at };
}
