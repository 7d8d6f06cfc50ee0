import assert from 'node:assert/strict';
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { test } from 'node:test';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { isAlive, waitUntil } from '../src/processes.mjs';

const watch = pathToFileURL(fileURLToPath(new URL('../src/watch-launcher.mjs', import.meta.url))).href;

test('a server ends when its launcher is killed outright', async () => {
  const folder = mkdtempSync(join(tmpdir(), 'linkfell-test-'));
  const server = join(folder, 'server.mjs');
  const launcher = join(folder, 'launcher.mjs');
  writeFileSync(server, 'setInterval(() => {}, 1000);');
  writeFileSync(
    launcher,
    `import { spawn } from 'node:child_process';
     const child = spawn(process.execPath, ['--import', ${JSON.stringify(watch)}, ${JSON.stringify(server)}], {
       detached: true, stdio: ['ignore', 'ignore', 'ignore', 'ipc'] });
     console.log(child.pid);
     setInterval(() => {}, 1000);`,
  );
  const parent = spawn(process.execPath, [launcher], { stdio: ['ignore', 'pipe', 'inherit'] });
  const [line] = await once(parent.stdout, 'data');
  const pid = Number(line.toString());
  assert.equal(isAlive(pid), true);
  parent.kill('SIGKILL');
  try {
    assert.equal(await waitUntil(() => !isAlive(pid), 10_000), true);
  } finally {
    rmSync(folder, { recursive: true });
    if (isAlive(pid)) process.kill(pid, 'SIGKILL');
  }
});
