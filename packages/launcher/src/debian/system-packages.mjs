import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { run } from '../children.mjs';

const env = () => ({ ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C.UTF-8' });

/** The line that an administrator types to install packages. */
export const aptLine = (names) =>
  `apt-get update && apt-get install -y --no-install-recommends ${names.join(' ')}`;

async function aptGet(args, log) {
  await run('apt-get', ['-q', '-o', 'DPkg::Lock::Timeout=120', ...args], { env: env(), log, append: true });
}

/** Installs Debian packages as root. */
export async function installOnSystem(names, log) {
  try {
    await aptGet(['update'], log);
  } catch {
    // One unreachable third-party list must not stop us; the installation says what is really missing.
  }
  await aptGet(['install', '-y', '--no-install-recommends', ...names], log);
}

const policyFile = '/etc/postgresql-common/createcluster.conf';

/**
 * Installs PostgreSQL as root without the cluster on port 5432 that Debian's package would make and start: that
 * would be something we started and never end. The machine's own policy file is put back as it was.
 */
export async function installPostgresOnSystem(log) {
  await installOnSystem(['postgresql-common'], log);
  const before = existsSync(policyFile) ? readFileSync(policyFile, 'utf8') : undefined;
  mkdirSync('/etc/postgresql-common', { recursive: true });
  writeFileSync(policyFile, 'create_main_cluster = false\n');
  try {
    await aptGet(['install', '-y', '--no-install-recommends', 'postgresql'], log);
  } finally {
    if (before === undefined) rmSync(policyFile, { force: true });
    else writeFileSync(policyFile, before);
  }
}
