import assert from 'node:assert/strict';
import { mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, test } from 'node:test';
import { hashOf } from '../src/hashes.mjs';

let folder;
const file = (name) => join(folder, name);
const hash = () => hashOf([folder], folder);

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'linkfell-test-'));
  writeFileSync(file('a.ts'), 'one');
  writeFileSync(file('b.ts'), 'two');
});
afterEach(() => rmSync(folder, { recursive: true }));

test('the same files give the same hash', () => assert.equal(hash(), hash()));

test('a changed, a new and a renamed file each give another', () => {
  const seen = [hash()];
  writeFileSync(file('a.ts'), 'One');
  seen.push(hash());
  writeFileSync(file('c.ts'), '');
  seen.push(hash());
  renameSync(file('c.ts'), file('d.ts'));
  seen.push(hash());
  assert.equal(new Set(seen).size, 4);
});

test('what is built or installed does not count', () => {
  const before = hash();
  for (const name of ['dist', 'node_modules']) {
    mkdirSync(file(name));
    writeFileSync(file(`${name}/x.js`), 'x');
  }
  assert.equal(hash(), before);
});

test('a missing path is no error', () => {
  assert.equal(hashOf([file('none')], folder), hashOf([], folder));
});
