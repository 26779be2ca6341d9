/**
 * Takes a picture of every public page at three widths and asks axe about each: for looking at after a change.
 * `npx tsx src/testing/serve-fixtures.ts` beside it, then `npx tsx e2e/look-at-pages.ts <folder> [address]`.
 */
import { mkdir } from 'node:fs/promises';
import { join } from 'node:path';
import AxeBuilder from '@axe-core/playwright';
import { type Browser, chromium } from 'playwright-core';

const pages: Readonly<Record<string, string>> = {
  home: '/',
  search: '/search',
  narrowed: '/search?kind=dress&measure=waist%3A560..620&unit=in',
  table: '/search?view=table',
  'nothing-found': '/search?kind=hat&measure=waist%3A560..620',
  'not-readable': '/search?min.waist=wide&typed=mm',
  garment: '/g/lh-1966-30',
  'old-version': '/g/lh-1966-30/v/1',
  'how-we-measure': '/how-we-measure',
  point: '/how-we-measure/waist',
  withdrawn: '/g/lh-1958-8',
  'not-found': '/g/nothing',
};
const widths = [390, 820, 1280];
const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];
const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--disable-quic',
  '--no-first-run',
];

const [folder = 'test-results/pages', base = 'http://127.0.0.1:4391'] = process.argv.slice(2);

async function look(browser: Browser, name: string, path: string, width: number): Promise<number> {
  // axe is put into the page as a script, which the policy of the site would refuse.
  const context = await browser.newContext({ viewport: { width, height: 900 }, bypassCSP: true });
  const page = await context.newPage();
  page.on('pageerror', (error) => console.log(`${name} ${width}: ${error.message}`));
  await page.goto(base + path, { waitUntil: 'load' });
  await page.waitForTimeout(800);
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  for (const { id, nodes } of violations) console.log(`${name} ${width}: ${id}: ${nodes[0]?.html ?? ''}`);
  const wide = await page.evaluate(() => document.documentElement.scrollWidth);
  if (wide > width) console.log(`${name} ${width}: the page is ${wide} px wide`);
  await page.screenshot({
    path: join(folder, `${name}-${width}.png`),
    fullPage: true,
    animations: 'disabled',
  });
  await context.close();
  return violations.length + (wide > width ? 1 : 0);
}

await mkdir(folder, { recursive: true });
const browser = await chromium.launch({ executablePath: '/usr/bin/chromium', args: flags });
let found = 0;
for (const [name, path] of Object.entries(pages)) {
  for (const width of widths) found += await look(browser, name, path, width);
}
await browser.close();
console.log(`${found} findings on ${Object.keys(pages).length} pages at ${widths.length} widths`);
process.exitCode = found === 0 ? 0 : 1;
