import { execFile } from 'node:child_process';
import { readFileSync, rmSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join, resolve } from 'node:path';
import { promisify } from 'node:util';
import { gzipSync } from 'node:zlib';

const web = resolve(import.meta.dirname, '..');

interface Chunk {
  file: string;
  src?: string;
  isEntry?: boolean;
  imports?: string[];
}

export interface BuiltApp {
  outDir: string;
  manifest: Record<string, Chunk>;
  read: (file: string) => string;
  remove: () => void;
}

/** Builds the app as it ships, into a folder of its own. */
export async function buildApp(): Promise<BuiltApp> {
  const outDir = join(web, 'node_modules/.cache', `built-${process.pid}`);
  const vite = join(dirname(createRequire(import.meta.url).resolve('vite/package.json')), 'bin/vite.js');
  // In a process of its own: the test runner's NODE_ENV would give us libraries with their development checks.
  await promisify(execFile)(
    process.execPath,
    [vite, 'build', '--outDir', outDir, '--emptyOutDir', '--logLevel', 'error'],
    { cwd: web, env: { ...process.env, NODE_ENV: 'production' } },
  );
  const read = (file: string) => readFileSync(join(outDir, file), 'utf8');
  return {
    outDir,
    manifest: JSON.parse(read('.vite/manifest.json')) as Record<string, Chunk>,
    read,
    remove: () => rmSync(outDir, { recursive: true, force: true }),
  };
}

/** The source module of every page, by its path, as the registry of routes imports them. */
export function pageModules(): Map<string, string> {
  const registry = readFileSync(join(web, 'src/app/routes.tsx'), 'utf8');
  const entries = registry.matchAll(/'(\/[^']*)': \(\) =>\s*import\('\.\.\/([^']+)'\)/g);
  return new Map([...entries].map(([, path, module]) => [path ?? '', `src/${module}.tsx`]));
}

/** Every script that a page needs before it can be shown: the entry, the page, and what they import. */
export function firstLoad({ manifest }: BuiltApp, module: string): string[] {
  const entry = Object.keys(manifest).find((key) => manifest[key]?.isEntry);
  const seen = new Set<string>();
  const visit = (key: string): void => {
    const chunk = manifest[key];
    if (!chunk) throw new Error(`The manifest does not know ${key}`);
    if (seen.has(chunk.file)) return;
    seen.add(chunk.file);
    chunk.imports?.forEach(visit);
  };
  visit(entry ?? 'no entry');
  visit(module);
  return [...seen].filter((file) => file.endsWith('.js'));
}

/** Kilobytes (1000 bytes) after gzip. */
export const gzippedKb = (app: BuiltApp, files: readonly string[]): number =>
  files.reduce((sum, file) => sum + gzipSync(app.read(file), { level: 9 }).length, 0) / 1000;
