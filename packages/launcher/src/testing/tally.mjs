/**
 * What a runner's own result file says.
 * @typedef {{passed: number, failed: number, failures: string[]}} Tally
 */

const titles = (list) => list.filter(Boolean);

/** vitest and jest write the same form. A skipped test counts as failed: it proves nothing. */
function tallyJest(text) {
  const report = JSON.parse(text);
  const skipped = report.numPendingTests + (report.numTodoTests ?? 0);
  const brokenFiles = report.testResults.filter(
    (file) => file.status === 'failed' && !file.assertionResults.some(({ status }) => status === 'failed'),
  );
  const failedTests = report.testResults.flatMap((file) =>
    file.assertionResults
      .filter(({ status }) => status !== 'passed')
      .map(({ status, fullName }) => (status === 'failed' ? fullName : `${fullName} (${status})`)),
  );
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + skipped + brokenFiles.length,
    failures: titles([...brokenFiles.map((file) => `${file.name} does not run`), ...failedTests]),
  };
}

function playwrightFailures(suite, path = []) {
  const here = [...path, suite.title];
  const own = (suite.specs ?? []).filter(
    ({ ok, tests }) => !ok || tests.some(({ status }) => status !== 'expected'),
  );
  return [
    ...own.map(({ title }) => [...here, title].filter(Boolean).join(' › ')),
    ...(suite.suites ?? []).flatMap((inner) => playwrightFailures(inner, here)),
  ];
}

/** A flaky test counts as failed, like a skipped one. */
function tallyPlaywright(text) {
  const { stats, suites, errors = [] } = JSON.parse(text);
  return {
    passed: stats.expected,
    failed: stats.unexpected + stats.flaky + stats.skipped + errors.length,
    failures: suites.flatMap((suite) => playwrightFailures(suite)),
  };
}

/** The counts at the end of node:test's TAP. */
function tallyTap(text) {
  const count = (word) => Number(new RegExp(`^# ${word} (\\d+)$`, 'm').exec(text)?.[1] ?? Number.NaN);
  const passed = count('pass');
  const failed = count('fail') + count('cancelled') + count('skipped') + count('todo');
  if (Number.isNaN(passed + failed)) throw new SyntaxError('no counts at the end of the TAP');
  return {
    passed,
    failed,
    failures: [...text.matchAll(/^\s*not ok \d+ - (.*)$/gm)].map((match) => match[1]),
  };
}

const readers = { vitest: tallyJest, jest: tallyJest, playwright: tallyPlaywright, tap: tallyTap };

/**
 * Counts of one runner. Whatever went wrong without a failed test (a crash, no result file, no test at all) counts
 * as one failed.
 * @param {string} form which runner's form `text` has
 * @param {string | undefined} text the result file, undefined when there is none
 * @param {number} exitCode
 * @returns {Tally}
 */
export function tally(form, text, exitCode) {
  if (form === 'check')
    return { passed: exitCode === 0 ? 1 : 0, failed: exitCode === 0 ? 0 : 1, failures: [] };
  let counts;
  try {
    counts = readers[form](text ?? '');
  } catch (error) {
    return { passed: 0, failed: 1, failures: [`left no readable results: ${error.message}`] };
  }
  if (counts.passed + counts.failed === 0) return { passed: 0, failed: 1, failures: ['ran no test'] };
  if (exitCode !== 0 && counts.failed === 0) {
    return { ...counts, failed: 1, failures: [`ended with exit status ${exitCode}`] };
  }
  return counts;
}

/** Sums tallies and says them in the form of the last line. */
export function sum(tallies) {
  const total = (key) => tallies.reduce((all, one) => all + one[key], 0);
  const [passed, failed] = [total('passed'), total('failed')];
  return { passed, failed, line: `${passed} passed, ${failed} failed` };
}
