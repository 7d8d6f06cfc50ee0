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

const steps = 80;

/** Log of the mean of exp(f) over an interval, by the trapezoid rule with 80 steps. */
export function logMeanExp(f: (x: number) => number, from: number, to: number): number {
  const values = new Float64Array(steps + 1);
  let top = -Infinity;
  for (let i = 0; i <= steps; i += 1) {
    const value = f(from + ((to - from) * i) / steps);
    values[i] = value;
    top = Math.max(top, value);
  }
  if (!Number.isFinite(top)) return -Infinity;
  let sum = 0;
  for (let i = 0; i <= steps; i += 1) {
    sum += (i === 0 || i === steps ? 0.5 : 1) * Math.exp((values[i] ?? 0) - top);
  }
  return top + Math.log(sum / steps);
}
