import AxeBuilder from '@axe-core/playwright';
import type { BrowserContext, Page } from '@playwright/test';
import { expect, test as base } from './support/stack';
import { makeThings, signInAsOwner, visits, type Things } from './support/visits';

interface House {
  things: Things;
  rider: BrowserContext;
  owner: BrowserContext;
}

const test = base.extend<object, { house: House }>({
  house: [
    async ({ browser, stack }, use) => {
      const options = { baseURL: stack.url, reducedMotion: 'reduce' as const, locale: 'en-GB' };
      const [rider, owner] = [await browser.newContext(options), await browser.newContext(options)];
      const things = await makeThings(rider.request, stack);
      await signInAsOwner(owner.request);
      await use({ things, rider, owner });
      await Promise.all([rider.close(), owner.close()]);
    },
    { scope: 'worker', timeout: 60_000 },
  ],
});

/** The second look at a size is about its colours only: all else is the same as in the first. */
const looks = [
  { width: 1280, colorScheme: 'light' },
  { width: 1280, colorScheme: 'dark', rules: ['color-contrast'] },
  { width: 360, colorScheme: 'dark' },
  { width: 360, colorScheme: 'light', rules: ['color-contrast'] },
] as const;

/** Takes out what is drawn inside the pictures, all but their words, or puts it back. */
const emptyPictures = (page: Page, empty: boolean) =>
  page.evaluate((out) => {
    for (const picture of document.querySelectorAll<SVGElement & { kept?: ChildNode[] }>('svg[role=img]')) {
      if (out) picture.kept = [...picture.childNodes];
      const kept = picture.kept ?? [];
      picture.replaceChildren(...kept.filter(({ nodeName }) => !out || ['title', 'desc'].includes(nodeName)));
    }
  }, empty);

/** A picture is one thing with a text alternative: axe would look at its thousands of lines for minutes. */
async function faults(page: Page, where: string, rules?: string[]): Promise<string[]> {
  const axe = new AxeBuilder({ page }).setLegacyMode();
  await emptyPictures(page, true);
  const { violations } = await (rules ? axe.withRules(rules) : axe).analyze();
  await emptyPictures(page, false);
  return violations.map(({ id, nodes }) => `${where} ${id}: ${nodes.map(({ html }) => html).join(' ')}`);
}

/** Nothing but a picture of data may be scrolled sideways. */
async function tooWide(page: Page, where: string): Promise<string[]> {
  const { width, seen } = await page.evaluate(() => ({
    width: document.documentElement.scrollWidth,
    seen: document.documentElement.clientWidth,
  }));
  return width > seen ? [`${where} is ${width} px wide at ${seen}`] : [];
}

/** What the browser complains of. The API may say that something is not there; files may not be missing. */
function listen(page: Page, found: string[]): void {
  page.on('pageerror', (error) => found.push(`thrown: ${error.message}`));
  page.on('console', (message) => {
    const refused = message.text().startsWith('Failed to load resource');
    if (message.type() === 'error' && !refused) found.push(`console: ${message.text()}`);
  });
  page.on('response', (answer) => {
    const api = new URL(answer.url()).pathname.startsWith('/api/');
    if (answer.status() >= (api ? 500 : 400)) found.push(`${answer.status()}: ${answer.url()}`);
  });
}

/** What has skeletons or a bar of progress is not there yet. */
async function arrived(page: Page): Promise<void> {
  await page.locator('h1').first().waitFor();
  await expect(page.locator('[aria-busy=true]')).toHaveCount(0);
}

for (const [route, { who, paths }] of Object.entries(visits)) {
  test(`${route} has no fault that axe finds, fits 320 px and complains of nothing`, async ({ house }) => {
    const page = await house[who].newPage();
    const found: string[] = [];
    listen(page, found);
    for (const path of paths(house.things)) {
      await page.goto(path);
      await arrived(page);
      for (const { width, colorScheme, ...look } of looks) {
        await page.setViewportSize({ width, height: 900 });
        await page.emulateMedia({ colorScheme });
        await expect(page.locator('html')).toHaveClass(colorScheme);
        const rules = 'rules' in look ? [...look.rules] : undefined;
        found.push(...(await faults(page, `${path} (${width} px, ${colorScheme})`, rules)));
        found.push(...(await tooWide(page, path)));
      }
      await page.setViewportSize({ width: 320, height: 900 });
      found.push(...(await tooWide(page, path)));
    }
    await page.close();
    expect(found).toEqual([]);
  });
}
