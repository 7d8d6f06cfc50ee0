import { readFileSync } from 'node:fs';

/** The fields of /proc/PID/stat after the name: state first, then the parent's pid. Undefined for no process. */
function statOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ');
  } catch {
    return undefined;
  }
}

/** When a process began, in clock ticks since boot, as text; undefined when there is none. Tells a reused pid. */
export function startOf(pid) {
  const fields = statOf(pid);
  return fields === undefined || fields[0] === 'Z' ? undefined : fields[19];
}

/** The pid of a process's parent; undefined when there is no such process. */
export const parentOf = (pid) => {
  const parent = statOf(pid)?.[1];
  return parent === undefined ? undefined : Number(parent);
};

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

/** Waits until `done()` is true; false when it is not within `ms`. */
export async function waitUntil(done, ms, everyMs = 50) {
  const end = Date.now() + ms;
  while (!(await done())) {
    if (Date.now() >= end) return false;
    await new Promise((resolve) => setTimeout(resolve, everyMs));
  }
  return true;
}
