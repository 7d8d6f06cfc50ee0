import { readFileSync, readlinkSync } from 'node:fs';

/** When a process began, in clock ticks since boot, as text; undefined when there is none. Tells a reused pid. */
export function startOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return fields[0] === 'Z' ? undefined : fields[19];
  } catch {
    return undefined;
  }
}

/** The command line of a process as a list; empty when there is none. */
export function commandOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0').filter(Boolean);
  } catch {
    return [];
  }
}

/** True when a process with this pid lives. */
export const isAlive = (pid) => startOf(pid) !== undefined;

/** The folder in which a process runs; undefined when it cannot be read. */
export function folderOf(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`);
  } catch {
    return undefined;
  }
}

/** Waits until `done()` is true; false when it is not within `ms`. */
export async function waitUntil(done, ms, everyMs = 50) {
  const end = Date.now() + ms;
  while (!(await done())) {
    if (Date.now() >= end) return false;
    await new Promise((resolve) => setTimeout(resolve, everyMs));
  }
  return true;
}
