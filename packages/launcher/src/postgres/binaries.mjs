import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { aptLine, installPostgresOnSystem } from '../debian/system-packages.mjs';
import { libraryPath, unpackPackages } from '../debian/unpacked-packages.mjs';
import { CommandFailed, Fault } from '../fault.mjs';
import { diskFull, saysDiskFull, tail } from '../messages.mjs';
import { inLocal } from '../paths.mjs';

const oldest = 14;

/** The versions of PostgreSQL whose server lies under `<tree>/usr/lib/postgresql`, newest first. */
export function versionsIn(tree) {
  const folder = join(tree, 'usr/lib/postgresql');
  if (!existsSync(folder)) return [];
  return readdirSync(folder)
    .map(Number)
    .filter((version) => version >= oldest)
    .filter((version) =>
      ['initdb', 'pg_ctl', 'postgres', 'psql'].every((name) =>
        existsSync(join(folder, `${version}/bin`, name)),
      ),
    )
    .sort((a, b) => b - a);
}

/** The major version that made a data folder; undefined when there is none. */
export function versionOfData(dataFolder) {
  try {
    return Number(readFileSync(join(dataFolder, 'PG_VERSION'), 'utf8'));
  } catch {
    return undefined;
  }
}

function find(tree, wanted) {
  const versions = versionsIn(tree);
  const version = wanted ? versions.find((one) => one === wanted) : versions[0];
  if (!version) return undefined;
  const bin = join(tree, 'usr/lib/postgresql', String(version), 'bin');
  const env = tree === '/' ? process.env : { ...process.env, LD_LIBRARY_PATH: libraryPath(tree) };
  return { bin, version, env, note: `version ${version}${tree === '/' ? '' : ' (unpacked into .local)'}` };
}

const isRoot = () => process.getuid() === 0;

/** User postgres exists: the server will not run as root, so root needs it. */
const hasPostgresUser = () => /^postgres:/m.test(readFileSync('/etc/passwd', 'utf8'));

async function install() {
  if (isRoot()) return installPostgresOnSystem('postgresql-install');
  return unpackPackages(['postgresql'], 'pg-dist', 'postgresql-install');
}

/**
 * Finds PostgreSQL's programs, installing them when they are missing.
 * @param {() => number | undefined} wantedVersion the version that an existing data folder asks for
 * @returns {Promise<{bin: string, version: number, env: object, note: string}>}
 */
export async function ensurePostgres(wantedVersion) {
  let wanted;
  const present = () => {
    if (isRoot() && !hasPostgresUser()) return undefined;
    wanted = wantedVersion();
    return find('/', wanted) ?? (isRoot() ? undefined : find(inLocal('pg-dist'), wanted));
  };
  const found = present();
  if (found) return found;
  try {
    await install();
  } catch (error) {
    if (saysDiskFull(error)) throw diskFull();
    if (!(error instanceof CommandFailed)) throw error;
    throw new Fault(
      'PostgreSQL is missing and could not be installed.',
      `${tail(error.output, 8)}\nHave an administrator run:\n  ${aptLine(['postgresql'])}\nThen run this again.`,
    );
  }
  const installed = present();
  if (installed) return installed;
  throw new Fault(
    wanted
      ? `The data folder was made by PostgreSQL ${wanted}, which is not on this machine.`
      : 'PostgreSQL was installed, but its programs are not under /usr/lib/postgresql.',
    wanted
      ? `Install postgresql-${wanted}, or move .local/cluster away for fresh demo data.`
      : `Linkfell needs version ${oldest} or later.`,
  );
}
