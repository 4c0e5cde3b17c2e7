import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Page } from '@playwright/test';

const EMAIL = 'owner@tepidarium.localhost';
const PASSWORD = process.env.TEPIDARIUM_OWNER_PASSWORD ?? '';

async function signIn(page: Page): Promise<void> {
  await page.getByLabel('E-mail').fill(EMAIL);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

/** A house of this test's own; its address. */
async function openHouse(page: Page, name: string): Promise<string> {
  await page.goto('/projects');
  await signIn(page);
  await page.getByLabel('Name of the house').fill(name);
  await page.getByRole('button', { name: 'Begin with the demonstration house' }).click();
  await expect(page).toHaveURL(/\/projects\/[0-9a-f-]{36}$/);
  return page.url();
}

const inner = (page: Page) => page.getByRole('main');

async function expectGoodPage(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
  const wide = page.viewportSize()!;
  await page.setViewportSize({ width: 360, height: 740 });
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(360);
  await page.setViewportSize(wide);
}

test('a field out of range says what to type; mended and saved, it is there after a reload', async ({
  page,
}) => {
  const project = await openHouse(page, 'Form Cottage');
  await page.goto(`${project}/house`);
  const volume = page.getByRole('textbox', { name: 'Heated volume' });
  await volume.fill('34000');
  await volume.blur();
  await expect(page.getByText('Heated volume: type 20 to 8000 m³.')).toBeVisible();
  await expect(volume).toHaveAttribute('aria-invalid', 'true');
  await expectGoodPage(page);

  await page.reload();
  await expect(page.getByText('What you typed before and had not saved is back.')).toBeVisible();
  await expect(volume).toHaveValue('34000');
  await volume.fill('352,5');
  await page.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByText(/^saved at/)).toBeVisible();
  await page.reload();
  await expect(volume).toHaveValue('352.5');
  await expect(page.getByText('What you typed before')).toHaveCount(0);
});

test('the offered correction mends a row of the shell, and its loss comes back', async ({ page }) => {
  const project = await openHouse(page, 'Row Cottage');
  await page.goto(`${project}/house`);
  const u = page.getByRole('textbox', { name: 'U, row 5' });
  await u.fill('16');
  await u.press('Enter');
  await expect(page.getByRole('textbox', { name: 'U, row 6' })).toBeFocused();
  await expect(page.getByText('held', { exact: true })).toBeVisible();
  await expect(page.getByText('1 to mend')).toBeVisible();
  await page.getByRole('button', { name: '1.6', exact: true }).click();
  await expect(u).toHaveValue('1.6');
  await expect(page.getByText('held', { exact: true })).toHaveCount(0);
});

test('a sign-out while typing loses nothing', async ({ page, context }) => {
  const project = await openHouse(page, 'Typing Cottage');
  await page.goto(`${project}/prices`);
  await page.getByRole('textbox', { name: 'Upkeep' }).fill('85');
  await context.clearCookies();
  await page.getByRole('button', { name: 'Save' }).click();
  await inner(page).getByRole('link', { name: 'Sign in again' }).click();
  await signIn(page);
  await expect(page).toHaveURL(/\/prices$/);
  await expect(page.getByRole('textbox', { name: 'Upkeep' })).toHaveValue('85');
  await page.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByText(/^saved at/)).toBeVisible();
  await expectGoodPage(page);
});

test('a generic class is laid into the collector, and the server works its year', async ({ page }) => {
  const project = await openHouse(page, 'Class Cottage');
  await page.goto(project);
  await expectGoodPage(page);
  await inner(page).getByRole('link', { name: 'Collector of Film rows, winter' }).click();
  await expect(page.getByRole('heading', { name: 'Efficiency curve' })).toBeVisible();
  await page.getByLabel('Start from a generic class').selectOption('Selective-coated flat plate');
  await page.getByRole('button', { name: 'Lay it in' }).click();
  await expect(page.getByRole('textbox', { name: 'Declared stagnation temperature' })).toHaveValue('189');
  await page.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByText(/^saved at/)).toBeVisible();
  await expectGoodPage(page);
  await page
    .getByRole('navigation', { name: 'Project' })
    .getByRole('link', { name: 'Loop and store' })
    .click();
  await expect(page.getByRole('textbox', { name: 'Store volume' })).toBeVisible();
  await expectGoodPage(page);
  await page.goto(project);
  await expect(inner(page).getByText('Selective-coated flat plate').first()).toBeVisible();
});

test('a second field is added, saved and still there after a reload, on both of its pages', async ({
  page,
}) => {
  const project = await openHouse(page, 'Two Field Cottage');
  await page.goto(project);
  await inner(page).getByRole('link', { name: 'Loop and store of Film rows, winter' }).click();
  const second = page.getByRole('region', { name: 'Second field' });
  await second.getByLabel('Its collectors, to begin with').selectOption('Selective-coated flat plate');
  await second.getByRole('button', { name: 'Add a second field' }).click();
  await expect(second.getByRole('textbox', { name: 'Array area' })).toBeFocused();
  await second.getByRole('textbox', { name: 'Array area' }).fill('6');
  await second.getByRole('textbox', { name: 'Tilt' }).fill('50');
  await page.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByText(/^saved at/)).toBeVisible();
  await page.reload();
  await expect(second.getByRole('textbox', { name: 'Array area' })).toHaveValue('6');
  await expect(second.getByRole('textbox', { name: 'Tilt' })).toHaveValue('50');
  await expectGoodPage(page);

  const around = page.getByRole('navigation', { name: 'Project' });
  await around.getByRole('link', { name: 'Collector' }).click();
  await expect(second.getByRole('textbox', { name: 'Declared stagnation temperature' })).toHaveValue('189');
  await expectGoodPage(page);
  await around.getByRole('link', { name: 'Study' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText(
    /film-covered absorbers and 6\sm² of factory collectors/,
    { timeout: 30_000 },
  );
  await expect(page.getByText('Area, cover, tilt and months move the first field.')).toBeVisible();
});
