import { expect, type Page } from '@playwright/test';

const next = (page: Page) => page.getByRole('button', { name: 'Continue' }).click();
const heading = (page: Page, text: string | RegExp) =>
  expect(page.getByRole('heading', { level: 1, name: text })).toBeVisible();

/** From the front page through every question to the list of all answers. */
export async function measureUp(page: Page, frame = 'Withen 140,'): Promise<void> {
  await page.goto('/');
  await page
    .getByRole('link', { name: /Start your measure-up/ })
    .first()
    .click();
  await page.getByRole('button', { name: 'Start', exact: true }).click();
  await heading(page, 'Which frame is it?');
  await page.getByLabel('Maker, model or year').fill(frame.replace(',', ''));
  await page.getByRole('radio', { name: new RegExp(frame) }).check();
  await page.getByLabel('Model year').selectOption({ index: 1 });
  await next(page);
  await heading(page, /Is its size printed/);
  await page.getByLabel('Size as printed').fill('50 x 210');
  await next(page);
  await heading(page, /How far apart/);
  await page.getByLabel('Eye-to-eye').fill('209,6');
  await next(page);
  await heading(page, 'How far does it shorten?');
  await page.getByRole('button', { name: 'I don’t know' }).click();
  await heading(page, /two ends/);
  await page
    .getByRole('group', { name: 'Body end' })
    .getByRole('radio', { name: /^Eyelet/ })
    .check();
  await page
    .getByRole('group', { name: 'Shaft end' })
    .getByRole('radio', { name: /^Eyelet/ })
    .check();
  await next(page);
  for (const title of [/Which hardware/, /How thick/, /air or a coil/, /worked from the bar/]) {
    await heading(page, title);
    await page.getByRole('button', { name: 'I don’t know' }).click();
  }
  await heading(page, /Air, coil/);
  await next(page);
  await heading(page, 'What do you weigh?');
  await page.getByLabel('You', { exact: true }).fill('80');
  await next(page);
  await heading(page, /bike weigh/);
  await page.getByLabel('Whole bike').fill('14.5');
  await next(page);
  await heading(page, 'How do you ride?');
  await page.getByRole('radio', { name: /Trail/ }).check();
  await next(page);
  await heading(page, /from the bar/);
  await page.getByRole('radio', { name: 'No', exact: true }).check();
  await next(page);
  await heading(page, /reservoir/);
  await next(page);
  await heading(page, /cost/);
  await page.getByRole('button', { name: 'I don’t know' }).click();
  await heading(page, 'Where are you?');
  await page.getByLabel('Nearest town').selectOption('skelhow');
  await next(page);
  await heading(page, 'Check your answers');
}

/** From the list of answers to a plan for the first shock that bolts straight in. */
export async function planFirst(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Show what fits' }).click();
  await heading(page, /Withen/);
  await page
    .getByRole('link', { name: /Vellacott Tarn/ })
    .locator('visible=true')
    .first()
    .click();
  await expect(page.getByRole('heading', { name: 'All checks' })).toBeVisible();
  await page.getByRole('button', { name: 'Plan this shock' }).click();
  await expect(page.getByRole('heading', { name: 'What it costs' })).toBeVisible();
}

export async function fillContact(page: Page, email: string): Promise<void> {
  await page.getByLabel('Name').fill('Wren Hollis');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Telephone').fill('01632 960123');
  await page.getByLabel('Street and number').fill('1 Beck Lane');
  await page.getByLabel('Town').fill('Skelhow');
  await page.getByLabel('Postcode').fill('QF1 9ZZ');
  await page.getByLabel(/I accept the/).check();
}

export async function payWith(page: Page, number: string): Promise<void> {
  await expect(page.getByText('Test payment page').first()).toBeVisible();
  await page.locator('input[name=number]').fill(number);
  await page.locator('input[name=expiry]').fill('12/39');
  await page.locator('input[name=cvc]').fill('123');
  const name = page.locator('input[name=name]');
  if (await name.isVisible()) await name.fill('Wren Hollis');
  await page.getByRole('button', { name: /^Pay/ }).click();
}

export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await heading(page, 'Your desk');
}
