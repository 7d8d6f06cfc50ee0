import { tsc } from '../build.mjs';
import { greeting } from '../greeting.mjs';
import { setQuietStop } from '../lifecycle.mjs';
import { inRoot } from '../paths.mjs';
import { freePort } from '../ports.mjs';
import { prepareBuild, prepareFolders, preparePackages } from '../preparation.mjs';
import { apiMemory, launchWatching, startServer, untilItAnswers } from '../servers.mjs';
import { apiEnvironment, loadEnvFile, portIn } from '../settings.mjs';
import { startStandIns } from '../stack.mjs';
import { program } from '../testing/runners.mjs';
import { claim, prepareDatabase } from './start.mjs';

/** The API, started afresh after each compilation without errors; it may end by itself while it is worked on. */
function restartingApi(env) {
  let server;
  let work = Promise.resolve();
  const restart = async () => {
    await server?.stop();
    server = startServer('api', 'apps/api/dist/main.js', env, { vital: false, show: true, node: apiMemory });
    try {
      await untilItAnswers(server, `http://127.0.0.1:${env.PORT}/health/ready`);
      console.log(`API ready on port ${env.PORT}`);
    } catch (error) {
      console.error(error.message);
    }
  };
  return () => (work = work.then(restart));
}

function watchCompiler(onCompiled) {
  const child = launchWatching([tsc, '-b', '--watch', '--preserveWatchOutput']);
  let first = true;
  child.stdout.on('data', (chunk) => {
    process.stdout.write(chunk);
    if (!/Found 0 errors/.test(chunk.toString())) return;
    // The first one finds what was just built.
    if (!first) void onCompiled();
    first = false;
  });
}

function startVite(port, apiUrl) {
  const args = [program('apps/web', 'vite'), '--port', String(port), '--strictPort'];
  launchWatching(args, {
    cwd: inRoot('apps/web'),
    env: { ...process.env, API_URL: apiUrl },
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
}

/** Everything as `start` does, with a compiler that watches, an API that restarts and Vite's server in front. */
export async function dev() {
  loadEnvFile();
  prepareFolders();
  const port = portIn(process.env);
  await claim(port);
  console.log('Starting Linkfell for development');
  await preparePackages();
  await prepareBuild({ web: false });
  const { url, secrets, demo } = await prepareDatabase();
  const apiPort = await freePort(port + 10);
  const { made, inbox } = await startStandIns(secrets, apiPort);
  const ours = { ...made, NODE_ENV: 'development', DATABASE_URL: url, SESSION_SECRET: secrets.sessionSecret };
  const restart = restartingApi({
    ...process.env,
    ...apiEnvironment(process.env, ours),
    PORT: String(apiPort),
  });
  await restart();
  watchCompiler(restart);
  startVite(port, `http://127.0.0.1:${apiPort}`);
  setQuietStop();
  console.log(
    greeting({ address: `http://localhost:${port}`, inbox, demo, stripe: Boolean(made.STRIPE_API_BASE) }),
  );
  return new Promise(() => undefined);
}
