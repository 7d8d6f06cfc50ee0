import { expect, test } from './support/stack';

const heading = (name: string | RegExp) => ({ level: 1, name }) as const;

for (const width of [360, 1280]) {
  test(`looking around without a measure-up, at ${width} px`, async ({ page, stack }) => {
    await page.setViewportSize({ width, height: 900 });
    await page.goto('/');
    await page.getByRole('link', { name: 'Look at shocks by size' }).click();
    await expect(page.getByRole('heading', heading('Shocks by size'))).toBeFocused();
    await expect(page.getByText('Not checked for your bike')).toBeVisible();

    // Swapped, as it stands on many an invoice.
    await page.getByRole('textbox', { name: 'Size or name' }).fill('50 x 210');
    await page.getByRole('button', { name: 'Find' }).click();
    await expect(page.getByRole('heading', heading('210 × 50 mm'))).toBeVisible();
    const [{ count } = { count: 0 }] = await stack.sql(
      `SELECT count(*)::int AS count FROM shock_sizes WHERE size_key = '210x50'`,
    );
    await expect(page.getByText(`${String(count)} shocks of this size.`)).toBeVisible();
    await page.getByRole('combobox', { name: 'Spring' }).selectOption('coil only');
    await expect(page).toHaveURL(/\?spring=coil$/);
    await page.reload();
    await expect(page.getByRole('combobox', { name: 'Spring' })).toHaveValue('coil');
    await page.getByRole('combobox', { name: 'Spring' }).selectOption('air and coil');

    await page.getByRole('link', { name: 'Vellacott Tarn', exact: true }).click();
    await expect(page.getByRole('heading', heading('Vellacott Tarn 210 × 50'))).toBeVisible();
    const [{ price } = { price: 0 }] = await stack.sql(
      `SELECT min(price_minor) AS price FROM listings WHERE item_id = 'vellacott-tarn-210x50' AND quantity > reserved`,
    );
    await expect(page.getByText(`From £${(Number(price) / 100).toFixed(2)}`)).toBeVisible();
    await page.getByRole('link', { name: 'What is eye-to-eye?' }).click();
    await expect(page.getByRole('heading', heading('What is eye-to-eye?'))).toBeVisible();
    await page.goBack();
    await page.getByRole('link', { name: 'Check it for my bike' }).click();
    await expect(page.getByRole('button', { name: 'Start', exact: true })).toBeVisible();

    await page
      .getByRole('navigation', { name: 'Look around' })
      .getByRole('link', { name: 'Workshops' })
      .click();
    await page.getByRole('combobox', { name: 'Distances from' }).selectOption('Ostergarth');
    const nearest = page.getByRole('main').getByRole('listitem').first();
    await expect(nearest).toContainText('Ostergarth, 1 km as the crow flies');
    await nearest.getByRole('link').click();
    await expect(page.getByRole('heading', heading('The Tin Shed'))).toBeVisible();
    await expect(page.getByRole('row', { name: /Take the old shock out/ })).toContainText('£41.50');
  });
}
