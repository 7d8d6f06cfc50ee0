import assert from 'node:assert/strict';
import { test } from 'node:test';
import { nodeSuits } from '../src/node-version.mjs';

const cases = [
  ['20.20.0', '20.20', true],
  ['20.20.2', '20.20', true],
  ['20.31.0', '20.20', true],
  ['20.19.9', '20.20', false],
  ['20.9.0', '20.20', false],
  ['22.1.0', '20.20', false],
  ['18.20.4', '20.20', false],
  ['20.20.1', 'v20.20.2', false],
  ['20.0.0', '20', true],
];

for (const [actual, wanted, suits] of cases) {
  test(`Node ${actual} ${suits ? 'suits' : 'does not suit'} ${wanted}`, () => {
    assert.equal(nodeSuits(actual, wanted), suits);
  });
}
