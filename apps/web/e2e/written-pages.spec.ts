import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Page } from '@playwright/test';
import type { Server } from 'node:http';
import { routeList } from '../src/app/route-list';
import { serveWrittenPages } from './support/written-pages';

const written = routeList.filter(({ prerendered }) => prerendered).map(({ path }) => path);
const pages = [...written, '/nothing/here'];

let url: string;
let server: Server;
test.beforeAll(async () => ({ url, server } = await serveWrittenPages()));
test.afterAll(() => new Promise((closed) => server.close(closed)));

/** What the browser complained about: hydration that differs, scripts refused, files missing. */
function complaints(page: Page): string[] {
  const all: string[] = [];
  page.on('console', (message) => message.type() === 'error' && all.push(message.text()));
  page.on('pageerror', (error) => all.push(error.message));
  return all;
}

const arrived = (page: Page) => page.locator('h1').waitFor();

for (const colorScheme of ['light', 'dark'] as const) {
  for (const path of pages) {
    test(`${path} has no fault that axe finds, in ${colorScheme} mode`, async ({ page }) => {
      const heard = complaints(page);
      await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
      await page.goto(url + path);
      await arrived(page);
      await expect(page.locator('html')).toHaveClass(colorScheme);
      const { violations } = await new AxeBuilder({ page }).analyze();
      expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' ')}`)).toEqual(
        [],
      );
      expect(heard).toEqual([]);
    });
  }
}

for (const path of pages) {
  test(`${path} fits 320 px, its targets are large enough, nothing jumps`, async ({ page }) => {
    await page.setViewportSize({ width: 320, height: 700 });
    await page.addInitScript(() => {
      Object.assign(window, { shifted: 0 });
      new PerformanceObserver((list) => {
        for (const entry of list.getEntries()) {
          const { value } = entry as PerformanceEntry & { value: number };
          Object.assign(window, { shifted: (window as unknown as { shifted: number }).shifted + value });
        }
      }).observe({ type: 'layout-shift', buffered: true });
    });
    await page.goto(url + path);
    await arrived(page);
    await page.waitForLoadState('networkidle');
    const { width, small, shifted } = await page.evaluate(() => ({
      width: document.documentElement.scrollWidth,
      // Links in running text are exempt (WCAG 2.2, 2.5.8); the skip link is out of sight until it has the focus.
      small: [...document.querySelectorAll('header a, header label, footer a, button, main a[class]')]
        // What is not shown at this width is no target.
        .filter((element) => element.checkVisibility() && getComputedStyle(element).display !== 'inline')
        .filter((element) => element.getBoundingClientRect().height < 44)
        .map((element) => element.textContent),
      shifted: (window as unknown as { shifted: number }).shifted,
    }));
    expect(width).toBe(320);
    expect(small).toEqual([]);
    expect(shifted).toBeLessThanOrEqual(0.02);
  });
}

test('the page stands before any script has run', async ({ browser }) => {
  const context = await browser.newContext({ javaScriptEnabled: false });
  const page = await context.newPage();
  await page.goto(url);
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Find the rear shock that fits your bike');
  await expect(page.getByRole('link', { name: 'Start your measure-up' })).toBeVisible();
  await expect(page.getByRole('img', { name: /deciding dimensions/ })).toBeVisible();
  await context.close();
});

test('the choice of colours outlives a reload and wins over the system', async ({ page }) => {
  await page.emulateMedia({ colorScheme: 'light' });
  await page.goto(url);
  await page.getByTitle('Dark').click();
  await expect(page.locator('html')).toHaveClass('dark');
  await page.reload();
  await expect(page.locator('html')).toHaveClass('dark');
  await page.getByTitle('Same as system').click();
  await expect(page.locator('html')).toHaveClass('light');
  await page.emulateMedia({ colorScheme: 'dark' });
  await expect(page.locator('html')).toHaveClass('dark');
});

test('in forced colours the drawing and what is chosen use the reader’s own', async ({ page }) => {
  await page.emulateMedia({ forcedColors: 'active', reducedMotion: 'reduce' });
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme });
    await page.goto(url);
    await arrived(page);
    const { drawn, own, chosen, others } = await page.evaluate(() => {
      const own = ['CanvasText', 'Canvas', 'LinkText'].map((name) => {
        // A new element each time: one that changes its colour would still be on its way to it.
        const probe = document.createElement('p');
        probe.style.color = name;
        document.body.append(probe);
        return getComputedStyle(probe).color;
      });
      const line = (label: Element) => getComputedStyle(label).borderBottomColor;
      const labels = [...document.querySelectorAll('header label')];
      return {
        own,
        drawn: [...document.querySelectorAll('main svg[role=img] path, header svg path')].flatMap((path) => {
          const { stroke, fill } = getComputedStyle(path);
          return [stroke, fill].filter((paint) => paint.startsWith('rgb'));
        }),
        chosen: labels.filter((label) => label.querySelector(':checked')).map(line),
        others: labels.filter((label) => !label.querySelector(':checked')).map(line),
      };
    });
    expect(drawn.length).toBeGreaterThan(10);
    expect(drawn.filter((paint) => !own.includes(paint))).toEqual([]);
    expect(others).toEqual([own[1], own[1]]);
    expect(chosen).not.toEqual([own[1]]);
  }
});

test('by keyboard: skip the header, pause the drawing, follow a link to its heading', async ({ page }) => {
  await page.goto(url);
  await arrived(page);
  await page.keyboard.press('Tab');
  await expect(page.getByRole('link', { name: 'Skip to the page' })).toBeInViewport();
  await page.keyboard.press('Enter');
  await page.keyboard.press('Tab');
  await expect(page.getByRole('link', { name: 'Start your measure-up' })).toBeFocused();
  await page.keyboard.press('Tab');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('button', { name: 'Play' })).toBeFocused();
  await page.getByRole('link', { name: 'Returns', exact: true }).focus();
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { level: 1, name: 'Returns and refunds' })).toBeFocused();
  await expect(page).toHaveTitle('Returns and refunds – Linkfell');
});
