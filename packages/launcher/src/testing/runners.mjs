import { createRequire } from 'node:module';
import { join } from 'node:path';
import { tsc } from '../build.mjs';
import { inLocal, inRoot } from '../paths.mjs';

const minute = 60_000;

/** Where a runner writes its results. */
export const resultsOf = (name) => inLocal('results', `${name}.json`);

/** The entry file of a package's program as the folder `from` sees it. */
export function program(from, packageName, name = packageName) {
  const require = createRequire(inRoot(from, 'package.json'));
  const manifest = require.resolve(`${packageName}/package.json`);
  const { bin } = require(manifest);
  return join(manifest, '..', typeof bin === 'string' ? bin : bin[name]);
}

const vitest = (name, folder, needs = []) => ({
  name,
  folder,
  needs,
  form: 'vitest',
  minutes: 10,
  args: () => [
    program(folder, 'vitest'),
    ...['run', '--reporter=default', '--reporter=json', `--outputFile.json=${resultsOf(name)}`],
  ],
});

const check = (name, ...argLists) => ({ name, folder: '.', needs: [], form: 'check', minutes: 10, argLists });

/** The runners in the order in which they run: what is quick to tell comes first. */
export const runners = [
  check('lint', () => [program('.', 'eslint'), '.', '--max-warnings', '0']),
  check('format', () => [program('.', 'prettier'), '--check', '.', '--log-level', 'warn']),
  check(
    'types',
    () => [tsc, '-b'],
    ...['libraries', 'api', 'web'].map((part) => () => [tsc, '-p', `packages/launcher/types/${part}.json`]),
  ),
  {
    name: 'launcher',
    folder: 'packages/launcher',
    needs: [],
    form: 'tap',
    minutes: 3,
    args: () => [
      ...['--test', '--test-reporter=spec', '--test-reporter-destination=stdout'],
      ...['--test-reporter=tap', `--test-reporter-destination=${resultsOf('launcher')}`, 'test/'],
    ],
  },
  vitest('fit-engine', 'packages/fit-engine'),
  vitest('contracts', 'packages/contracts'),
  vitest('db', 'db', ['cluster']),
  vitest('fake-stripe', 'fakes/stripe'),
  vitest('fake-mail', 'fakes/mail'),
  vitest('web', 'apps/web'),
  {
    name: 'api',
    folder: 'apps/api',
    needs: ['cluster'],
    form: 'jest',
    minutes: 15,
    args: () => [program('apps/api', 'jest'), '--json', `--outputFile=${resultsOf('api')}`],
  },
  {
    name: 'e2e',
    folder: 'apps/web',
    needs: ['cluster', 'chromium', 'web'],
    form: 'playwright',
    minutes: 20,
    args: () => [program('apps/web', '@playwright/test', 'playwright'), 'test', '--reporter=list,json'],
  },
].map((runner) => ({ ...runner, timeoutMs: runner.minutes * minute }));

/**
 * The runners that a command line asks for.
 * @param {string | undefined} only names, separated by commas; undefined for all
 * @throws {RangeError} when a name is unknown
 */
export function chooseRunners(only) {
  if (only === undefined) return runners;
  const names = only.split(',').map((name) => name.trim());
  const unknown = names.find((name) => !runners.some((runner) => runner.name === name));
  if (unknown !== undefined) {
    throw new RangeError(
      `There is no runner "${unknown}"; there are ${runners.map(({ name }) => name).join(', ')}.`,
    );
  }
  return runners.filter((runner) => names.includes(runner.name));
}
