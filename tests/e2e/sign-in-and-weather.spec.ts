import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Page } from '@playwright/test';
import { epwText } from '../fakes/epw-text';

const EMAIL = 'owner@tepidarium.localhost';
const PASSWORD = process.env.TEPIDARIUM_OWNER_PASSWORD ?? '';

async function signIn(page: Page, password: string): Promise<void> {
  await page.getByLabel('E-mail').fill(EMAIL);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

/** No violation that axe finds, and nothing sideways on the narrowest phone. */
async function expectGoodPage(page: Page): Promise<void> {
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
  const wide = page.viewportSize()!;
  await page.setViewportSize({ width: 360, height: 740 });
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(360);
  await page.setViewportSize(wide);
}

const file = (name: string, text: string) => ({ name, mimeType: 'text/plain', buffer: Buffer.from(text) });

test('a wrong password keeps what was typed; the right one leads where one wanted to go', async ({
  page,
}) => {
  await page.goto('/projects');
  await expect(page).toHaveURL(/\/sign-in\?to=%2Fprojects$/);
  await signIn(page, 'not this one');
  await expect(page.getByText('do not belong together')).toBeVisible();
  await expect(page.getByLabel('E-mail')).toHaveValue(EMAIL);
  await expect(page.getByLabel('Password')).toHaveValue('not this one');
  await expectGoodPage(page);
  await signIn(page, PASSWORD);
  await expect(page).toHaveURL(/\/projects$/);
  await expectGoodPage(page);
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page).toHaveURL(/\/$/);
  await page.goto('/projects');
  await expect(page).toHaveURL(/\/sign-in/);
});

test('a new house gets a weather file: refused, repaired, kept, chosen; then the house goes', async ({
  page,
}) => {
  await page.goto('/projects');
  await signIn(page, PASSWORD);
  await page.getByLabel('Name of the house').fill('Weather Cottage');
  await page.getByRole('button', { name: 'Begin with the demonstration house' }).click();
  await expect(page).toHaveURL(/\/projects\/[0-9a-f-]{36}$/);
  await page.goto(`${page.url()}/weather`);
  await expectGoodPage(page);

  const lines = epwText().split('\n');
  const upload = page.getByLabel(/EPW or TMY3 file/);
  await upload.setInputFiles(file('cut.epw', [...lines.slice(0, 500), ...lines.slice(502)].join('\n')));
  await expect(page.getByText('8,758 hours')).toBeVisible();
  await expect(page.getByRole('cell', { name: '500', exact: true })).toBeVisible();
  await expectGoodPage(page);
  await page.getByRole('button', { name: 'Repair it' }).click();
  await expect(page.getByText('Repaired.').first()).toBeVisible();

  await upload.setInputFiles(file('hill.epw', lines.join('\n')));
  await page.getByRole('button', { name: 'Keep and use this year' }).click();
  await expect(page.getByText('Invented Hill is kept and in use.')).toBeVisible();
  await expect(page.getByText('hill.epw, kept as it came')).toBeVisible();
  await page.getByRole('button', { name: 'Use this year of Lowland L-52' }).click();
  await expect(page.getByText('Just now it is the year of Lowland L-52.')).toBeVisible();
  await page.getByRole('button', { name: 'Remove Invented Hill' }).click();
  await expect(page.getByText('hill.epw')).toHaveCount(0);

  await page.goto('/projects');
  await page.locator('summary', { hasText: 'Delete Weather Cottage' }).click();
  await page.getByRole('button', { name: 'Delete Weather Cottage for good' }).click();
  await expect(page.getByRole('link', { name: 'Weather Cottage' })).toHaveCount(0);
});
