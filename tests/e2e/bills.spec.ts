import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Page } from '@playwright/test';

const EMAIL = 'owner@tepidarium.localhost';
const PASSWORD = process.env.TEPIDARIUM_OWNER_PASSWORD ?? '';

/** The bills of a house of this test's own; the address of its project. */
async function openBills(page: Page, name: string): Promise<string> {
  await page.goto('/projects');
  await page.getByLabel('E-mail').fill(EMAIL);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByLabel('Name of the house').fill(name);
  await page.getByRole('button', { name: 'Begin with the demonstration house' }).click();
  await expect(page).toHaveURL(/\/projects\/[0-9a-f-]{36}$/);
  const project = page.url();
  await page
    .getByRole('navigation', { name: 'Project' })
    .getByRole('link', { name: 'Bills', exact: true })
    .click();
  await expect(page.getByText('23 intervals between real readings put the loss')).toBeVisible();
  return project;
}

async function expectGoodPage(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
  const wide = page.viewportSize()!;
  await page.setViewportSize({ width: 360, height: 740 });
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(360);
  await page.setViewportSize(wide);
}

const figures = (page: Page) => page.locator('#say dl');

test('rows are answered in words, a mended date changes the figures, and the house is scaled to its bills', async ({
  page,
}) => {
  test.slow();
  const project = await openBills(page, 'Bill Cottage');
  await expect(page.getByText('It overlaps row 19 in 12 days')).toBeVisible();
  await expect(page.getByText('The simulated house is not calibrated by these bills')).toBeVisible();
  await expect(page.getByText(/^heats below/)).toBeVisible();
  await expectGoodPage(page);

  const before = await figures(page).textContent();
  const first = page.getByRole('textbox', { name: 'First day, row 20' });
  await first.fill('1/12/2025');
  await first.blur();
  await expect(page.getByText('“1/12/2025” can be two days.')).toBeVisible();
  await page.getByRole('button', { name: '1 December 2025', exact: true }).click();
  await expect(first).toHaveValue('2025-12-01');
  await expect(page.getByText('24 intervals between real readings put the loss')).toBeVisible();
  await expect(page.getByText('It overlaps row 19')).toHaveCount(0);
  await expect(figures(page)).not.toHaveText(before ?? '');

  const take = page.getByRole('button', { name: /^Take 1\d\d W\/K from the bills$/ });
  await expect(take).toBeDisabled();
  await page.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByText(/^saved at/)).toBeVisible();
  await take.click();
  await expect(page.getByText('The house is scaled to its bills: × 0.9')).toBeVisible();
  await expect(page.getByText('The simulated house is calibrated by these bills')).toBeVisible();
  await expectGoodPage(page);

  await page.goto(`${project}/house`);
  await expect(page.getByText(/Scaled to the fuel bills: × 0\.9/)).toBeVisible();
  // A press before the page has woken up is lost: press again.
  await expect(async () => {
    await page.getByRole('button', { name: 'Take the shell as entered again' }).click({ timeout: 1000 });
    await expect(page.getByText('The loss is that of the shell and the air as entered.')).toBeVisible();
  }).toPass();
  await page.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByText(/^saved at/)).toBeVisible();
});

test('readings pasted from a spreadsheet stand in the table, and few of them give no slope', async ({
  page,
}) => {
  await openBills(page, 'Paste Cottage');
  await page.getByText('Paste from a spreadsheet').click();
  await page
    .getByLabel('Rows with first day, last day and quantity')
    .fill('from\tto\tkg\n2/1/2024\t3/1/2024\t612,5\n3/1/2024\t4/1/2024\t540\test');
  await page.getByRole('button', { name: '1 February 2024', exact: true }).click();
  await page.getByRole('button', { name: 'Put them in place of the 26 that are there' }).click();
  await expect(page.getByRole('textbox', { name: 'First day, row 1' })).toHaveValue('2024-02-01');
  await expect(page.getByRole('textbox', { name: 'Quantity, row 1' })).toHaveValue('612.5');
  await expect(page.getByRole('checkbox', { name: 'Estimated, row 2' })).toBeChecked();
  await expect(page.getByText('no real reading follows that would mend it')).toBeVisible();
  await expect(page.getByText('There is one interval between real readings; a slope needs 6.')).toBeVisible();
  await page.getByRole('button', { name: 'Table' }).click();
  await expect(page.getByRole('rowheader', { name: '1 February 2024 to 1 March 2024' })).toBeVisible();
  await expectGoodPage(page);
});
