import { migrate, seed } from '../database.mjs';
import { Fault } from '../fault.mjs';
import { greeting } from '../greeting.mjs';
import { setQuietStop } from '../lifecycle.mjs';
import { portIn, loadEnvFile, standIns } from '../settings.mjs';
import { isFree } from '../ports.mjs';
import { prepareBuild, prepareCluster, prepareFolders, preparePackages } from '../preparation.mjs';
import { ensureDatabase } from '../postgres/databases.mjs';
import { inLocal } from '../paths.mjs';
import { takeLock } from '../run-lock.mjs';
import { secretsIn } from '../secrets.mjs';
import { startApi, startStandIns } from '../stack.mjs';
import { step } from '../steps.mjs';

/** Refuses to start twice from one clone, or on a port of another program. */
export async function claim(port) {
  const other = takeLock('start', { port });
  if (other) {
    throw new Fault(
      `Linkfell already runs from this folder, at http://localhost:${other.port} (process ${other.pid}).`,
      `Stop it first: Ctrl-C where it runs, or kill ${other.pid}`,
    );
  }
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Fault(
      `PORT is "${process.env.PORT}", which is no port.`,
      'Choose a number from 1024 to 65535.',
    );
  }
  if (await isFree(port)) return;
  throw new Fault(
    `Port ${port} is taken by another program.`,
    port < 1024
      ? `Ports below 1024 may need root. Choose another one: PORT=4310 npm start`
      : `Stop that program, or choose another port: PORT=${port + 10} npm start`,
  );
}

/** Database, schema and demo data: our own cluster, or the database that the reader named. */
export async function prepareDatabase() {
  if (!standIns(process.env).cluster) {
    const url = process.env.DATABASE_URL;
    await step('Migrations', () => migrate(url));
    return { url, secrets: secretsIn(inLocal()), demo: false };
  }
  const cluster = await prepareCluster('cluster');
  const url = await ensureDatabase(cluster, 'linkfell');
  await step('Migrations', () => migrate(url));
  await step('Demo data', () => seed(url));
  return { url, secrets: cluster.secrets, demo: true };
}

/** Everything that a run needs, the reader's settings read first. */
export async function start() {
  const began = Date.now();
  loadEnvFile();
  prepareFolders();
  const port = portIn(process.env);
  await claim(port);
  console.log('Starting Linkfell');
  await preparePackages();
  await prepareBuild();
  const { url, secrets, demo } = await prepareDatabase();
  const { made, inbox } = await startStandIns(secrets, port);
  const ours = { ...made, DATABASE_URL: url, SESSION_SECRET: secrets.sessionSecret };
  await startApi(ours);
  setQuietStop();
  const address = process.env.PUBLIC_URL || `http://localhost:${port}`;
  console.log(`  Ready after ${((Date.now() - began) / 1000).toFixed(1)} s.`);
  console.log(greeting({ address, inbox, demo, stripe: made.STRIPE_API_BASE !== undefined }));
  return new Promise(() => undefined);
}
