import { runOpenly } from '../children.mjs';
import { inRoot } from '../paths.mjs';
import { prepareBuild, prepareFolders, preparePackages } from '../preparation.mjs';
import { prepareTemplate } from '../testing/throwaway-cluster.mjs';

/** Prepares a cluster with the durability of a real one and runs the benchmark of the API on it. */
export async function bench() {
  prepareFolders();
  console.log('Preparing the benchmark');
  await preparePackages();
  await prepareBuild({ web: false });
  const env = { ...process.env, ...(await prepareTemplate('bench', { safe: true })) };
  return runOpenly(process.execPath, [inRoot('apps/api/bench/run.mjs'), ...process.argv.slice(2)], { env });
}
