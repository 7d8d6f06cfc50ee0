import assert from 'node:assert/strict';
import { test } from 'node:test';
import { installedAgrees } from '../src/npm-packages.mjs';

const lock = {
  packages: {
    '': { name: 'root' },
    db: { name: 'part' },
    'node_modules/a': { version: '1.0.0' },
    'node_modules/part': { link: true },
    'node_modules/for-another-system': { version: '2.0.0', optional: true, os: ['aix'] },
    'apps/web/node_modules/a': { version: '2.0.0' },
  },
};
const installed = (changes) => ({
  packages: {
    'node_modules/a': { version: '1.0.0' },
    'node_modules/part': { link: true },
    'apps/web/node_modules/a': { version: '2.0.0' },
    ...changes,
  },
});

test('agrees when all is there but packages for other systems', () => {
  assert.equal(installedAgrees(lock, installed()), true);
});

test('disagrees when a package has another version', () => {
  assert.equal(installedAgrees(lock, installed({ 'node_modules/a': { version: '1.0.1' } })), false);
});

test('disagrees when a package of a workspace is missing', () => {
  assert.equal(installedAgrees(lock, installed({ 'apps/web/node_modules/a': undefined })), false);
});

test('disagrees when a workspace is not linked', () => {
  assert.equal(installedAgrees(lock, installed({ 'node_modules/part': { version: '1.0.0' } })), false);
});
