import { arrived, pick, press, tabTo, typeInto } from './support/keyboard';
import { expect, test } from './support/stack';

test('by keyboard alone: from the front page to a paid order', async ({ page }) => {
  test.setTimeout(300_000);
  const next = () => press(page, /^Continue$/);
  const notKnown = () => press(page, /^I don’t know$/);

  await page.goto('/');
  await press(page, /^Skip to the page$/);
  await press(page, /^Start your measure-up$/);
  await arrived(page, /Your measure-up/);
  await press(page, /^Start$/);

  await arrived(page, /Which frame/);
  await typeInto(page, /^Maker, model or year/, 'Withen 140');
  await expect(page.getByText('2 frames', { exact: true })).toBeVisible();
  await pick(page, /^Ullscar/, /^Ullscar Withen 140,/);
  await next();
  await arrived(page, /size printed/);
  await typeInto(page, /^Size as printed/, 'two hundred');
  await next();
  // The summary of what is wrong takes the focus, and its link leads to the field.
  await expect(page.getByRole('alert')).toBeFocused();
  await press(page, /A size looks like/);
  await expect(page.getByLabel('Size as printed')).toBeFocused();
  await typeInto(page, /^Size as printed/, '210x50');
  await next();
  await arrived(page, /How far apart/);
  await typeInto(page, /^Eye-to-eye/, '210.2');
  await next();
  await arrived(page, /How far does it shorten/);
  await notKnown();
  await arrived(page, /two ends/);
  await pick(page, /^Eyelet/, /^Eyelet/);
  await page.keyboard.press('Tab');
  await pick(page, /^Eyelet/, /^Eyelet/);
  await next();
  for (const title of [/Which hardware/, /How thick/, /air or a coil/, /worked from the bar/]) {
    await arrived(page, title);
    await notKnown();
  }
  await arrived(page, /Air, coil/);
  await pick(page, /^(Either|Air only)/, /^Air only/);
  await next();
  await arrived(page, /weigh/);
  await typeInto(page, /^You/, '80');
  await next();
  await arrived(page, /bike weigh/);
  await typeInto(page, /^Whole bike/, '14.5');
  await next();
  await arrived(page, /How do you ride/);
  await pick(page, /^Cross-country/, /^Trail/);
  await next();
  await arrived(page, /from the bar/);
  await pick(page, /^No/, /^No/);
  await next();
  await arrived(page, /reservoir/);
  await next();
  await arrived(page, /cost/);
  await notKnown();
  await arrived(page, /Where are you/);
  await notKnown();
  await arrived(page, /Check your answers/);
  await press(page, /^Show what fits$/);

  await arrived(page, /Withen/);
  await press(page, /^Vellacott Tarn/);
  await arrived(page, /Vellacott Tarn/);
  await press(page, /^Plan this shock$/);
  await arrived(page, /Vellacott Tarn/);
  await pick(page, /^A partner workshop/, /^I fit it myself/);
  await expect(page.getByText(/^Parts arrive by/)).toBeVisible();
  await press(page, /^Pay £/);
  await expect(page.getByRole('alert')).toBeFocused();
  await typeInto(page, /^Name/, 'Wren Hollis');
  await typeInto(page, /^E-mail/, 'keys@rider.example');
  await typeInto(page, /^Telephone/, '01632 960123');
  await typeInto(page, /^Street/, '1 Beck Lane');
  await typeInto(page, /^Town/, 'Skelhow');
  await typeInto(page, /^Postcode/, 'QF1 9ZZ');
  await tabTo(page, /^I accept the terms/);
  await page.keyboard.press('Space');
  await press(page, /^Pay £/);

  await expect(page.getByText('Test payment page').first()).toBeVisible();
  await typeInto(page, /card number/i, '4242424242424242');
  await typeInto(page, /expir/i, '12/39');
  await typeInto(page, /cvc|security code/i, '123');
  await typeInto(page, /^name/i, 'Wren Hollis');
  await press(page, /^Pay/);
  await expect(page.getByRole('heading', { level: 1, name: /Vellacott Tarn/ })).toBeVisible();
  await expect(page.getByText(/A confirmation is on its way/)).toBeVisible();
});
