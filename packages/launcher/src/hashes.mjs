import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { inLocal, root } from './paths.mjs';

/** All files at or below a path, sorted; none when it does not exist. */
export function filesUnder(path) {
  if (!existsSync(path)) return [];
  if (statSync(path).isFile()) return [path];
  return readdirSync(path, { withFileTypes: true })
    .filter((entry) => !['node_modules', 'dist', '.cache'].includes(entry.name))
    .flatMap((entry) => (entry.isDirectory() ? filesUnder(join(path, entry.name)) : [join(path, entry.name)]))
    .sort();
}

/** SHA-256 over names and contents of the files at or below the paths. */
export function hashOf(paths, base = root) {
  const hash = createHash('sha256');
  for (const file of paths.flatMap(filesUnder)) {
    hash
      .update(`${relative(base, file)}\0`)
      .update(readFileSync(file))
      .update('\0');
  }
  return hash.digest('hex');
}

/** The hash noted under a name when its work was last done; empty when never. */
export function stampOf(name) {
  const file = inLocal('stamps', name);
  return existsSync(file) ? readFileSync(file, 'utf8') : '';
}

/** Notes that the work of this name is done for this hash; an empty hash says that it is not. */
export const setStamp = (name, hash) => writeFileSync(inLocal('stamps', name), hash);
