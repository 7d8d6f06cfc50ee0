import type { Page } from '@playwright/test';
import { planByApi } from './support/by-api';
import { expect, test } from './support/stack';

interface Wrong {
  question: string;
  /** Types or chooses what is wrong. */
  enter?: (page: Page) => Promise<void>;
  says: RegExp;
  /** What must still be there afterwards: label and text. */
  kept?: [label: string | RegExp, value: string];
}

const fill = (label: string | RegExp, text: string) => (page: Page) => page.getByLabel(label).fill(text);

/** For each step of the measure-up what a hurried rider gets wrong there. */
const mistakes: Record<string, Wrong[]> = {
  Frame: [{ question: 'frame', says: /frame/i }],
  'Present shock': [
    {
      question: 'printed-size',
      enter: fill('Size as printed', '212x99'),
      says: /A size looks like/,
      kept: ['Size as printed', '212x99'],
    },
    {
      question: 'eye-to-eye',
      enter: fill('Eye-to-eye', '20 metres'),
      says: /“20 metres” cannot be read/,
      kept: ['Eye-to-eye', '20 metres'],
    },
    {
      question: 'eye-to-eye',
      enter: fill('Eye-to-eye', '999'),
      says: /longer than any/,
      kept: ['Eye-to-eye', '999'],
    },
    {
      question: 'stroke',
      enter: fill('Reading', 'about five'),
      says: /“about five” cannot be read/,
      kept: ['Reading', 'about five'],
    },
    { question: 'mounts', says: /body end/ },
    {
      question: 'hardware',
      enter: fill('Width at the frame end (optional)', '30'),
      says: /bolt at the frame end/,
      kept: ['Width at the frame end (optional)', '30'],
    },
    {
      question: 'can-diameter',
      enter: fill('Diameter', '5'),
      says: /shorter than any/,
      kept: ['Diameter', '5'],
    },
    { question: 'present-spring', says: /spring/ },
    { question: 'present-remote', says: /remote/ },
  ],
  'You and your riding': [
    { question: 'weight', enter: fill('You', '8000'), says: /200 kg or less/, kept: ['You', '8000'] },
    {
      question: 'weight',
      enter: fill('You', 'rather heavy'),
      says: /“rather heavy” cannot be read/,
      kept: ['You', 'rather heavy'],
    },
    {
      question: 'bike-mass',
      enter: fill('Whole bike', '1,45'),
      says: /7 kg or more/,
      kept: ['Whole bike', '1,45'],
    },
    { question: 'style', says: /mostly/ },
    { question: 'remote-wish', says: /remote/ },
    { question: 'budget', enter: fill('At most', '3'), says: /50/, kept: ['At most', '3'] },
    { question: 'place', says: /from the list/ },
  ],
};

for (const [step, wrongs] of Object.entries(mistakes)) {
  test(`${step}: wrong input is told at its field, and nothing typed is lost`, async ({ page }) => {
    for (const { question, enter, says, kept } of wrongs) {
      await test.step(question, async () => {
        const made = await page.request.post('/api/measure-ups', {
          data: {},
          headers: { 'X-Linkfell-Csrf': '1', 'Sec-Fetch-Site': 'same-origin' },
        });
        const { id } = (await made.json()) as { id: string };
        await page.goto(`/measure-up/${id}/${question}`);
        await enter?.(page);
        await page.getByRole('button', { name: 'Continue' }).click();
        const alert = page.getByRole('alert');
        await expect(alert).toContainText('need');
        await expect(alert.getByRole('link').first()).toHaveText(says);
        await expect(page).toHaveTitle(/^Error:/);
        await expect(page).toHaveURL(new RegExp(`/${question}$`));
        // The link leads to the field, and the field says the same.
        await alert.getByRole('link').first().click();
        const at = page.locator(':focus');
        await expect(at).toBeVisible();
        if (kept) await expect(page.getByLabel(kept[0], { exact: true })).toHaveValue(kept[1]);
      });
    }
  });
}

test('Pay: each field of the contact is told, and what was right stays', async ({ page }) => {
  const { planId } = await planByApi(page.request, 'vellacott-tarn-210x50', { fit: 'self' });
  await page.goto(`/plans/${planId}`);
  await page.getByLabel('Name').fill('Wren Hollis');
  await page.getByLabel('E-mail').fill('wren at rider');
  await page.getByRole('button', { name: /^Pay £/ }).click();
  await expect(page.getByRole('alert').getByRole('link')).toHaveCount(6);
  await expect(page.getByLabel('E-mail')).toHaveAttribute('aria-invalid', 'true');
  await expect(page.getByLabel('E-mail')).toHaveValue('wren at rider');
  await expect(page.getByLabel('Name')).toHaveValue('Wren Hollis');
});

test('Find my order: a wrong reference is told kindly, without saying which of the two is wrong', async ({
  page,
}) => {
  await page.goto('/find-order');
  await page.getByLabel('Reference').fill('LF-0000AAAA');
  await page.getByLabel('E-mail').fill('wren@rider.example');
  await page.getByRole('button', { name: 'Find it' }).click();
  await expect(page.getByRole('alert')).toBeVisible();
  await expect(page.getByLabel('Reference')).toHaveValue('LF-0000AAAA');
});
