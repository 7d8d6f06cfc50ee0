import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { commandOf, isAlive, waitUntil } from '../processes.mjs';

/** What `postmaster.pid` of a data folder says; undefined when there is none. */
export function readPostmaster(dataFolder) {
  try {
    const lines = readFileSync(join(dataFolder, 'postmaster.pid'), 'utf8').split('\n');
    return { pid: Number(lines[0]), port: Number(lines[3]), status: lines[7]?.trim() };
  } catch {
    return undefined;
  }
}

/** True when a command line is a PostgreSQL server on this data folder. */
export const servesFolder = (command, dataFolder) =>
  command.some((part) => /(^|\/)postgres$/.test(part)) && command.includes(dataFolder);

/**
 * The server that runs on our data folder, if any. A note left by a killed server is removed: its pid may by now
 * be another program's, and the server would then refuse to start.
 */
export function runningPostmaster(dataFolder) {
  const noted = readPostmaster(dataFolder);
  if (!noted) return undefined;
  if (servesFolder(commandOf(noted.pid), dataFolder)) return noted;
  rmSync(join(dataFolder, 'postmaster.pid'), { force: true });
  return undefined;
}

/** Ends a server of ours that pg_ctl cannot end: fast shutdown, then immediate. */
export async function endPostmaster(pid) {
  for (const signal of ['SIGINT', 'SIGQUIT', 'SIGKILL']) {
    try {
      process.kill(pid, signal);
    } catch {
      return;
    }
    if (await waitUntil(() => !isAlive(pid), 10_000)) return;
  }
}
