import { spawn } from 'node:child_process';
import { closeSync, openSync, readFileSync, writeSync } from 'node:fs';
import { CommandFailed } from './fault.mjs';
import { inLocal } from './paths.mjs';
import { waitUntil } from './processes.mjs';

const living = new Set();

/**
 * Spawns a process in a group of its own, so that a Ctrl-C in the terminal reaches only us and we end the
 * children in the right order. It is remembered until it ends.
 */
export function launch(command, args, options = {}) {
  const child = spawn(command, args, { stdio: ['ignore', 'pipe', 'pipe'], ...options, detached: true });
  living.add(child);
  child.ended = new Promise((resolve) => {
    const end = (outcome) => {
      living.delete(child);
      resolve(outcome);
    };
    child.once('error', (error) => end({ error }));
    child.once('close', (code, signal) => end({ code, signal }));
  });
  return child;
}

function signalGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
    return true;
  } catch {
    return false;
  }
}

/** Asks a child and its own children to end, and makes them after `graceMs`. */
export async function endChild(child, graceMs = 10_000) {
  if (!child?.pid) return;
  signalGroup(child, 'SIGTERM');
  // Signal 0 asks whether the group still has a member: a grandchild may outlive the child that we spawned.
  const gone = await waitUntil(() => !signalGroup(child, 0), graceMs);
  if (!gone) signalGroup(child, 'SIGKILL');
  await child.ended;
}

/** Ends all children that still live. */
export const endAllChildren = () => Promise.all([...living].map((child) => endChild(child)));

/** An environment in which programs print no colours. */
export function colourless(env = process.env) {
  const plain = { ...env, NO_COLOR: '1' };
  delete plain.FORCE_COLOR;
  return plain;
}

/**
 * Runs a command to its end, its output in `.local/logs/<log>.log` only; `input` goes to its standard input.
 * @returns {Promise<string>} the last 64 KB of its output
 * @throws {CommandFailed} when it does not end with 0, or not in time
 */
export async function run(command, args, { log, timeoutMs, append = false, input, ...options } = {}) {
  const logPath = log ? inLocal('logs', `${log}.log`) : undefined;
  const file = logPath ? openSync(logPath, append ? 'a' : 'w') : undefined;
  let output = '';
  const stdio = options.stdio ?? [input === undefined ? 'ignore' : 'pipe', 'pipe', 'pipe'];
  const child = launch(command, args, { ...options, env: colourless(options.env), stdio });
  child.stdin?.on('error', () => undefined).end(input);
  const keep = (chunk) => {
    if (file !== undefined) writeSync(file, chunk);
    output = (output + chunk.toString()).slice(-65_536);
  };
  child.stdout?.on('data', keep);
  child.stderr?.on('data', keep);
  const timer = timeoutMs ? setTimeout(() => void endChild(child), timeoutMs) : undefined;
  const { code, signal, error } = await child.ended;
  clearTimeout(timer);
  if (file !== undefined) closeSync(file);
  if (code !== 0) {
    const how = error?.message ?? signal ?? `exit status ${code}`;
    throw new CommandFailed([command, ...args.slice(0, 3)].join(' '), how, output, logPath);
  }
  return output;
}

/** Runs a command to its end on our own terminal and tells its exit status (a signal counts as 1). */
export async function runOpenly(command, args, { timeoutMs, ...options } = {}) {
  const child = launch(command, args, { stdio: ['ignore', 'inherit', 'inherit'], ...options });
  let late = false;
  const timer = setTimeout(() => {
    late = true;
    void endChild(child);
  }, timeoutMs ?? 3_600_000);
  const { code, error } = await child.ended;
  clearTimeout(timer);
  if (error) console.error(error.message);
  if (late) console.error(`Ended after ${Math.round((timeoutMs ?? 0) / 60_000)} minutes.`);
  return late || error ? 1 : (code ?? 1);
}

/** What a log file holds, or nothing. */
export function readLog(name) {
  try {
    return readFileSync(inLocal('logs', `${name}.log`), 'utf8');
  } catch {
    return '';
  }
}
