import { expect } from 'vitest';

/** Within an absolute or a relative tolerance, whichever is wider; a NaN is never near. */
export function expectNear(
  actual: number | null,
  expected: number,
  { abs = 0, rel = 0 }: { abs?: number; rel?: number },
  what = '',
): void {
  const off = Math.abs((actual ?? NaN) - expected);
  expect(off, `${what} got ${actual}, expected ${expected}`).toBeLessThanOrEqual(
    Math.max(abs, rel * Math.abs(expected)),
  );
}
