import { chmodSync, existsSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { run } from './children.mjs';
import { aptLine, installOnSystem } from './debian/system-packages.mjs';
import { libraryPath, unpackPackages } from './debian/unpacked-packages.mjs';
import { CommandFailed, Fault } from './fault.mjs';
import { diskFull, saysDiskFull, tail } from './messages.mjs';
import { inLocal } from './paths.mjs';

const onSystem = '/usr/bin/chromium';
const log = 'chromium-install';

const fontSettings = (tree, cache) => `<?xml version="1.0"?>
<!DOCTYPE fontconfig SYSTEM "fonts.dtd">
<fontconfig>
  <dir>${tree}/usr/share/fonts</dir>
  <dir>/usr/share/fonts</dir>
  <cachedir>${cache}</cachedir>
  <alias><family>sans-serif</family><prefer><family>DejaVu Sans</family></prefer></alias>
  <alias><family>serif</family><prefer><family>DejaVu Serif</family></prefer></alias>
  <alias><family>monospace</family><prefer><family>DejaVu Sans Mono</family></prefer></alias>
</fontconfig>
`;

/** Writes the program that runs an unpacked Chromium with its own libraries and fonts. */
function writeWrapper(tree) {
  const cache = inLocal('font-cache');
  const fonts = join(tree, 'linkfell-fonts.conf');
  const wrapper = join(tree, 'linkfell-chromium');
  mkdirSync(cache, { recursive: true });
  writeFileSync(fonts, fontSettings(tree, cache));
  writeFileSync(
    wrapper,
    `#!/bin/sh
export LD_LIBRARY_PATH="${libraryPath(tree)}" FONTCONFIG_FILE="${fonts}"
exec "${tree}/usr/lib/chromium/chromium" "$@"
`,
  );
  chmodSync(wrapper, 0o755);
  return wrapper;
}

/** Shows one page, which fails when a library or the sandbox of the machine is in the way. */
async function tryOut(path) {
  const profile = inLocal('chromium-try');
  const output = await run(
    path,
    [
      '--headless',
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-dev-shm-usage',
    ].concat(
      [
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
        `--user-data-dir=${profile}`,
      ],
      ['--dump-dom', 'data:text/html,<p>Linkfell</p>'],
    ),
    { log, append: true, timeoutMs: 60_000 },
  );
  if (!output.includes('<p>Linkfell</p>')) throw new CommandFailed(path, 'an empty page', output);
}

async function install() {
  if (process.getuid() === 0) {
    await installOnSystem(['chromium', 'fonts-dejavu-core'], log);
    return onSystem;
  }
  return writeWrapper(await unpackPackages(['chromium', 'fonts-dejavu-core'], 'chromium-dist', log));
}

/**
 * Finds Chromium for the browser tests: CHROMIUM_PATH, the system's, or one that is installed or unpacked now.
 * @returns {Promise<{path: string, note: string}>}
 */
export async function ensureChromium() {
  const given = process.env.CHROMIUM_PATH;
  if (given) {
    if (!existsSync(given)) throw new Fault(`CHROMIUM_PATH names ${given}, where there is nothing.`);
    return { path: given, note: given };
  }
  const unpacked = inLocal('chromium-dist/linkfell-chromium');
  for (const path of [onSystem, unpacked]) if (existsSync(path)) return { path, note: path };
  try {
    const path = await install();
    try {
      await tryOut(path);
    } catch (error) {
      // Not to be taken for a working one by the next run.
      rmSync(unpacked, { force: true });
      throw error;
    }
    return { path, note: `installed, ${path}` };
  } catch (error) {
    if (saysDiskFull(error)) throw diskFull();
    if (!(error instanceof CommandFailed)) throw error;
    throw new Fault(
      'Chromium, which the browser tests need, is missing and could not be installed.',
      `${tail(error.output, 8)}\nHave an administrator run:\n  ${aptLine(['chromium'])}\nThen run this again.`,
    );
  }
}
