import assert from 'node:assert/strict';
import { test } from 'node:test';
import { CommandFailed, Fault } from '../src/fault.mjs';
import { explain, saysDiskFull } from '../src/messages.mjs';

test('a fault says what happened and what to do', () => {
  assert.equal(
    explain(new Fault('Port 4310 is taken.', 'Choose another.\nOr wait.')),
    'Port 4310 is taken.\n  Choose another.\n  Or wait.',
  );
});

for (const said of [
  'ENOSPC: no space left on device, write',
  'could not extend file: No space left on device',
]) {
  test(`a full disk is recognised in "${said}"`, () => {
    const error = new CommandFailed('npm ci', 'exit status 1', said);
    assert.equal(saysDiskFull(error), true);
    assert.match(explain(error), /^The disk is full, or nearly: \d+ MB free at /);
  });
}

test('a full disk is recognised by its code', () => {
  assert.equal(saysDiskFull(Object.assign(new Error('write'), { code: 'ENOSPC' })), true);
});

test('a failed command shows the end of what it printed and where the rest is', () => {
  const output = Array.from({ length: 50 }, (_, i) => `line ${i}`).join('\n');
  const text = explain(new CommandFailed('initdb', 'exit status 1', output, '/log'));
  assert.match(text, /^initdb ended with exit status 1\.\n/);
  assert.match(text, /line 49/);
  assert.doesNotMatch(text, /line 29\n/);
  assert.match(text, /All of it: \/log/);
});

test('a missing permission names the file', () => {
  const error = Object.assign(new Error('x'), { code: 'EACCES', path: '/srv/clone/.local' });
  assert.match(explain(error), /^No permission for \/srv\/clone\/\.local\./);
});
