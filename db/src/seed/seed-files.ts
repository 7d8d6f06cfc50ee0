import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of the data files, found from the sources and from the built commands alike. */
export function seedsFolder(): string {
  let folder = dirname(fileURLToPath(import.meta.url));
  while (!existsSync(join(folder, 'seeds', 'makers.json'))) {
    const above = dirname(folder);
    if (above === folder) throw new Error('The demo data (db/seeds) cannot be found beside the program');
    folder = above;
  }
  return join(folder, 'seeds');
}

const read = (path: string): unknown => JSON.parse(readFileSync(join(seedsFolder(), path), 'utf8'));

/** One data file. The shapes are asserted by the scenario's own tests. */
export const readOne = <T>(path: string): T => read(`${path}.json`) as T;

/** All files of a folder of lists, joined in the order of their names. */
export const readAll = <T>(folder: string): T[] =>
  readdirSync(join(seedsFolder(), folder))
    .filter((name) => name.endsWith('.json'))
    .sort()
    .flatMap((name) => read(join(folder, name)) as T[]);
