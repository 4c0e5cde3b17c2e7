import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '@playwright/test';
import type { Page } from '@playwright/test';

const EMAIL = 'owner@tepidarium.localhost';
const PASSWORD = process.env.TEPIDARIUM_OWNER_PASSWORD ?? '';

/** The study of the first design of a project of this test's own. */
async function openStudy(page: Page, name: string): Promise<void> {
  await page.goto('/projects');
  await page.getByLabel('E-mail').fill(EMAIL);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByLabel('Name of the house').fill(name);
  await page.getByRole('button', { name: 'Begin with the demonstration house' }).click();
  await expect(page).toHaveURL(/\/projects\/[0-9a-f-]{36}$/);
  await page.getByRole('navigation', { name: 'Project' }).getByRole('link', { name: 'Study' }).click();
  await expect(page.locator('canvas').first()).toHaveAttribute('data-years', /\d/, { timeout: 30_000 });
}

const area = (page: Page) => page.getByRole('textbox', { name: 'Array area, typed' });
const save = (page: Page) => page.getByRole('button', { name: 'Save this design' });

test('a saved design is there after a reload, with the server’s own year beside it', async ({ page }) => {
  await openStudy(page, 'Saving Cottage');
  await expect(save(page)).toBeDisabled();
  await area(page).fill('17');
  await expect(page.getByTestId('verdict')).toContainText('17');
  await expect(page.getByText('not saved yet')).toBeVisible();
  await save(page).click();
  await expect(page.getByText(/saved; the server worked it/)).toBeVisible({ timeout: 30_000 });
  await expect(page).not.toHaveURL(/area=/);
  await page.reload();
  await expect(area(page)).toHaveValue('17');
  await expect(page.getByTestId('verdict')).toContainText('17', { timeout: 30_000 });
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
});

test('a save that gets no answer says so and keeps the levers', async ({ page }) => {
  await openStudy(page, 'Cut-off Cottage');
  await area(page).fill('19');
  await page.route('**/projects/**', (route) =>
    route.request().method() === 'POST' ? route.abort() : route.continue(),
  );
  await save(page).click();
  await expect(page.getByText('The server did not answer.')).toBeVisible();
  await expect(area(page)).toHaveValue('19');
  await page.unroute('**/projects/**');
  await save(page).click();
  await expect(page.getByText(/saved; the server worked it/)).toBeVisible({ timeout: 30_000 });
});

test('who saved first is not overwritten unseen', async ({ page, context }) => {
  await openStudy(page, 'Two-tab Cottage');
  const other = await context.newPage();
  await other.goto(page.url());
  await area(other).fill('21');
  await save(other).click();
  await expect(other.getByText(/saved; the server worked it/)).toBeVisible({ timeout: 30_000 });
  await area(page).fill('22');
  await save(page).click();
  await page.getByRole('button', { name: 'keep mine' }).click();
  await expect(page.getByText(/saved; the server worked it/)).toBeVisible({ timeout: 30_000 });
  await page.reload();
  await expect(area(page)).toHaveValue('22');
});
