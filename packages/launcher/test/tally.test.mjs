import assert from 'node:assert/strict';
import { test } from 'node:test';
import { sum, tally } from '../src/testing/tally.mjs';

const jest = (changes) =>
  JSON.stringify({
    numPassedTests: 2,
    numFailedTests: 0,
    numPendingTests: 0,
    testResults: [
      { name: 'a.spec.ts', status: 'passed', assertionResults: [{ status: 'passed', fullName: 'a' }] },
    ],
    ...changes,
  });
const playwright = (stats) =>
  JSON.stringify({
    stats: { expected: 1, unexpected: 0, flaky: 0, skipped: 0, ...stats },
    suites: [],
    errors: [],
  });
const tap = (counts) =>
  ['pass', 'fail', 'cancelled', 'skipped', 'todo'].map((word) => `# ${word} ${counts[word] ?? 0}`).join('\n');

const counts = ({ passed, failed }) => [passed, failed];

for (const form of ['jest', 'vitest']) {
  test(`${form}: counts what passed`, () => assert.deepEqual(counts(tally(form, jest(), 0)), [2, 0]));
}

test('a failed test is counted and named', () => {
  const assertionResults = [{ status: 'failed', fullName: 'adds up' }];
  const text = jest({ numFailedTests: 1, testResults: [{ name: 'a', status: 'failed', assertionResults }] });
  assert.deepEqual(tally('jest', text, 1), { passed: 2, failed: 1, failures: ['adds up'] });
});

test('a file that does not load counts as failed', () => {
  const text = jest({ testResults: [{ name: 'b.spec.ts', status: 'failed', assertionResults: [] }] });
  assert.deepEqual(tally('vitest', text, 1), { passed: 2, failed: 1, failures: ['b.spec.ts does not run'] });
});

test('a skipped test counts as failed', () => {
  const assertionResults = [{ status: 'pending', fullName: 'later' }];
  const text = jest({ numPendingTests: 1, testResults: [{ name: 'a', status: 'passed', assertionResults }] });
  assert.deepEqual(tally('jest', text, 0), { passed: 2, failed: 1, failures: ['later (pending)'] });
  assert.deepEqual(counts(tally('playwright', playwright({ skipped: 1 }), 0)), [1, 1]);
  assert.deepEqual(counts(tally('tap', tap({ pass: 3, skipped: 1 }), 0)), [3, 1]);
});

test('a flaky browser test counts as failed', () => {
  assert.deepEqual(counts(tally('playwright', playwright({ flaky: 1 }), 0)), [1, 1]);
});

test('a browser test that fails is named with its path', () => {
  const specs = [{ title: 'pays', ok: false, tests: [{ status: 'unexpected' }] }];
  const text = JSON.stringify({
    stats: { expected: 0, unexpected: 1, flaky: 0, skipped: 0 },
    suites: [{ title: 'guest.spec.ts', specs: [], suites: [{ title: 'a rider', specs }] }],
  });
  assert.deepEqual(tally('playwright', text, 1).failures, ['guest.spec.ts › a rider › pays']);
});

test('a runner without results has failed', () => {
  for (const form of ['jest', 'vitest', 'playwright', 'tap']) {
    assert.deepEqual(counts(tally(form, undefined, 0)), [0, 1], form);
  }
});

test('a runner that ran nothing has failed', () => {
  assert.deepEqual(counts(tally('jest', jest({ numPassedTests: 0, testResults: [] }), 0)), [0, 1]);
  assert.deepEqual(counts(tally('playwright', playwright({ expected: 0 }), 0)), [0, 1]);
  assert.deepEqual(counts(tally('tap', tap({}), 0)), [0, 1]);
});

test('a crash after the last test counts as failed', () => {
  assert.deepEqual(counts(tally('jest', jest(), 134)), [2, 1]);
});

test('a check counts as one', () => {
  assert.deepEqual(counts(tally('check', undefined, 0)), [1, 0]);
  assert.deepEqual(counts(tally('check', undefined, 2)), [0, 1]);
});

test('the last line sums all', () => {
  const tallies = [
    { passed: 3, failed: 0 },
    { passed: 4, failed: 2 },
  ];
  assert.deepEqual(sum(tallies), { passed: 7, failed: 2, line: '7 passed, 2 failed' });
});
