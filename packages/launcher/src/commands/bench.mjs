import { runOpenly } from '../children.mjs';
import { inRoot } from '../paths.mjs';
import { prepareBuild, prepareFolders, preparePackages } from '../preparation.mjs';
import { prepareTemplate } from '../testing/throwaway-cluster.mjs';

/** The engine by itself first, then the API on a cluster with the durability of a real one. */
export async function bench() {
  prepareFolders();
  console.log('Preparing the benchmark');
  await preparePackages();
  await prepareBuild({ web: false });
  const engine = await runOpenly(process.execPath, [inRoot('packages/fit-engine/bench/run.mjs')]);
  if (engine !== 0) return engine;
  const env = { ...process.env, ...(await prepareTemplate('bench', { safe: true })) };
  return runOpenly(process.execPath, [inRoot('apps/api/bench/run.mjs'), ...process.argv.slice(2)], { env });
}
