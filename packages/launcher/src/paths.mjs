import { createHash } from 'node:crypto';
import { chmodSync, mkdirSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = resolve(dirname(fileURLToPath(import.meta.url)), '../../..');
export const local = join(root, '.local');

/** Path below the clone. */
export const inRoot = (...parts) => join(root, ...parts);
/** Path below `.local`, the folder for everything that is made here and ignored by git. */
export const inLocal = (...parts) => join(local, ...parts);
/** Eight hex digits that stand for this clone, for names outside it. */
export const cloneId = createHash('sha256').update(root).digest('hex').slice(0, 8);

/** Makes a folder that others may pass through whatever the umask, so that user postgres reaches what is below. */
export function makeFolder(path, mode = 0o755) {
  mkdirSync(path, { recursive: true });
  chmodSync(path, mode);
  return path;
}

/** Makes `.local` and the folders every command writes to. */
export function makeLocalFolders() {
  makeFolder(local);
  for (const name of ['logs', 'run', 'stamps']) mkdirSync(inLocal(name), { recursive: true });
}
