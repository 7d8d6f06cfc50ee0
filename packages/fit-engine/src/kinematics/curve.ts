/** Leverage ratio over shock travel. All arguments in mm of shock travel, held within 0 and the stroke. */
export interface Curve {
  strokeMm: number;
  ratioAt(shockMm: number): number;
  /** dLR/ds, 1/mm. */
  slopeAt(shockMm: number): number;
  wheelTravelAt(shockMm: number): number;
  /** The inverse: shock travel at a wheel travel, mm, within a nanometre; held within 0 and the ends. */
  shockTravelAt(wheelMm: number): number;
  totalTravelMm: number;
  meanRatio: number;
  /** (start - end) / start, %; null where only travel and stroke are known. */
  progressionPercent: number | null;
  progressionToLowestPercent: number | null;
  /** Made of travel and stroke alone. */
  constant: boolean;
  /** The table agrees with the published travel (or, by wheel travel, with the stroke) within 3 %. */
  usableForAdvice: boolean;
}

/** Held within 0 and an end; NaN for what is no number, which no end may stand for. */
export const within = (value: number, end: number): number =>
  Number.isFinite(value) ? Math.min(Math.max(value, 0), end) : NaN;

/**
 * Where a rising function reaches a value, by bisection kept going until the interval is a nanometre (at most 60
 * halvings); held at the ends.
 */
export function inverseOf(rising: (x: number) => number, value: number, end: number): number {
  if (!Number.isFinite(value) || !Number.isFinite(end)) return NaN;
  if (!(value > 0)) return 0;
  if (value >= rising(end)) return end;
  let [low, high] = [0, end];
  for (let i = 0; i < 60 && high - low > 1e-9; i += 1) {
    const mid = (low + high) / 2;
    if (rising(mid) < value) low = mid;
    else high = mid;
  }
  return (low + high) / 2;
}

/**
 * The same where the slope is known: Newton's steps, each kept between values known to be too low and too high, and
 * halving where a step would leave them; until a step is below a nanometre (at most 60 steps), held at the ends.
 */
export function inverseBySlope(
  rising: (x: number) => number,
  slope: (x: number) => number,
  value: number,
  end: number,
): number {
  if (!Number.isFinite(value) || !Number.isFinite(end)) return NaN;
  if (!(value > 0)) return 0;
  if (value >= rising(end)) return end;
  let low = 0;
  let high = end;
  let x = within(value / slope(0), end);
  for (let i = 0; i < 60; i += 1) {
    const over = rising(x) - value;
    if (over < 0) low = x;
    else high = x;
    const step = x - over / slope(x);
    const next = step > low && step < high ? step : (low + high) / 2;
    const moved = Math.abs(next - x);
    x = next;
    if (moved < 1e-9) break;
  }
  return x;
}
