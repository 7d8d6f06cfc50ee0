import { join } from 'node:path';
import { buildPrograms, buildWeb } from './build.mjs';
import { Fault } from './fault.mjs';
import { onEnd } from './lifecycle.mjs';
import { diskFull, freeMegabytes } from './messages.mjs';
import { ensureNpmPackages } from './npm-packages.mjs';
import { inLocal, makeLocalFolders, root } from './paths.mjs';
import { ensurePostgres, versionOfData } from './postgres/binaries.mjs';
import { endCluster, openCluster } from './postgres/cluster.mjs';
import { dataHome } from './postgres/owner.mjs';
import { step } from './steps.mjs';

const leastFreeMegabytes = 150;

/** The folders to write to, and room on the disk. */
export function prepareFolders() {
  try {
    makeLocalFolders();
  } catch (error) {
    if (error.code === 'ENOSPC') throw diskFull();
    throw new Fault(
      `Linkfell cannot write to ${inLocal()}: ${error.message}.`,
      'The clone must belong to the user who runs this.',
    );
  }
  if (freeMegabytes(root) < leastFreeMegabytes) throw diskFull();
}

/** Node packages, installed when missing. */
export const preparePackages = () => step('npm packages', ensureNpmPackages);

/** Compiled programs and the built web app. */
export async function prepareBuild({ web = true } = {}) {
  await step('Programs', buildPrograms);
  if (web) await step('Web app', buildWeb);
}

/**
 * PostgreSQL and a running cluster of ours, ended with the command.
 * @param {string} name of the data folder
 * @param {object} [options]
 * @param {string[]} [options.settings] server settings
 * @param {boolean} [options.keep] leave the server running when the command ends
 */
export async function prepareCluster(name, { settings, keep = false } = {}) {
  // Asked only once user postgres exists: without it nobody knows what it can reach.
  const versionOfOurs = () => versionOfData(join(dataHome().home, name));
  const postgres = await step('PostgreSQL', () => ensurePostgres(versionOfOurs));
  return step('Database cluster', async () => {
    const { home, fellBack } = dataHome();
    if (!keep) onEnd(() => endCluster(home, name));
    const cluster = await openCluster({ postgres, home, name, settings });
    return {
      ...cluster,
      home,
      note: fellBack ? `${cluster.note}, in ${home} (private clone)` : cluster.note,
    };
  });
}
