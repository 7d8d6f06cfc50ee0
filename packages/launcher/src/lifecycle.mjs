import { endAllChildren } from './children.mjs';
import { explain } from './messages.mjs';
import { commandOf, parentOf, startOf } from './processes.mjs';

const cleanups = [];
let ending;

/** Registers what must be undone when the command ends, however it ends; the last one registered runs first. */
export function onEnd(cleanup) {
  cleanups.push(cleanup);
}

async function runCleanups() {
  while (cleanups.length > 0) {
    const cleanup = cleanups.pop();
    try {
      await cleanup();
    } catch (error) {
      console.error(explain(error));
    }
  }
  await endAllChildren();
}

/** Ends the command: undoes what was registered, then exits. A second call waits for the first. */
export function end(exitCode) {
  ending ??= runCleanups().then(() => process.exit(exitCode));
  return ending;
}

/** npm above us: our parent, or its parent when npm started us through a shell. */
function npmAbove() {
  const parent = process.ppid;
  const throughShell = /(^|\/)(sh|dash|bash)$/.test(commandOf(parent)[0] ?? '');
  return throughShell ? parentOf(parent) : parent;
}

/**
 * npm forwards Ctrl-C but not its own violent death. When we were started through npm and it goes away, we end too,
 * so that no stack is left running without a terminal.
 */
function watchNpm(stop) {
  if (!process.env.npm_lifecycle_event) return;
  const npm = npmAbove();
  const began = startOf(npm);
  setInterval(() => {
    if (startOf(npm) !== began) stop('npm gone');
  }, 500).unref();
}

/**
 * Runs a command's work with signals, failures and clean-up taken care of. `work` returns the exit status, or
 * a promise that never settles for a command that runs until it is stopped. Being stopped means exit status 130,
 * or 0 after `setQuietStop()`.
 */
export async function runCommand(title, work) {
  const stop = (reason) => {
    if (ending) return;
    if (reason.startsWith('SIG')) console.log('\nStopping.');
    void end(quietStop ? 0 : 130);
  };
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => stop(signal));
  // A closed terminal or pipe must not keep us from cleaning up.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => stop('closed'));
  watchNpm(stop);
  try {
    await end(await work());
  } catch (error) {
    if (!ending) console.error(`\n${title} failed. ${explain(error)}`);
    await end(1);
  }
}

let quietStop = false;
/** From now on being stopped is the normal end of the command. */
export function setQuietStop() {
  quietStop = true;
}
