import type { Browser, Page } from '@playwright/test';
import { planByApi } from './support/by-api';
import { fillContact, payWith } from './support/rider';
import { expect, test, type Stack } from './support/stack';

const shock = 'vellacott-tarn-210x50';

/** Two riders with the same wish, each in a browser of their own, their contact filled in. */
async function twoRiders(browser: Browser, stack: Stack, choices: object): Promise<Page[]> {
  return Promise.all(
    ['isa', 'rab'].map(async (name) => {
      const context = await browser.newContext({ baseURL: stack.url, locale: 'en-GB' });
      const { planId } = await planByApi(context.request, shock, choices);
      const page = await context.newPage();
      await page.goto(`/plans/${planId}`);
      await fillContact(page, `${name}@rider.example`);
      return page;
    }),
  );
}

/** Both press Pay at the same moment: the page of the one who holds, and of the one who was a moment later. */
async function bothPay(pages: Page[]): Promise<{ first: Page; second: Page }> {
  await Promise.all(pages.map((page) => page.getByRole('button', { name: /^Pay £/ }).click()));
  const paying = await Promise.all(
    pages.map((page) =>
      Promise.race([
        page
          .getByText('Test payment page')
          .first()
          .waitFor()
          .then(() => true),
        page
          .getByRole('alert')
          .waitFor()
          .then(() => false),
      ]),
    ),
  );
  expect([...paying].sort()).toEqual([false, true]);
  const [first, second] = paying[0] ? pages : [...pages].reverse();
  if (!first || !second) throw new Error('two riders are needed');
  return { first, second };
}

const stillTyped = async (page: Page) => {
  await expect(page.getByLabel('Name')).toHaveValue('Wren Hollis');
  await expect(page.getByLabel('Postcode')).toHaveValue('QF1 9ZZ');
};

test('the last unit: one rider buys it, the other is told kindly and keeps the plan', async ({
  browser,
  stack,
}) => {
  const { rows } = {
    rows: await stack.sql(`SELECT id FROM listings WHERE item_id = $1 ORDER BY id`, [shock]),
  };
  await stack.sql(`UPDATE listings SET quantity = reserved WHERE item_id = $1`, [shock]);
  await stack.sql(`UPDATE listings SET quantity = reserved + 1 WHERE id = $1`, [rows[0]?.id]);
  const { first, second } = await bothPay(await twoRiders(browser, stack, { fit: 'self' }));

  await expect(second.getByRole('alert')).toContainText(/has just (been sold|sold out)/);
  await expect(second.getByRole('alert')).toContainText('Your plan and answers are kept');
  await expect(second.getByText('Sold out everywhere at the moment.', { exact: true })).toBeVisible();
  await stillTyped(second);
  await second.getByRole('link', { name: 'Back to the fitting sheet' }).click();
  await expect(second.getByRole('heading', { level: 1, name: /Withen/ })).toBeVisible();

  await payWith(first, '4242424242424242');
  await expect(first.getByText(/A confirmation is on its way/)).toBeVisible();
  const [left] = await stack.sql(`SELECT quantity, reserved FROM listings WHERE id = $1`, [rows[0]?.id]);
  expect(left?.quantity).toBeGreaterThanOrEqual(Number(left?.reserved));
  await stack.sql(`UPDATE listings SET quantity = reserved + 9 WHERE item_id = $1`, [shock]);
  await Promise.all([first.context().close(), second.context().close()]);
});

test('the last slot: one rider gets it, the other is offered the next and pays for that', async ({
  browser,
  stack,
}) => {
  await stack.sql(`UPDATE listings SET quantity = reserved + 9 WHERE item_id = $1`, [shock]);
  // A workshop of its own for this test, with one stand left: the same hour cannot be had twice.
  const workshop = 'thornrigg-bike-clinic';
  const [stand] = await stack.sql(`SELECT id FROM stands WHERE organisation_id = $1 ORDER BY id LIMIT 1`, [
    workshop,
  ]);
  await stack.sql(`DELETE FROM stands WHERE organisation_id = $1 AND id <> $2`, [workshop, stand?.id]);
  const choices = { fit: 'workshop', workshopId: workshop };
  const { first, second } = await bothPay(await twoRiders(browser, stack, choices));

  await expect(second.getByRole('alert')).toContainText('That date has just been taken');
  await stillTyped(second);
  await payWith(first, '4242424242424242');
  await expect(first.getByText(/A confirmation is on its way/)).toBeVisible();

  await second.getByRole('group', { name: 'Start' }).getByRole('radio').first().check();
  await second.getByRole('button', { name: /^Pay £/ }).click();
  await payWith(second, '4242424242424242');
  await expect(second.getByText(/A confirmation is on its way/)).toBeVisible();
  const stands = await stack.sql(
    `SELECT count(*)::int AS n FROM bookings WHERE stand_id = $1 AND state = 'requested'`,
    [stand?.id],
  );
  expect(stands).toEqual([{ n: 2 }]);
  const overlapping = await stack.sql(
    `SELECT count(*)::int AS n FROM bookings a JOIN bookings b
     ON a.stand_id = b.stand_id AND a.id < b.id AND a.during && b.during
     WHERE a.state IN ('held', 'requested', 'accepted', 'fitted') AND b.state IN ('held', 'requested', 'accepted', 'fitted')`,
  );
  expect(overlapping).toEqual([{ n: 0 }]);
  await Promise.all([first.context().close(), second.context().close()]);
});
