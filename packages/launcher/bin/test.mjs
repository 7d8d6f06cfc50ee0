import { requireNode } from '../src/node-version.mjs';

requireNode();
const { runCommand } = await import('../src/lifecycle.mjs');
const { test } = await import('../src/commands/test.mjs');
await runCommand('The test run', test);
