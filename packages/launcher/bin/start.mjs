import { requireNode } from '../src/node-version.mjs';

requireNode();
const { runCommand } = await import('../src/lifecycle.mjs');
const { start } = await import('../src/commands/start.mjs');
await runCommand('Linkfell', start);
