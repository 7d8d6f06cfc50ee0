import assert from 'node:assert/strict';
import { test } from 'node:test';
import { chooseRunners, runners } from '../src/testing/runners.mjs';
import { leftovers } from '../src/testing/throwaway-cluster.mjs';

test('all runners by default, in their order', () => {
  assert.deepEqual(chooseRunners(undefined), runners);
});

test('chosen runners keep the order of the whole', () => {
  assert.deepEqual(
    chooseRunners('api, fit-engine').map(({ name }) => name),
    ['fit-engine', 'api'],
  );
});

test('an unknown runner is refused by name', () => {
  assert.throws(() => chooseRunners('api,apo'), /no runner "apo"/);
});

test('every runner of tests but the checks knows what to start', () => {
  for (const runner of runners) {
    const lists = runner.argLists ?? [runner.args];
    for (const args of lists)
      assert.ok(
        args().every((arg) => typeof arg === 'string'),
        runner.name,
      );
  }
});

test('only clusters of runs that are over are swept', () => {
  const names = [
    'test-cluster-10-500',
    'test-cluster-11-600',
    'test-cluster-12-700',
    'test-cluster',
    'cluster',
    'bench-cluster-13-1',
  ];
  const began = (pid) => ({ 10: '500', 11: '601' })[pid];
  // 10 still runs, 11 is another process by now, 12 is gone.
  assert.deepEqual(leftovers('test', names, began), ['test-cluster-11-600', 'test-cluster-12-700']);
});
