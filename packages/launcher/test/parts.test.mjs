import assert from 'node:assert/strict';
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { createServer } from 'node:net';
import { test } from 'node:test';
import { sourcesOf } from '../src/build.mjs';
import { aptOptions } from '../src/debian/unpacked-packages.mjs';
import { accountLines } from '../src/greeting.mjs';
import { freePort, isFree } from '../src/ports.mjs';
import { idsOf } from '../src/postgres/owner.mjs';
import { databaseUrl } from '../src/postgres/psql.mjs';
import { isAlive, startOf, waitUntil } from '../src/processes.mjs';
import { seconds } from '../src/steps.mjs';

test('a compiled file is traced to its source, other files are left alone', () => {
  assert.deepEqual(sourcesOf('migrations/one.js'), ['migrations/one.ts', 'migrations/one.tsx']);
  assert.deepEqual(sourcesOf('one.d.ts.map'), ['one.ts', 'one.tsx']);
  assert.deepEqual(sourcesOf('data.json'), []);
  assert.deepEqual(sourcesOf('.tsbuildinfo'), []);
});

test('apt-get works in a folder of ours', () => {
  const options = aptOptions('/x/apt').filter((option) => option !== '-o');
  assert.ok(options.includes('Dir::State=/x/apt/state'));
  assert.ok(options.includes('Dir::Cache=/x/apt/cache'));
});

test('ids come from the passwd file', () => {
  const passwd = 'root:x:0:0:root:/root:/bin/bash\npostgres:x:101:104::/var/lib/postgresql:/bin/bash\n';
  assert.deepEqual(idsOf('postgres', passwd), { uid: 101, gid: 104 });
  assert.throws(() => idsOf('nobody-here', passwd), /no user nobody-here/);
});

test('a password with special letters survives the URL', () => {
  const url = new URL(databaseUrl({ role: 'r', password: 'a/b@c', port: 1, database: 'd' }));
  assert.equal(decodeURIComponent(url.password), 'a/b@c');
});

test('demo accounts are lined up', () => {
  const lines = accountLines([
    { email: 'a@b.example', password: 'long-one', who: 'shop' },
    { email: 'longer@b.example', password: 'x', who: 'workshop' },
  ]);
  assert.equal(lines[0].indexOf('shop'), lines[1].indexOf('workshop'));
});

test('times are short', () => {
  assert.equal(seconds(421), '0.4 s');
  assert.equal(seconds(75_400), '75 s');
});

test('a port with a listener is not free, and another one is given for it', async () => {
  const server = createServer().listen(0, '127.0.0.1');
  await once(server, 'listening');
  const { port } = server.address();
  assert.equal(await isFree(port), false);
  const other = await freePort(port);
  assert.notEqual(other, port);
  assert.equal(await isFree(other), true);
  server.close();
});

test('a process is alive until it has ended, and its start tells it from another', async () => {
  const child = spawn(process.execPath, ['-e', 'setTimeout(() => {}, 60000)']);
  assert.equal(isAlive(child.pid), true);
  assert.match(startOf(child.pid), /^\d+$/);
  child.kill('SIGKILL');
  assert.equal(await waitUntil(() => !isAlive(child.pid), 5_000), true);
});
