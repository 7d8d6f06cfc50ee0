import { createWriteStream } from 'node:fs';
import { pathToFileURL } from 'node:url';
import { endChild, launch, readLog } from './children.mjs';
import { Fault } from './fault.mjs';
import { end, onEnd } from './lifecycle.mjs';
import { tail } from './messages.mjs';
import { inLocal, inRoot, root } from './paths.mjs';

const watch = pathToFileURL(inRoot('packages/launcher/src/watch-launcher.mjs')).href;

/** The API stays below 300 MB under load: left alone, node lets garbage lie up to several times what is in use. */
export const apiMemory = ['--max-old-space-size=256', '--max-semi-space-size=8'];

/** Launches node with these arguments so that it ends when the launcher is killed. */
export const launchWatching = (args, options) =>
  launch(process.execPath, ['--import', watch, ...args], {
    cwd: root,
    stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
    ...options,
  });

/**
 * Starts one of our servers with node, its output in `.local/logs/<name>.log`, and ends it when the command ends.
 * Should it end by itself once it was ready, the whole command ends and says why.
 * @param {object} options
 * @param {boolean} [options.vital] false: it may end by itself
 * @param {boolean} [options.show] show its output on our terminal as well
 * @param {string[]} [options.node] arguments for node itself
 */
export function startServer(name, script, env, { vital = true, show = false, node = [] } = {}) {
  const log = createWriteStream(inLocal('logs', `${name}.log`));
  const child = launchWatching([...node, inRoot(script)], { env });
  for (const stream of [child.stdout, child.stderr]) {
    stream.on('data', (chunk) => log.write(chunk));
    if (show) stream.pipe(process.stdout, { end: false });
  }
  let stopping = false;
  let settled = false;
  const stop = () => {
    stopping = true;
    return endChild(child);
  };
  onEnd(stop);
  void child.ended.then(({ code, signal }) => {
    if (stopping || !settled || !vital) return;
    console.error(
      `\nThe ${name} ended by itself (${signal ?? `exit status ${code}`}):\n${tail(readLog(name))}`,
    );
    void end(1);
  });
  return { child, name, stop, settled: () => (settled = true) };
}

function fault(server) {
  return new Fault(
    `The ${server.name} does not start.`,
    `${tail(readLog(server.name))}\nAll of it: .local/logs/${server.name}.log`,
  );
}

/** Waits for the `{"ready":true}` line of a stand-in. */
export async function untilItSaysReady(server, ms = 20_000) {
  let text = '';
  const ready = new Promise((resolve) => {
    server.child.stdout.on('data', (chunk) => {
      text += chunk;
      if (/^\{.*"ready":\s*true.*\}$/m.test(text)) resolve(true);
    });
  });
  const timer = new Promise((resolve) => setTimeout(resolve, ms).unref());
  if ((await Promise.race([ready, server.child.ended.then(() => false), timer])) !== true)
    throw fault(server);
  server.settled();
}

/** Waits until an address answers 200. */
export async function untilItAnswers(server, url, ms = 60_000) {
  let ended = false;
  void server.child.ended.then(() => (ended = true));
  const until = Date.now() + ms;
  while (!ended && Date.now() < until) {
    try {
      const answer = await fetch(url, { signal: AbortSignal.timeout(2_000) });
      await answer.body?.cancel();
      if (answer.status === 200) return server.settled();
    } catch {
      // Not listening yet.
    }
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw fault(server);
}
