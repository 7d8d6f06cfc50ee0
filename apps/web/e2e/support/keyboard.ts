import { expect, type Page } from '@playwright/test';

/** What has the focus, in the words that a screen reader would say for it. */
const focused = (page: Page): Promise<string> =>
  page.evaluate(() => {
    const at = document.activeElement;
    if (!at || at === document.body) return '';
    const labels =
      'labels' in at ? [...(((at as HTMLInputElement).labels ?? []) as Iterable<HTMLElement>)] : [];
    const titled = document.getElementById(at.getAttribute('aria-labelledby') ?? '')?.textContent;
    const words =
      titled ?? at.getAttribute('aria-label') ?? labels.map(({ textContent }) => textContent).join(' ');
    return (words || at.textContent || '').replace(/\s+/g, ' ').trim();
  });

/** Goes on with Tab until what is named has the focus. */
export async function tabTo(page: Page, name: RegExp, most = 60): Promise<void> {
  const met: string[] = [];
  for (let presses = 0; presses < most; presses += 1) {
    const at = await focused(page);
    if (name.test(at)) return;
    met.push(at);
    await page.keyboard.press('Tab');
  }
  throw new Error(`${String(name)} is not reached by Tab; met: ${met.join(' | ')}`);
}

/** Types into the field of that name, over what is there. */
export async function typeInto(page: Page, name: RegExp, text: string): Promise<void> {
  await tabTo(page, name);
  await page.keyboard.press('ControlOrMeta+a');
  await page.keyboard.type(text);
}

/** Reaches a link or button and presses it. */
export async function press(page: Page, name: RegExp): Promise<void> {
  await tabTo(page, name);
  await page.keyboard.press('Enter');
}

/** Reaches a group of radios, where Tab stops once, and goes down to the one that is wanted. */
export async function pick(page: Page, group: RegExp, wanted: RegExp): Promise<void> {
  await tabTo(page, group);
  for (let presses = 0; presses < 12; presses += 1) {
    if (wanted.test(await focused(page))) {
      await page.keyboard.press('Space');
      return;
    }
    await page.keyboard.press('ArrowDown');
  }
  throw new Error(`${String(wanted)} is not among the choices`);
}

/** A new page is announced by its heading, which has the focus. */
export async function arrived(page: Page, heading: RegExp): Promise<void> {
  const title = page.getByRole('heading', { level: 1, name: heading });
  await expect(title).toBeVisible();
  await expect(title).toBeFocused();
}
