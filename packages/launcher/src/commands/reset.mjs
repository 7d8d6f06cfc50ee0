import { reset } from '../database.mjs';
import { Fault } from '../fault.mjs';
import { ensureDatabase } from '../postgres/databases.mjs';
import { prepareBuild, prepareCluster, prepareFolders, preparePackages } from '../preparation.mjs';
import { takeLock } from '../run-lock.mjs';
import { loadEnvFile, standIns } from '../settings.mjs';
import { forgetPayments } from '../stack.mjs';
import { step } from '../steps.mjs';

/** Fresh demo data in our own cluster; never touches a database that the reader named. */
export async function resetDemoData() {
  loadEnvFile();
  prepareFolders();
  if (!standIns(process.env).cluster) {
    throw new Fault(
      'DATABASE_URL is set, and a reset would empty that database.',
      'Unset it to reset the demo data in Linkfell’s own cluster.',
    );
  }
  const other = takeLock('start');
  if (other)
    throw new Fault('Linkfell is running from this folder.', `Stop it first: Ctrl-C, or kill ${other.pid}`);
  console.log('Making fresh demo data');
  await preparePackages();
  await prepareBuild({ web: false });
  const cluster = await prepareCluster('cluster');
  const url = await ensureDatabase(cluster, 'linkfell');
  await step('Demo data', () => reset(url));
  forgetPayments();
  return 0;
}
