import { brotliCompressSync, constants } from 'node:zlib';
import type { Browser, BrowserContext, Page } from 'playwright-core';
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
  /** The Workroom's list of garments. */
  readonly shell: number;
  /** A measuring sheet, until it can be typed into. */
  readonly sheet: number;
}

/** What a page fetches for whoever is signed in already. */
async function scriptsOf(context: BrowserContext, address: string): Promise<number> {
  const page = await context.newPage();
  const scripts = new Scripts(page);
  await page.goto(address, { waitUntil: 'networkidle' });
  return scripts.kilobytes();
}

/** Fetches each page in a browser that has kept nothing, and weighs its scripts. */
export async function weigh(browser: Browser, url: string, sheetId: string): Promise<Weights> {
  const context = await browser.newContext({ serviceWorkers: 'block' });
  try {
    const front = await context.newPage();
    const ofSite = new Scripts(front);
    await front.goto(url, { waitUntil: 'networkidle' });
    const door = await context.newPage();
    await door.goto(`${url}/workroom/sign-in`);
    await sayWhoItIs(door);
    await door.getByRole('heading', { name: 'Garments', level: 1 }).waitFor();
    const shell = await scriptsOf(context, `${url}/workroom/`);
    const sheet = await scriptsOf(context, `${url}/workroom/sheets/${sheetId}`);
    return { site: await ofSite.kilobytes(), shell, sheet };
  } finally {
    await context.close();
  }
}
