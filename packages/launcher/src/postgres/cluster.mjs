import { chownSync, existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { run } from '../children.mjs';
import { CommandFailed, Fault } from '../fault.mjs';
import { diskFull, saysDiskFull, tail } from '../messages.mjs';
import { freePort } from '../ports.mjs';
import { secretsIn } from '../secrets.mjs';
import { requireOwnData, serverIds } from './owner.mjs';
import { endPostmaster, runningPostmaster } from './postmaster.mjs';
import { databaseUrl, psql } from './psql.mjs';

export const adminRole = 'linkfell_admin';

/** Settings of every server of ours: loopback only, no socket files, no code made at run time. */
const common = ['listen_addresses=127.0.0.1', 'unix_socket_directories=', 'jit=off'];

/** For data that is thrown away: speed before safety. Never for a cluster whose data matters. */
export const throwaway = [
  'fsync=off',
  'synchronous_commit=off',
  'full_page_writes=off',
  'wal_level=minimal',
  'max_wal_senders=0',
  'max_connections=300',
];

async function makeCluster({ postgres, data, ids, secrets }) {
  const making = `${data}.making`;
  const passwordFile = `${data}.password`;
  rmSync(making, { recursive: true, force: true });
  mkdirSync(making, { mode: 0o700 });
  writeFileSync(passwordFile, secrets.adminPassword, { mode: 0o600 });
  if (ids.uid !== undefined) for (const path of [making, passwordFile]) chownSync(path, ids.uid, ids.gid);
  try {
    await run(
      join(postgres.bin, 'initdb'),
      ['-D', making, '-U', adminRole, `--pwfile=${passwordFile}`, '--auth=scram-sha-256'].concat([
        '--locale=C.UTF-8',
        '-E',
        'UTF8',
        '--no-sync',
      ]),
      { ...ids, cwd: '/', env: postgres.env, log: 'initdb' },
    );
  } finally {
    rmSync(passwordFile, { force: true });
  }
  // Only a complete data folder gets the name under which the next start looks for it.
  renameSync(making, data);
}

const serverLog = (data) => {
  try {
    return readFileSync(join(data, 'server.log'), 'utf8');
  } catch {
    return '';
  }
};

async function startServer({ postgres, data, ids, settings }) {
  for (let attempt = 1; ; attempt += 1) {
    const port = await freePort();
    const options = [`port=${port}`, ...common, ...settings].map((setting) => `-c ${setting}`).join(' ');
    const args = ['start', '-w', '-t', '60', '-s', '-D', data, '-l', join(data, 'server.log'), '-o', options];
    rmSync(join(data, 'server.log'), { force: true });
    try {
      // The server inherits what pg_ctl has open: with a pipe we would wait for the server's end.
      await run(join(postgres.bin, 'pg_ctl'), args, { ...ids, cwd: '/', env: postgres.env, stdio: 'ignore' });
      return port;
    } catch (error) {
      if (!(error instanceof CommandFailed)) throw error;
      const said = serverLog(data);
      if (saysDiskFull({ output: said })) throw diskFull(data);
      if (/Address already in use/.test(said) && attempt < 3) continue;
      throw new Fault('Our PostgreSQL server does not start.', `${tail(said)}\nIts data folder: ${data}`);
    }
  }
}

async function answers(postgres, url) {
  try {
    await psql(postgres, url, 'select 1');
    return true;
  } catch {
    return false;
  }
}

/**
 * Makes and starts a cluster of ours, or takes over the one that a killed run left running.
 * @param {object} options
 * @param {string} options.home folder below which the data folder lies
 * @param {string} options.name name of the data folder
 * @param {string[]} [options.settings] further server settings, `name=value`
 * @returns {Promise<{port: number, adminUrl: string, url: Function, secrets: object, note: string}>}
 */
export async function openCluster({ postgres, home, name, settings = [] }) {
  const ids = serverIds();
  const data = join(home, name);
  requireOwnData(data, ids);
  const made = !existsSync(join(data, 'PG_VERSION'));
  const secrets = secretsIn(home);
  if (made) await makeCluster({ postgres, data, ids, secrets });

  const urlOn = (port) => (database) =>
    databaseUrl({ role: adminRole, password: secrets.adminPassword, port, database });
  const left = runningPostmaster(data);
  const adopted = left !== undefined && (await answers(postgres, urlOn(left.port)('postgres')));
  if (left && !adopted) await endPostmaster(left.pid);
  const port = adopted ? left.port : await startServer({ postgres, data, ids, settings });
  const url = urlOn(port);
  if (!adopted && !(await answers(postgres, url('postgres')))) {
    await endCluster(home, name);
    throw new Fault(
      `The password kept in ${join(home, 'secrets.json')} does not open the data folder ${data}.`,
      `Put the right file back, or move the data folder away for fresh demo data.`,
    );
  }
  const how = adopted ? 'taken over from a killed run' : made ? 'made and started' : 'started';
  return { postgres, port, url, adminUrl: url('postgres'), secrets, made, note: `${how}, port ${port}` };
}

/** Ends the server that runs on a data folder of ours, if any. */
export async function endCluster(home, name) {
  const running = runningPostmaster(join(home, name));
  if (running) await endPostmaster(running.pid);
}

/** Ends what runs on a throw-away data folder and deletes it. */
export async function discardCluster(home, name) {
  requireOwnData(join(home, name));
  await endCluster(home, name);
  rmSync(join(home, name), { recursive: true, force: true });
}
