import { requireNode } from '../src/node-version.mjs';

requireNode();
const { runCommand } = await import('../src/lifecycle.mjs');
const { dev } = await import('../src/commands/dev.mjs');
await runCommand('Linkfell', dev);
