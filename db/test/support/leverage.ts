import type { LeverageTable } from '@linkfell/fit-engine';

/**
 * A plain second look at a leverage table, apart from the engine's cubic: trapezes between the points.
 * `integralMm` is the wheel travel of a table by shock travel, and the shock travel of one by wheel travel.
 */
export function leverageOf({ by, points }: LeverageTable) {
  let integralMm = 0;
  for (let i = 1; i < points.length; i += 1) {
    const [[x0, a], [x1, b]] = [points[i - 1] ?? [NaN, NaN], points[i] ?? [NaN, NaN]];
    if (!(x1 > x0)) throw new Error('points must increase');
    integralMm += by === 'shock-travel' ? ((a + b) / 2) * (x1 - x0) : ((1 / a + 1 / b) / 2) * (x1 - x0);
  }
  const ratios = points.map(([, ratio]) => ratio);
  if (points[0]?.[0] !== 0) throw new Error('points must start at 0');
  return {
    endsAtMm: points.at(-1)?.[0] ?? NaN,
    integralMm,
    lowest: Math.min(...ratios),
    highest: Math.max(...ratios),
  };
}
