/** A figure that can be reckoned with: NaN and Infinity are as good as not told. */
export const known = (value: number | null | undefined): value is number =>
  typeof value === 'number' && Number.isFinite(value);

export const positive = (value: number | null | undefined): value is number => known(value) && value > 0;

/** Slack for sums of decimal figures in binary: a limit met exactly passes, and nothing else does. */
export const slack = 1e-6;
