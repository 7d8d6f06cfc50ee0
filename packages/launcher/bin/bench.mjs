import { requireNode } from '../src/node-version.mjs';

requireNode();
const { runCommand } = await import('../src/lifecycle.mjs');
const { bench } = await import('../src/commands/bench.mjs');
await runCommand('The benchmark', bench);
