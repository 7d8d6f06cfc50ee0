import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { Fault } from '../fault.mjs';
import { cloneId, local, makeFolder } from '../paths.mjs';

/** The ids of a user from /etc/passwd, as spawn takes them. */
export function idsOf(name, passwd = readFileSync('/etc/passwd', 'utf8')) {
  const line = passwd.split('\n').find((one) => one.startsWith(`${name}:`));
  if (!line) throw new Fault(`There is no user ${name} on this machine.`);
  const [, , uid, gid] = line.split(':');
  return { uid: Number(uid), gid: Number(gid) };
}

/** Who runs the server: user postgres when we are root (the server refuses root), else ourselves (nothing to set). */
export const serverIds = () => (process.getuid() === 0 ? idsOf('postgres') : {});

const reaches = (folder, ids) =>
  spawnSync('/usr/bin/test', ['-x', folder], { ...ids, cwd: '/' }).status === 0;

/**
 * The folder below which data folders lie: `.local`, or a folder under /var/lib when user postgres cannot pass
 * through to the clone (one under a private home, say).
 * @returns {{home: string, fellBack: boolean}}
 */
export function dataHome(ids = serverIds()) {
  if (ids.uid === undefined || reaches(local, ids)) return { home: local, fellBack: false };
  const home = makeFolder(join('/var/lib', `linkfell-${cloneId}`));
  if (!reaches(home, ids)) {
    throw new Fault(
      `User postgres reaches neither ${local} nor ${home}.`,
      'Put the clone where other users may pass through, /srv/linkfell for example, and start it there.',
    );
  }
  return { home, fellBack: true };
}

/** Refuses a data folder of somebody else, which the server could not read. */
export function requireOwnData(folder, ids = serverIds()) {
  if (!existsSync(folder)) return;
  const owner = statSync(folder).uid;
  const expected = ids.uid ?? process.getuid();
  if (owner === expected) return;
  const was = process.getuid() === 0 ? 'an ordinary user' : 'root or another user';
  throw new Fault(
    `The data folder ${folder} cannot be used: it belongs to user ${owner}, not to user ${expected}.`,
    `Linkfell was started here as ${was} before. Start it as that user again, or move the folder away\n` +
      `(as root: mv ${folder} ${folder}.old) to begin with fresh demo data.`,
  );
}
