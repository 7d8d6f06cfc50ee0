import assert from 'node:assert/strict';
import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, test } from 'node:test';
import { readPostmaster, runningPostmaster, servesFolder } from '../src/postgres/postmaster.mjs';

let folder;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'linkfell-test-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

const note = (pid) =>
  writeFileSync(
    join(folder, 'postmaster.pid'),
    `${pid}\n${folder}\n1764576000\n41809\n\n127.0.0.1\n  123  0\nready   \n`,
  );

test('reads pid, port and status', () => {
  note(4242);
  assert.deepEqual(readPostmaster(folder), { pid: 4242, port: 41809, status: 'ready' });
});

test('no note means no server', () => {
  assert.equal(runningPostmaster(folder), undefined);
});

test('a note whose pid is now another program is removed', () => {
  note(process.pid);
  assert.equal(runningPostmaster(folder), undefined);
  assert.equal(existsSync(join(folder, 'postmaster.pid')), false);
});

test('a server counts only on its own data folder', () => {
  const command = ['/usr/lib/postgresql/15/bin/postgres', '-D', '/srv/a/.local/cluster'];
  assert.equal(servesFolder(command, '/srv/a/.local/cluster'), true);
  assert.equal(servesFolder(command, '/srv/b/.local/cluster'), false);
  assert.equal(servesFolder(['/bin/sh', '-D', '/srv/a/.local/cluster'], '/srv/a/.local/cluster'), false);
});
