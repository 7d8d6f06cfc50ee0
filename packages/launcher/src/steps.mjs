import { performance } from 'node:perf_hooks';

/** Seconds for people: `0.4 s`, `75 s`. */
export function seconds(ms) {
  const s = ms / 1000;
  return s < 20 ? `${s.toFixed(1)} s` : `${Math.round(s)} s`;
}

/**
 * Runs one step of a set-up and prints one line for it: its name at once, then what it did and its time.
 * `work` returns a short note (or nothing), or an object with a `note`; that value is handed on.
 */
export async function step(name, work) {
  const began = performance.now();
  process.stdout.write(`  ${name.padEnd(22)} `);
  try {
    const result = await work();
    const note = typeof result === 'string' ? result : (result?.note ?? 'done');
    process.stdout.write(`${note}  (${seconds(performance.now() - began)})\n`);
    return result;
  } catch (error) {
    process.stdout.write(`failed  (${seconds(performance.now() - began)})\n`);
    throw error;
  }
}
