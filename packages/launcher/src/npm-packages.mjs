import { existsSync, readFileSync, rmSync } from 'node:fs';
import { run } from './children.mjs';
import { CommandFailed, Fault } from './fault.mjs';
import { hashOf, setStamp, stampOf } from './hashes.mjs';
import { diskFull, freeMegabytes, tail } from './messages.mjs';
import { inRoot, root } from './paths.mjs';

// The packages take 500, npm's own store as much again while it fetches.
const needMegabytes = 800;

const needless = (entry) => entry.optional || entry.peer || entry.os || entry.cpu || entry.libc;

/**
 * True when what npm noted in `node_modules/.package-lock.json` is what the lock file asks for. Packages for other
 * systems and optional ones may be absent.
 */
export function installedAgrees(lock, installed) {
  return Object.entries(lock.packages)
    .filter(([path]) => path.includes('node_modules/'))
    .every(([path, wanted]) => {
      const found = installed.packages[path];
      if (!found) return Boolean(needless(wanted));
      return wanted.link ? found.link === true : found.version === wanted.version;
    });
}

function upToDate(hash) {
  const noted = inRoot('node_modules/.package-lock.json');
  if (!existsSync(noted)) return false;
  if (stampOf('npm') === hash) return true;
  const read = (path) => JSON.parse(readFileSync(path, 'utf8'));
  return installedAgrees(read(inRoot('package-lock.json')), read(noted));
}

/** npm of the Node that runs us: the one that started us, or the one on the path. */
export const npmCommand = () => {
  const cli = process.env.npm_execpath;
  return cli?.endsWith('.js') ? [process.execPath, cli] : ['npm'];
};

/** Installs the npm packages when they are missing or the lock file changed. */
export async function ensureNpmPackages() {
  const hash = hashOf([inRoot('package-lock.json')]);
  if (upToDate(hash)) {
    setStamp('npm', hash);
    return 'up to date';
  }
  // On a full disk an install script may die in ways that say nothing of the disk.
  if (freeMegabytes(root) < needMegabytes) throw diskFull();
  setStamp('npm', '');
  // npm puts its own note back last, so without it an interrupted installation is seen as one.
  rmSync(inRoot('node_modules/.package-lock.json'), { force: true });
  const [npm, ...cli] = npmCommand();
  const args = [...cli, 'ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
  try {
    await run(npm, args, { cwd: root, log: 'npm-ci' });
  } catch (error) {
    if (error instanceof CommandFailed && /ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ETIMEDOUT/.test(error.output)) {
      throw new Fault(
        'The npm registry cannot be reached.',
        `${tail(error.output, 5)}\nCheck the network, then try again.`,
      );
    }
    throw error;
  }
  setStamp('npm', hash);
  return 'installed';
}
