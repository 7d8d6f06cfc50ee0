/** Round steps of an axis: 1, 2 or 5 of some power of ten, about `count` of them. */
export function stepOf(span: number, count: number): number {
  const rough = span / count;
  const power = 10 ** Math.floor(Math.log10(rough));
  return ([1, 2, 5].find((step) => step * power >= rough) ?? 10) * power;
}

export interface Axis {
  from: number;
  to: number;
  ticks: readonly number[];
}

/** An axis that holds all values, from and to a round figure. @param fromZero the axis begins at nothing */
export function axisFor(values: readonly number[], fromZero: boolean, count = 4): Axis {
  const low = fromZero ? Math.min(0, ...values) : Math.min(...values);
  const high = Math.max(...values);
  const step = stepOf(high - low || Math.abs(high) * 0.2 || 1, count);
  // A little below nothing is not worth a whole step.
  const slight = fromZero && low < 0 && -low < 0.4 * step;
  const from = slight ? low : Math.floor(low / step + 1e-9) * step;
  const to = Math.max(Math.ceil(high / step - 1e-9) * step, (slight ? 0 : from) + step);
  const first = slight ? 0 : from;
  const ticks = Array.from({ length: Math.round((to - first) / step) + 1 }, (_, i) =>
    Number((first + i * step).toFixed(6)),
  );
  return { from, to, ticks };
}

/** Labels at least so far apart, in their order, as near to where they belong as that allows. */
export function spread(wanted: readonly number[], apart: number): number[] {
  const order = wanted.map((y, i) => ({ y, i })).sort((a, b) => a.y - b.y);
  const placed = [...wanted];
  let before = -Infinity;
  for (const { y, i } of order) {
    before = Math.max(y, before + apart);
    placed[i] = before;
  }
  return placed;
}
