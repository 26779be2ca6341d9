import { type BrowserContext, chromium, type Page } from 'playwright-core';
import { flags, points, sayWhoItIs } from '../../drills/offline/table.js';
import { watchCommits } from './commits.js';

export interface Seat {
  readonly chromium: string;
  readonly profile: string;
  readonly url: string;
  readonly sheetId: string;
}

/** A tablet's browser, with a profile that outlives it. */
export async function wake({ chromium: executablePath, profile }: Seat): Promise<BrowserContext> {
  const context = await chromium.launchPersistentContext(profile, {
    executablePath,
    args: flags,
    viewport: { width: 1024, height: 768 },
    locale: 'en-GB',
  });
  await context.addInitScript(watchCommits);
  return context;
}

const BROWSER_OPENS_MS = 2_000;

const pageOf = async (context: BrowserContext): Promise<Page> => context.pages()[0] ?? context.newPage();

/** Signs in, opens the sheet, and puts on the tablet all that it needs where there is no network. */
export async function prepare(context: BrowserContext, { url, sheetId }: Seat): Promise<Page> {
  const page = await pageOf(context);
  await page.goto(`${url}/workroom/sign-in`);
  await sayWhoItIs(page);
  await page.getByRole('heading', { name: 'Garments', level: 1 }).waitFor();
  await page.evaluate('navigator.serviceWorker.ready.then(() => true)');
  await page.goto(`${url}/workroom/sheets/${sheetId}`);
  await page.getByRole('button', { name: /It lies so/ }).click();
  await page.getByRole('tab', { name: 'Facts' }).click();
  await page.getByRole('button', { name: 'Prepare for the table' }).click();
  await page.getByText(/^Ready on this tablet since/).waitFor();
  await page.getByRole('tab', { name: 'Readings' }).click();
  return page;
}

/** Notes when the sheet's first box stands on the screen, in ms from the moment the page was asked for. */
const watchOpening = `(() => {
  const look = () => {
    const box = document.getElementById('reading-${points[0]}-1');
    if (!box || box.disabled) return false;
    // Drawn in the next frame; the task after that is the first one in which a hand could type.
    requestAnimationFrame(() => setTimeout(() => { window.ellwandOpened = performance.now(); }));
    return true;
  };
  const watch = new MutationObserver(() => { if (look()) watch.disconnect(); });
  watch.observe(document, { childList: true, subtree: true });
})()`;

const LOOKS = 300;
const BETWEEN_LOOKS_MS = 50;

/** How long, in ms, until the sheet's first box takes a figure, in a browser just woken and without network. */
export async function coldStart(seat: Seat): Promise<number> {
  const context = await wake(seat);
  try {
    await context.addInitScript(watchOpening);
    await context.setOffline(true);
    const page = await pageOf(context);
    // The browser itself has opened by then; what is measured is the sheet.
    await page.waitForTimeout(BROWSER_OPENS_MS);
    await page.goto(`${seat.url}/workroom/sheets/${seat.sheetId}`, { waitUntil: 'commit' });
    for (let look = 0; look < LOOKS; look++) {
      const opened = await page.evaluate<number | undefined>('window.ellwandOpened');
      if (opened !== undefined) return opened;
      await page.waitForTimeout(BETWEEN_LOOKS_MS);
    }
    throw new Error(`The sheet did not open within ${(LOOKS * BETWEEN_LOOKS_MS) / 1000} s`);
  } finally {
    await context.close();
  }
}
