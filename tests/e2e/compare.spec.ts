import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '@playwright/test';

const ADDRESS = '/demonstration/compare';

test('homemade film and selective-coated plates stand side by side, with fraction and cost', async ({
  page,
}) => {
  await page.goto(ADDRESS);
  for (const name of ['Film rows, winter', 'Factory ten']) {
    const design = page.getByRole('region', { name });
    await expect(design.getByText(/^\d+(\.\d)?\s%$/)).toBeVisible();
    await expect(design.getByText(/^0\.\d{3}\s€\/kWh$/)).toBeVisible();
    await expect(design.getByRole('img', { name: /^(Film rows|Factory ten)/ })).toBeVisible();
  }
  await expect(page.getByText('Factory ten against Film rows')).toBeVisible();
  await expect(page.getByRole('row', { name: /cents per kWh/ })).toBeVisible();
});

test('the sentences stand in the page before any script has run', async ({ request }) => {
  const html = await (await request.get(ADDRESS)).text();
  expect(html).toContain('The differences in words');
  expect(html).toContain('Factory ten against Film rows');
});

test('all hours can be inked', async ({ page }) => {
  await page.goto(ADDRESS);
  const second = page.locator('canvas').nth(1);
  const pixels = () => second.evaluate((canvas: HTMLCanvasElement) => canvas.toDataURL());
  await expect.poll(pixels).not.toBe('data:,');
  const changes = await pixels();
  await page.getByRole('radio', { name: 'All hours' }).check();
  await expect.poll(pixels).not.toBe(changes);
});

for (const colorScheme of ['light', 'dark'] as const) {
  for (const width of [1440, 360]) {
    test(`no barrier that axe knows and nothing sideways, ${colorScheme}, ${width} px`, async ({ page }) => {
      await page.emulateMedia({ colorScheme });
      await page.setViewportSize({ width, height: 800 });
      await page.goto(ADDRESS);
      const { violations } = await new AxeBuilder({ page }).analyze();
      expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width);
    });
  }
}
