import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { ensureChromium } from '../chromium.mjs';
import { colourless, runOpenly } from '../children.mjs';
import { Fault } from '../fault.mjs';
import { explain } from '../messages.mjs';
import { inLocal, inRoot } from '../paths.mjs';
import { prepareBuild, prepareFolders, preparePackages } from '../preparation.mjs';
import { seconds, step } from '../steps.mjs';
import { chooseRunners, resultsOf } from '../testing/runners.mjs';
import { sum, tally } from '../testing/tally.mjs';
import { prepareTemplate } from '../testing/throwaway-cluster.mjs';

/** Settings of the reader's own start that must not change what the tests see. */
const foreign =
  /^(DATABASE_URL|STRIPE_|SMTP_URL|MAIL_FROM|PORT$|HOST$|PUBLIC_URL|SESSION_SECRET|WEB_DIST|NODE_ENV$|LOG_LEVEL|HOLD_MINUTES|TRUST_PROXY|WORKER$|RATE_LIMIT_SCALE)/;

function options() {
  const { values } = parseArgs({
    options: { only: { type: 'string' }, keep: { type: 'boolean' }, long: { type: 'boolean' } },
  });
  try {
    return { ...values, chosen: chooseRunners(values.only) };
  } catch (error) {
    throw new Fault(error.message);
  }
}

async function prepare(chosen, keep) {
  const needed = (what) => chosen.some(({ needs }) => needs.includes(what));
  await preparePackages();
  const env = {};
  if (needed('cluster')) {
    await prepareBuild({ web: needed('web') });
    Object.assign(env, await prepareTemplate('test', { keep }));
  }
  if (needed('chromium')) env.CHROMIUM_PATH = (await step('Chromium', ensureChromium)).path;
  return env;
}

async function runOne(runner, env) {
  console.log(`\n=== ${runner.name} ===`);
  const began = Date.now();
  const results = resultsOf(runner.name);
  rmSync(results, { force: true });
  let exitCode = 0;
  for (const args of runner.argLists ?? [runner.args]) {
    const options = { cwd: inRoot(runner.folder), env, timeoutMs: runner.timeoutMs };
    const code = await runOpenly(process.execPath, args(), options);
    exitCode ||= code;
  }
  const text = existsSync(results) ? readFileSync(results, 'utf8') : undefined;
  return { name: runner.name, ms: Date.now() - began, ...tally(runner.form, text, exitCode) };
}

function report(outcomes) {
  console.log('\n=== summary ===');
  for (const { name, passed, failed, ms, failures } of outcomes) {
    const counts = `${String(passed).padStart(6)} passed ${String(failed).padStart(5)} failed`;
    console.log(`  ${name.padEnd(12)} ${counts}  ${seconds(ms).padStart(8)}`);
    for (const failure of failures.slice(0, 20)) console.log(`      failed: ${failure}`);
  }
}

async function prepareOrExplain(chosen, keep) {
  try {
    console.log('Preparing the tests');
    prepareFolders();
    mkdirSync(inLocal('results'), { recursive: true });
    return await prepare(chosen, keep);
  } catch (error) {
    console.error(`\nThe tests could not be prepared. ${explain(error)}\n\n0 passed, 1 failed`);
    return undefined;
  }
}

/** Runs the tests; the last line says how many passed and failed, and the exit status agrees with it. */
export async function test() {
  const { chosen, keep, long } = options();
  const made = await prepareOrExplain(chosen, keep);
  if (!made) return 1;
  const own = Object.fromEntries(Object.entries(process.env).filter(([name]) => !foreign.test(name)));
  const env = { ...(process.stdout.isTTY ? own : colourless(own)), ...made, LINKFELL_LONG: long ? '1' : '' };
  const outcomes = [];
  for (const runner of chosen) {
    const file = resultsOf(runner.name);
    const results = { PLAYWRIGHT_JSON_OUTPUT_FILE: file, PLAYWRIGHT_JSON_OUTPUT_NAME: file };
    outcomes.push(await runOne(runner, { ...env, ...results }));
  }
  report(outcomes);
  if (keep && made.TEST_DATABASE_ADMIN_URL) {
    console.log(`\nThe test cluster stays up: TEST_DATABASE_ADMIN_URL=${made.TEST_DATABASE_ADMIN_URL}`);
  }
  const { failed, line } = sum(outcomes);
  console.log(`\n${line}`);
  return failed === 0 ? 0 : 1;
}
