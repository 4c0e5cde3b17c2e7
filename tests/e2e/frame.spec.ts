import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '@playwright/test';

const PAGES = ['/', '/an-address-that-leads-nowhere'];

test('the server answers and says nothing about itself', async ({ request }) => {
  const answer = await request.get('/api/health');
  expect(await answer.json()).toEqual({ ok: true });
  const headers = answer.headers();
  expect(headers['x-powered-by']).toBeUndefined();
  expect(headers['x-content-type-options']).toBe('nosniff');
  expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
});

test('an address that leads nowhere is answered as such, with a way back', async ({ page }) => {
  const answer = await page.goto('/an-address-that-leads-nowhere');
  expect(answer?.status()).toBe(404);
  await page.getByRole('main').getByRole('link', { name: 'start page' }).click();
  await expect(page).toHaveURL('/');
});

test('the first stop of the keyboard leads past the head', async ({ page }) => {
  await page.goto('/');
  await page.keyboard.press('Tab');
  const skip = page.getByRole('link', { name: 'Skip to the content' });
  await expect(skip).toBeFocused();
  await expect(skip).toBeInViewport();
  await page.keyboard.press('Enter');
  await expect(page.getByRole('main')).toBeFocused();
});

test('everything comes from the application itself, in its own type', async ({ page, baseURL }) => {
  const foreign: string[] = [];
  const complaints: string[] = [];
  page.on('request', (request) => {
    const url = request.url();
    if (/^https?:/.test(url) && !url.startsWith(baseURL ?? '')) foreign.push(url);
  });
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  await page.goto('/', { waitUntil: 'networkidle' });
  const loaded = await page.evaluate(async () => {
    const fonts = await document.fonts.ready;
    return [...fonts].filter((font) => font.status === 'loaded').map((font) => font.family);
  });
  expect(loaded).toEqual(expect.arrayContaining(['alegreya', 'sourceSans']));
  expect(foreign).toEqual([]);
  expect(complaints).toEqual([]);
});

for (const path of PAGES) {
  for (const colorScheme of ['light', 'dark'] as const) {
    test(`${path} has no barrier that axe knows, ${colorScheme}`, async ({ page }) => {
      await page.emulateMedia({ colorScheme });
      await page.goto(path);
      const { violations } = await new AxeBuilder({ page }).analyze();
      expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
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
