import { existsSync, readdirSync, rmSync } from 'node:fs';
import { join, relative } from 'node:path';
import { run } from './children.mjs';
import { CommandFailed, Fault } from './fault.mjs';
import { hashOf, setStamp, stampOf } from './hashes.mjs';
import { tail } from './messages.mjs';
import { npmCommand } from './npm-packages.mjs';
import { inRoot, root } from './paths.mjs';

const parts = ['packages/fit-engine', 'packages/contracts', 'db', 'fakes/stripe', 'fakes/mail', 'apps/api'];
const configFiles = ['package-lock.json', 'tsconfig.base.json', 'tsconfig.json'];

/** What the compiled programs are made from. */
const programSources = () =>
  [...parts, 'apps/web'].flatMap((part) => [`${part}/src`, `${part}/tsconfig.json`, `${part}/package.json`]);

/** What the web app is made from; its own folder holds the page, static files and the tool's settings. */
const webSources = () => {
  const settings = existsSync(inRoot('apps/web'))
    ? readdirSync(inRoot('apps/web')).filter((name) => /\.(html|ts|mts|mjs|json)$/.test(name))
    : [];
  const own = ['src', 'public', 'scripts', ...settings].map((name) => `apps/web/${name}`);
  return [...own, 'packages/contracts/src', 'packages/fit-engine/src'];
};

const hash = (paths) => hashOf([...paths, ...configFiles].map((path) => inRoot(path)));

/** The source file names that a compiled file may come from. */
export const sourcesOf = (compiled) => {
  const stem = compiled.replace(/\.(d\.ts|d\.ts\.map|js|js\.map)$/, '');
  return stem === compiled ? [] : [`${stem}.ts`, `${stem}.tsx`];
};

/** Deletes compiled files whose source is gone: an old migration, say, that would be run again. */
function sweep(part) {
  const dist = inRoot(part, 'dist');
  if (!existsSync(dist)) return;
  for (const entry of readdirSync(dist, { recursive: true, withFileTypes: true })) {
    if (!entry.isFile()) continue;
    const path = join(entry.parentPath ?? entry.path, entry.name);
    const sources = sourcesOf(relative(dist, path));
    if (sources.length > 0 && !sources.some((name) => existsSync(inRoot(part, 'src', name)))) rmSync(path);
  }
}

async function build(name, paths, results, work) {
  const wanted = hash(paths);
  if (stampOf(name) === wanted && results.every((path) => existsSync(inRoot(path)))) return 'up to date';
  setStamp(name, '');
  try {
    await work();
  } catch (error) {
    if (!(error instanceof CommandFailed)) throw error;
    throw new Fault(`Building the ${name} failed.`, `${tail(error.output, 40)}\nAll of it: ${error.log}`);
  }
  const missing = results.find((path) => !existsSync(inRoot(path)));
  if (missing) throw new Fault(`Building the ${name} left no ${missing}.`);
  setStamp(name, wanted);
  return 'built';
}

/** The TypeScript compiler's entry. */
export const tsc = inRoot('node_modules/typescript/bin/tsc');

/** Compiles packages, database, fakes and API when a source changed. */
export const buildPrograms = () =>
  build('programs', programSources(), ['apps/api/dist/main.js', 'db/dist/cli/migrate.js'], async () => {
    for (const part of parts) sweep(part);
    // A dist folder deleted by hand takes its build note with it, but not those of the parts that refer to it.
    await run(process.execPath, [tsc, '-b'], { cwd: root, log: 'tsc' });
  });

/** Builds the web app when a source changed. */
export const buildWeb = () =>
  build('web app', webSources(), ['apps/web/dist/index.html'], async () => {
    const [npm, ...cli] = npmCommand();
    await run(npm, [...cli, 'run', 'build', '--workspace', '@linkfell/web'], { cwd: root, log: 'vite' });
  });
