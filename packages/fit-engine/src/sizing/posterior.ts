/** Shares from log weights, summing to 1, worked out so that none underflows before its time. */
export function sharesFromLogs(logs: readonly number[]): number[] {
  const top = Math.max(...logs);
  if (!Number.isFinite(top)) return logs.map(() => 0);
  const weights = logs.map((log) => Math.exp(log - top));
  const sum = weights.reduce((a, b) => a + b, 0);
  return weights.map((weight) => weight / sum);
}

/** Log of the normal density less its constant: ranking needs no more. */
export const logNormal = (deviation: number, u: number): number => -0.5 * (deviation / u) ** 2 - Math.log(u);

/** Log of the mean of exp(f) over an interval, by the trapezoid rule with 80 steps. */
export function logMeanExp(f: (x: number) => number, from: number, to: number): number {
  const steps = 80;
  const values = Array.from({ length: steps + 1 }, (_, i) => f(from + ((to - from) * i) / steps));
  const top = Math.max(...values);
  if (!Number.isFinite(top)) return -Infinity;
  const sum = values.reduce((total, value, i) => {
    const weight = i === 0 || i === steps ? 0.5 : 1;
    return total + weight * Math.exp(value - top);
  }, 0);
  return top + Math.log(sum / steps);
}
