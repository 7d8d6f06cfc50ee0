import { createHash } from 'node:crypto';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { startTestApp, type TestApp } from '../support/app.js';

const hash = (text: string) => `'sha256-${createHash('sha256').update(text).digest('base64')}'`;

describe('the web app', () => {
  let folder: string;
  let app: TestApp;

  beforeAll(async () => {
    folder = mkdtempSync(join(tmpdir(), 'linkfell-web-'));
    writeFileSync(join(folder, '..', 'linkfell-outside.html'), 'outside');
    for (const part of ['assets', 'help']) mkdirSync(join(folder, part));
    writeFileSync(
      join(folder, 'index.html'),
      '<!doctype html><title>Linkfell</title><script>early()</script><div>',
    );
    writeFileSync(
      join(folder, 'help', 'index.html'),
      '<!doctype html><title>Help</title><style>p{margin:0}</style>',
    );
    writeFileSync(join(folder, 'assets', 'app-4f3a.js'), 'export {}');
    writeFileSync(join(folder, 'mark.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
    app = await startTestApp({ WEB_DIST: folder });
  });
  afterAll(async () => {
    await app.close();
    rmSync(folder, { recursive: true });
    rmSync(join(tmpdir(), 'linkfell-outside.html'));
  });

  const title = async (path: string) =>
    /<title>(.*)<\/title>/.exec((await app.client().get(path).expect(200)).text)?.[1];

  it('answers every address of the router with the page, prerendered where there is one', async () => {
    expect(await title('/')).toBe('Linkfell');
    expect(await title('/measure-up/7/stroke')).toBe('Linkfell');
    expect(await title('/help')).toBe('Help');
    expect(await title('/help/')).toBe('Help');
    expect(await title('/help/index.html')).toBe('Linkfell');
    expect(await title('/%E0%A4%A')).toBe('Linkfell');
    expect(await title('/..%2Flinkfell-outside.html')).toBe('Linkfell');
  });

  it('lets nothing inline run or style but what the build wrote into that very page', async () => {
    const policy = async (path: string) =>
      (await app.client().get(path)).headers['content-security-policy']?.split('; ') ?? [];
    const front = await policy('/');
    expect(front).toContain(`script-src 'self' ${hash('early()')}`);
    expect(front).toContain(`style-src 'self' ${hash('')}`);
    const help = await policy('/help');
    expect(help).toContain(`script-src 'self'`);
    expect(help).toContain(`style-src 'self' ${hash('')} ${hash('p{margin:0}')}`);
    for (const rule of [
      `object-src 'none'`,
      `base-uri 'none'`,
      `frame-ancestors 'none'`,
      `form-action 'self'`,
    ]) {
      expect(front).toContain(rule);
    }
  });

  it('lets hashed files be kept for ever, and nothing else', async () => {
    const control = async (path: string) =>
      (await app.client().get(path).expect(200)).headers['cache-control'];
    expect(await control('/assets/app-4f3a.js')).toBe('public, max-age=31536000, immutable');
    expect(await control('/mark.svg')).toBe('no-cache');
    expect(await control('/')).toBe('no-cache');
  });

  it('has no page for a missing file, for the API or for a change', async () => {
    await app.client().get('/assets/old-1111.js').expect(404);
    const api = await app.client().get('/api/nothing').expect(404);
    expect(api.headers['content-type']).toMatch(/problem\+json/);
    await app.client().post('/measure-up').send({}).expect(404);
  });
});
