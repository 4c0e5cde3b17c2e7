import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '@playwright/test';
import type { Page } from '@playwright/test';

const PAGES = [
  '/method',
  '/method/collector',
  '/method/year',
  '/method/choices',
  '/method/checks',
  '/method/limits',
  '/method/changes',
  '/validation',
];

async function firstYear(page: Page) {
  await page.goto('/demonstration');
  await expect(page.locator('canvas').first()).toHaveAttribute('data-years', /\d/, { timeout: 30_000 });
}

test('from the verdict to a standard in two clicks', async ({ page }) => {
  await firstYear(page);
  await page.getByTestId('verdict').getByRole('button').nth(1).click();
  const sheet = page.getByRole('dialog', { name: 'How it was computed: Share carried by the sun' });
  await expect(sheet).toContainText('Store volume');
  await expect(sheet).toContainText('assumed: demonstration');
  await sheet.getByRole('link', { name: 'Solar fractions' }).click();
  await expect(page).toHaveURL(/\/method\/year#solarFractions$/);
  const equation = page.locator('#solarFractions');
  await expect(equation).toBeInViewport();
  await expect(equation).toContainText('ISO 9488');
});

test('the sheet gives the keyboard back to its number, and a second press closes it', async ({ page }) => {
  await firstYear(page);
  const number = page.getByTestId('verdict').getByRole('button').nth(2);
  await number.focus();
  await page.keyboard.press('Enter');
  const sheet = page.getByRole('dialog', { name: 'How it was computed: Cost of solar heat' });
  await expect(sheet).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(sheet).toBeHidden();
  await expect(number).toBeFocused();
  await number.click();
  await expect(sheet).toBeVisible();
  await number.click();
  await expect(sheet).toBeHidden();
});

test('a fraction, the balance and the price lead to their equations too', async ({ page }) => {
  await firstYear(page);
  for (const [section, number, link] of [
    ['Three solar fractions', 1, /year#solarFractions/],
    ['Where the heat goes', 3, /store#layerLossesWPerK/],
    ['What a kilowatt-hour costs', 2, /money#costOfHeat/],
  ] as const) {
    const region = page.getByRole('region', { name: section });
    await region.getByRole('button').nth(number).click();
    const sheet = page.getByRole('dialog');
    await expect(sheet.getByRole('link').first()).toHaveAttribute('href', link);
    await page.keyboard.press('Escape');
    await expect(sheet).toBeHidden();
  }
});

test('a finding says how it was judged', async ({ page }) => {
  await page.goto('/demonstration?design=twin-wall-rows-all-year');
  await expect(page.locator('canvas').first()).toHaveAttribute('data-years', /\d/, { timeout: 30_000 });
  await page
    .getByRole('button', { name: /How check .* was judged/ })
    .first()
    .click();
  const sheet = page.getByRole('dialog');
  await expect(sheet).toContainText('bears for short times');
  await sheet.getByRole('link', { name: /^Check / }).click();
  await expect(page).toHaveURL(/\/method\/checks#rule-/);
});

test('the visitor runs every check, and all lie within their tolerance', async ({ page }) => {
  await page.goto('/validation');
  await page.getByRole('button', { name: 'Run the checks here' }).click();
  await expect(page.getByRole('status')).toContainText('All run in this browser', { timeout: 60_000 });
  const counts = await page.getByTestId('validation-counts').innerText();
  const [within, published, regression, all] = counts.match(/\d+/g)!.map(Number);
  expect(published).toBeGreaterThan(50);
  expect([within, regression]).toEqual([published, all]);
  await expect(page.getByText('outside', { exact: true })).toHaveCount(0);
  await expect(page.getByRole('region', { name: 'Convergence of steps and layers' })).toContainText('0.125');
});

test('a run of the checks can be cancelled and begun again', async ({ page }) => {
  await page.goto('/validation');
  await page.getByRole('button', { name: 'Run the checks here' }).click();
  await page.getByRole('button', { name: 'Cancel' }).click();
  await expect(page.getByRole('status')).toContainText('Cancelled');
  await page.getByRole('button', { name: 'Run the checks here' }).click();
  await expect(page.getByRole('status')).toContainText('All run in this browser', { timeout: 60_000 });
});

test('wide tables are reached and scrolled by key', async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 844 });
  await page.goto('/validation');
  const table = page.getByRole('region', { name: 'Checks against published values' });
  await table.focus();
  await expect(table).toBeFocused();
  await page.keyboard.press('ArrowRight');
  await expect.poll(() => table.evaluate((element) => element.scrollLeft)).toBeGreaterThan(0);
});

for (const path of PAGES) {
  for (const colorScheme of ['light', 'dark'] as const) {
    test(`${path} has no barrier that axe knows, ${colorScheme}`, async ({ page }) => {
      await page.emulateMedia({ colorScheme });
      await page.goto(path);
      const { violations } = await new AxeBuilder({ page }).analyze();
      expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html).slice(0, 5)])).toEqual([]);
    });
  }

  test(`${path} needs no sideways scroll at 360 px`, async ({ page }) => {
    await page.setViewportSize({ width: 360, height: 740 });
    await page.goto(path);
    const excess = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    expect(excess).toBe(0);
  });
}
