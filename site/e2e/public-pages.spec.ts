import { expect, test } from '@playwright/test';
import { axeFindings } from './support/axe';

const pages = [
  { path: '/', status: 200 },
  { path: '/search', status: 200 },
  { path: '/search?view=table', status: 200 },
  { path: '/search?kind=hat&measure=waist%3A560..620', status: 200 },
  { path: '/g/lh-1966-30', status: 200 },
  { path: '/g/lh-1966-30/v/1', status: 200 },
  { path: '/how-we-measure', status: 200 },
  { path: '/how-we-measure/waist', status: 200 },
  { path: '/g/lh-1969-12', status: 410 },
  { path: '/g/never-published', status: 404 },
  // A draft has no public number: the address that it would have is not known either.
  { path: '/g/lh-1958-7', status: 404 },
];

for (const width of [320, 820, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 900 } });

    for (const { path, status } of pages) {
      test(`${path} answers ${status}, fits, and axe finds nothing`, async ({ page }) => {
        const faults: string[] = [];
        page.on('pageerror', (error) => faults.push(error.message));
        const answer = await page.goto(path);
        expect(answer?.status()).toBe(status);
        await expect(page.getByRole('heading', { level: 1 })).toHaveCount(1);
        expect(await axeFindings(page)).toEqual([]);
        const broad = await page.evaluate(() => document.documentElement.scrollWidth);
        expect(broad).toBeLessThanOrEqual(width);
        expect(faults).toEqual([]);
      });
    }
  });
}

test.describe('without a script', () => {
  test.use({ javaScriptEnabled: false });

  test('a garment is found by its waist and read in inches', async ({ page }) => {
    await page.goto('/search');
    const waist = page.getByRole('group', { name: 'Waist', exact: true });
    await waist.getByLabel(/From/).fill('560');
    await waist.getByLabel(/To \(mm/).fill('620');
    await page.getByRole('button', { name: 'Show these measurements' }).click();
    await expect(page).toHaveURL(/measure=waist(%3A|:)560\.\.620/);
    const found = page.getByRole('heading', { level: 1 });
    await expect(found).toHaveText(/^\d+ garments? found/);
    await page.getByRole('link', { name: /^Day dress of teal silk/ }).click();
    await page.getByRole('link', { name: /inches/ }).click();
    // The mean of the band's two readings, 612.5 mm, is 24.114 in: 24 1/8 at eighths.
    const band = page.getByRole('row').filter({ hasText: 'Waistband' });
    await expect(band.getByText('24 1/8', { exact: true })).toBeVisible();
    await expect(page.getByRole('img', { name: /teal silk dress/ }).first()).toBeVisible();
  });
});

test('a row of the table and its line on the diagram answer each other', async ({ page }) => {
  await page.goto('/g/lh-1966-30');
  await page.waitForLoadState('networkidle');
  const bodice = page.getByRole('region', { name: 'Bodice' });
  const row = bodice.getByRole('row').filter({ hasText: 'Across the back' });
  const line = bodice.locator('.only-wide [data-point="across-back"]');
  await row.hover();
  await expect(line).toHaveAttribute('data-lit');
  await page.mouse.move(0, 0);
  await expect(line).not.toHaveAttribute('data-lit');
  await line.locator('circle').first().click();
  await expect(row.getByRole('button')).toBeFocused();
  await expect(row.getByRole('button')).toHaveAttribute('aria-pressed', 'true');
});
