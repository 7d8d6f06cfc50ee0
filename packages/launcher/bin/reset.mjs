import { requireNode } from '../src/node-version.mjs';

requireNode();
const { runCommand } = await import('../src/lifecycle.mjs');
const { resetDemoData } = await import('../src/commands/reset.mjs');
await runCommand('The reset', resetDemoData);
