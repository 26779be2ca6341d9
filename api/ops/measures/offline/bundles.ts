import { brotliCompressSync, constants } from 'node:zlib';
import type { Browser, Page } from 'playwright-core';
import { sayWhoItIs } from '../../drills/offline/table.js';

const KILOBYTE = 1024;

/** The scripts that a page fetches, by address, in KB as a server sends them at brotli's best. */
class Scripts {
  private readonly sizes = new Map<string, Promise<number>>();

  constructor(page: Page) {
    page.on('response', (response) => {
      const { pathname } = new URL(response.url());
      if (pathname.endsWith('.js')) this.sizes.set(pathname, response.body().then(packed));
    });
  }

  async kilobytes(): Promise<number> {
    const sizes = await Promise.all(this.sizes.values());
    return sizes.reduce((sum, size) => sum + size, 0) / KILOBYTE;
  }
}

const packed = (script: Buffer): number =>
  brotliCompressSync(script, { params: { [constants.BROTLI_PARAM_QUALITY]: 11 } }).length;

export interface Weights {
  /** The public front page. */
  readonly site: number;
  /** The Workroom until its first page stands. */
  readonly shell: number;
  /** The same and a measuring sheet, all in all. */
  readonly sheet: number;
}

/** Fetches each page in a browser that has kept nothing, and weighs its scripts. */
export async function weigh(browser: Browser, url: string, sheetId: string): Promise<Weights> {
  const context = await browser.newContext({ serviceWorkers: 'block' });
  try {
    const front = await context.newPage();
    const ofSite = new Scripts(front);
    await front.goto(url, { waitUntil: 'networkidle' });
    const page = await context.newPage();
    const ofWorkroom = new Scripts(page);
    await page.goto(`${url}/workroom/sign-in`);
    await sayWhoItIs(page);
    await page.getByRole('heading', { name: 'Garments', level: 1 }).waitFor();
    await page.waitForLoadState('networkidle');
    const shell = await ofWorkroom.kilobytes();
    await page.goto(`${url}/workroom/sheets/${sheetId}`, { waitUntil: 'networkidle' });
    return { site: await ofSite.kilobytes(), shell, sheet: await ofWorkroom.kilobytes() };
  } finally {
    await context.close();
  }
}
