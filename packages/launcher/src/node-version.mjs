import { readFileSync } from 'node:fs';

/**
 * True when `actual` (as in process.versions.node) has the major version of `wanted` (as in .nvmrc)
 * and is not older than it.
 */
export function nodeSuits(actual, wanted) {
  const parse = (text) => text.trim().replace(/^v/, '').split('.').map(Number);
  const [major, minor = 0, patch = 0] = parse(actual);
  const [wantedMajor, wantedMinor = 0, wantedPatch = 0] = parse(wanted);
  if (major !== wantedMajor) return false;
  return minor > wantedMinor || (minor === wantedMinor && patch >= wantedPatch);
}

/**
 * Ends the process with a plain message when this Node is the wrong one. Runs before any other module is
 * loaded, because those use syntax that an old Node cannot even read.
 */
export function requireNode() {
  const wanted = readFileSync(new URL('../../../.nvmrc', import.meta.url), 'utf8').trim();
  const actual = process.versions.node;
  if (nodeSuits(actual, wanted)) return;
  const major = wanted.split('.')[0];
  console.error(
    'Linkfell needs Node ' +
      wanted +
      ' or a later ' +
      major +
      '.x; this is Node ' +
      actual +
      '.\n' +
      'Install Node ' +
      major +
      ', for example with "nvm install" in this folder, and run the command again.',
  );
  process.exit(1);
}
