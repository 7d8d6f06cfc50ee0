import { existsSync, mkdirSync, readdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { run } from '../children.mjs';
import { inLocal } from '../paths.mjs';

// Large, and loaded only for code made at run time (JIT, GPU drivers), which we switch off.
const skipped = /^(libllvm|libz3|libgl1-mesa-dri|locales|libc-l10n|adwaita-icon-theme|systemd)/;

/**
 * Settings that let apt-get work without root: lists, archives and locks in a folder of ours; the machine's own
 * state is only read, so that what is installed already is not fetched again.
 */
export const aptOptions = (folder) =>
  [
    `Dir::State=${folder}/state`,
    'Dir::State::status=/var/lib/dpkg/status',
    `Dir::Cache=${folder}/cache`,
    'Debug::NoLocking=1',
    'APT::Get::List-Cleanup=0',
    'APT::Update::Post-Invoke-Success::=',
  ].flatMap((option) => ['-o', option]);

/**
 * Fetches Debian packages with all they depend on that the machine lacks, and unpacks them into a folder of ours.
 * Nothing of the machine is changed. The folder appears under its name only when complete.
 * @returns {Promise<string>} the folder, laid out like a root folder
 */
export async function unpackPackages(names, folderName, log) {
  const target = inLocal(folderName);
  if (existsSync(join(target, '.complete'))) return target;
  const apt = inLocal('apt');
  const archives = join(apt, 'cache', 'archives');
  for (const folder of ['state/lists/partial', 'cache/archives/partial']) {
    mkdirSync(join(apt, folder), { recursive: true });
  }
  const aptGet = (args) => run('apt-get', ['-q', ...aptOptions(apt), ...args], { log, append: true });
  await aptGet(['update']);
  await aptGet(['install', '--download-only', '-y', '--no-install-recommends', ...names]);

  const making = `${target}.making`;
  rmSync(making, { recursive: true, force: true });
  mkdirSync(making, { recursive: true });
  const files = readdirSync(archives).filter((file) => file.endsWith('.deb') && !skipped.test(file));
  for (const file of files) {
    await run('dpkg-deb', ['-x', join(archives, file), making], { log, append: true });
  }
  writeFileSync(join(making, '.complete'), `${names.join(' ')}\n`);
  rmSync(target, { recursive: true, force: true });
  renameSync(making, target);
  rmSync(apt, { recursive: true, force: true });
  return target;
}

const holdsLibraries = (folder) => readdirSync(folder).some((name) => /\.so(\.|$)/.test(name));

/** The library folders of an unpacked tree, as LD_LIBRARY_PATH takes them; some packages keep theirs a level down. */
export function libraryPath(tree) {
  const triplets = { x64: 'x86_64-linux-gnu', arm64: 'aarch64-linux-gnu' };
  const triplet = triplets[process.arch] ?? `${process.arch}-linux-gnu`;
  const folders = [`usr/lib/${triplet}`, `lib/${triplet}`, 'usr/lib', 'lib']
    .map((folder) => join(tree, folder))
    .filter(existsSync);
  const below = folders
    .flatMap((folder) => readdirSync(folder, { withFileTypes: true }).map((entry) => [folder, entry]))
    .filter(([folder, entry]) => entry.isDirectory() && holdsLibraries(join(folder, entry.name)))
    .map(([folder, entry]) => join(folder, entry.name));
  return [...folders, ...below, ...(process.env.LD_LIBRARY_PATH ? [process.env.LD_LIBRARY_PATH] : [])].join(
    ':',
  );
}
