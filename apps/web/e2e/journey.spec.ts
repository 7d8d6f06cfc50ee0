import { readFileSync } from 'node:fs';
import { fillContact, measureUp, payWith, planFirst, signIn } from './support/rider';
import { expect, test } from './support/stack';

const accounts = JSON.parse(
  readFileSync(new URL('../../../db/seeds/demo-accounts.json', import.meta.url), 'utf8'),
) as {
  email: string;
  password: string;
  organisation?: string;
  memberRole?: string;
}[];
const ownerOf = (organisation: string) => {
  const found = accounts.find(
    (account) => account.organisation === organisation && account.memberRole === 'owner',
  );
  if (!found) throw new Error(`nobody owns ${organisation}`);
  return found;
};

for (const width of [360, 1280]) {
  test(`guest rider from the front page to fitted, at ${width} px`, async ({ page, stack, browser }) => {
    test.setTimeout(300_000);
    await page.setViewportSize({ width, height: 900 });
    const email = `wren-${width}@rider.example`;
    await measureUp(page);
    await planFirst(page);
    await fillContact(page, email);
    await page.getByRole('button', { name: /^Pay £/ }).click();
    await payWith(page, '4242424242424242');
    await expect(page.getByText(/A confirmation is on its way/)).toBeVisible();
    const reference = new URL(page.url()).pathname.split('/').at(-1) ?? '';
    await expect
      .poll(() => stack.mail.messages().some(({ to, subject }) => to.includes(email) && /paid/.test(subject)))
      .toBe(true);

    const [booking] = await stack.sql(
      `SELECT b.workshop_id, b.id FROM bookings b JOIN orders o ON o.id = b.order_id WHERE o.reference = $1`,
      [reference],
    );
    const workshop = ownerOf(String(booking?.workshop_id));
    const desk = await (await browser.newContext({ viewport: { width, height: 900 } })).newPage();
    await signIn(desk, workshop.email, workshop.password);
    await desk.getByRole('link', { name: 'Fittings' }).first().click();
    await desk.locator(`a[href$="${String(booking?.id)}"]`).click();
    await desk.getByRole('button', { name: 'Accept the fitting' }).click();
    await expect(desk.getByText('Not all parcels are sent yet.')).toBeVisible();
    await expect
      .poll(
        () =>
          stack.mail.messages().find(({ to, subject }) => to.includes(email) && /agreed/.test(subject))
            ?.calendars[0]?.method,
      )
      .toBe('REQUEST');

    const shops = await stack.sql(
      `SELECT p.shop_id FROM parcels p JOIN orders o ON o.id = p.order_id WHERE o.reference = $1`,
      [reference],
    );
    for (const { shop_id } of shops) {
      const shop = ownerOf(String(shop_id));
      const keeper = await (await browser.newContext()).newPage();
      await signIn(keeper, shop.email, shop.password);
      await keeper.getByRole('link', { name: 'Parcels' }).first().click();
      await keeper
        .getByRole('article')
        .filter({ hasText: reference })
        .getByRole('button', { name: /Mark sent/ })
        .click();
      await expect(keeper.getByRole('article').filter({ hasText: reference })).toContainText('Sent.');
      await keeper.context().close();
    }

    await desk.reload();
    await desk.getByRole('button', { name: 'Save the record' }).click();
    await expect(desk.getByRole('alert')).toContainText('need another look');
    await desk.getByLabel('Serial number of the new shock').fill('VT-0042-17');
    await desk.getByLabel(/Sag as set/).fill('13.8');
    await desk.getByLabel(/Frame end bolt/).fill('16');
    await desk.getByLabel(/Link end bolt/).fill('16');
    await desk.getByLabel(/moved through its whole travel/).check();
    await desk.getByLabel(/Checked for recalls/).check();
    await desk.getByRole('button', { name: 'Save the record' }).click();
    await desk.getByRole('button', { name: 'Mark fitted' }).click();
    await expect(desk.getByText(/^Fitted/).first()).toBeVisible();
    await desk.context().close();

    await page.goto(`/orders/${reference}`);
    await expect(page.getByRole('heading', { name: 'What was set' })).toBeVisible();
    await expect(page.getByText('VT-0042-17')).toBeVisible();
    await expect
      .poll(
        () =>
          stack.mail.messages().find(({ to, subject }) => to.includes(email) && /fitted/.test(subject))
            ?.text ?? '',
      )
      .toContain('VT-0042-17');
  });
}

test('a declined card, another one, and the order is paid', async ({ page }) => {
  test.setTimeout(300_000);
  await measureUp(page);
  await planFirst(page);
  await page.getByRole('button', { name: /^Pay £/ }).click();
  await expect(page.getByRole('alert')).toContainText('need another look');
  await expect(page).toHaveTitle(/^Error:/);
  await fillContact(page, 'declined@rider.example');
  await page.getByRole('button', { name: /^Pay £/ }).click();
  await payWith(page, '4000000000000002');
  await expect(page.getByText(/declined/i).first()).toBeVisible();
  await payWith(page, '4242424242424242');
  await expect(page.getByText(/A confirmation is on its way/)).toBeVisible();
});

test('cancelled on the payment page: the hold is let go by the rider, the plan is still there', async ({
  page,
}) => {
  test.setTimeout(300_000);
  await measureUp(page);
  await planFirst(page);
  await fillContact(page, 'cancelled@rider.example');
  await page.getByRole('button', { name: /^Pay £/ }).click();
  await page.getByRole('button', { name: 'Cancel and go back' }).click();
  await page.getByRole('button', { name: 'Let the hold go' }).click();
  await expect(page.getByRole('heading', { name: 'Nothing was paid' })).toBeVisible();
  await page.getByRole('link', { name: 'Back to your plan' }).click();
  await expect(page.getByRole('heading', { name: 'What it costs' })).toBeVisible();
});

test('answers survive a reload, Back and another browser through the rider’s own link', async ({
  page,
  browser,
}) => {
  await measureUp(page);
  await page.getByRole('button', { name: 'Make a link' }).click();
  const line = page.locator('p', { hasText: 'Your link:' });
  await expect(line).toBeVisible();
  const link = /https?:\S+/.exec((await line.textContent()) ?? '')?.[0] ?? '';
  await page.reload();
  await expect(page.getByText('80 kg, kit 3 kg')).toBeVisible();
  await page.goBack();
  await expect(page.getByRole('heading', { level: 1 })).not.toHaveText('Check your answers');
  const other = await (await browser.newContext()).newPage();
  await other.goto(link);
  await expect(other.getByText('80 kg, kit 3 kg')).toBeVisible();
  await other.context().close();
});
