import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { onEnd } from './lifecycle.mjs';
import { inLocal } from './paths.mjs';
import { startOf } from './processes.mjs';

const fileOf = (name) => inLocal('run', `${name}.json`);

/** The live holder of a lock, `{pid, ...}`; undefined when nobody holds it, or a killed run left it behind. */
export function holderOf(name) {
  try {
    const holder = JSON.parse(readFileSync(fileOf(name), 'utf8'));
    return startOf(holder.pid) === holder.began ? holder : undefined;
  } catch {
    return undefined;
  }
}

/**
 * Takes a lock of this clone until the command ends.
 * @returns the other holder when there is one; undefined when the lock is ours
 */
export function takeLock(name, details = {}) {
  const other = holderOf(name);
  if (other) return other;
  writeFileSync(fileOf(name), JSON.stringify({ pid: process.pid, began: startOf(process.pid), ...details }));
  onEnd(() => rmSync(fileOf(name), { force: true }));
  return undefined;
}
