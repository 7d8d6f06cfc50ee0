const second = 1_000;

/** Tries before a message is given up; with the waits below about five hours. */
export const maxAttempts = 12;

/**
 * How long to wait after the given failed attempt, ms: 10 s, 20 s, 40 s … at most an hour, less up to a fifth so
 * that messages which failed together do not all come back together.
 * @param random in [0, 1)
 */
export function backoffMs(attempt: number, random: number = Math.random()): number {
  return Math.round(Math.min(10 * second * 2 ** (attempt - 1), 3_600 * second) * (1 - 0.2 * random));
}
