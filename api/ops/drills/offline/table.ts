import { type BrowserContext, chromium, type Page } from 'playwright-core';
import type { Entry } from './ledger.js';
import { reader } from './museum.js';

/** A Chromium that speaks to nobody but the house. */
export const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--no-first-run',
];
const SOON_MS = 20_000;
/** Longer than a hand rests before a draft is written (150 ms). */
const REST_MS = 350;
const SETTLES_MS = 250;
/** How often a box is looked at for a figure that a dying tab may still be writing. */
const LOOKS = 12;
const SENT_WITHIN_MS = 90_000;
/** As if nothing of it had ever reached the disk. */
const forgetAll = `new Promise((resolve, reject) => {
  const opening = indexedDB.open('ellwand-workroom');
  opening.onerror = reject;
  opening.onsuccess = () => {
    const clearing = opening.result.transaction(['outbox', 'drafts'], 'readwrite');
    clearing.objectStore('outbox').clear();
    clearing.objectStore('drafts').clear();
    clearing.oncomplete = () => resolve(true);
  };
})`;
/** What is on the tablet's own disk. */
const countAll = `new Promise((resolve, reject) => {
  const opening = indexedDB.open('ellwand-workroom');
  opening.onerror = reject;
  opening.onsuccess = () => {
    const looking = opening.result.transaction(['outbox', 'drafts']);
    const outbox = looking.objectStore('outbox').getAll();
    const drafts = looking.objectStore('drafts').getAll();
    looking.oncomplete = () => resolve(JSON.stringify({ outbox: outbox.result, drafts: drafts.result }));
  };
})`;
const DIES_WITHIN_MS = 300;

/** Points of the sheet that take one figure each and come before the garment is turned. */
export const points: readonly string[] = [
  'bust',
  'waist',
  'inner-waist-band',
  'neck',
  'side-seam',
  'armscye',
];

export interface Seat {
  readonly chromium: string;
  readonly profile: string;
  readonly url: string;
  readonly sheetId: string;
  /** For the control: whatever waits on the disk is gone when a tab dies. */
  readonly forgetful: boolean;
}

/** A tablet at the table: a browser with a profile that outlives its tabs, and a hand that types. */
export class Tablet {
  private constructor(
    private readonly seat: Seat,
    private readonly context: BrowserContext,
    private page: Page,
  ) {}

  static async open(seat: Seat): Promise<Tablet> {
    const context = await chromium.launchPersistentContext(seat.profile, {
      executablePath: seat.chromium,
      args: flags,
      viewport: { width: 1024, height: 768 },
      locale: 'en-GB',
    });
    const page = context.pages()[0] ?? (await context.newPage());
    const tablet = new Tablet(seat, context, page);
    await tablet.attend(page);
    return tablet;
  }

  async signIn(): Promise<void> {
    await this.page.goto(`${this.seat.url}/workroom/sign-in`);
    await sayWhoItIs(this.page);
    await this.page.getByRole('heading', { name: 'Garments', level: 1 }).waitFor();
    // The shell must be on this tablet before the network goes.
    await this.page.evaluate('navigator.serviceWorker.ready.then(() => true)');
    await this.staySignedIn(this.page);
  }

  /** Opens the sheet, from the tablet alone where there is no network, and goes past what is said once. */
  async openSheet(): Promise<void> {
    await this.page.goto(`${this.seat.url}/workroom/sheets/${this.seat.sheetId}`);
    await this.box(points[0]!).click();
    // The question about how the garment lies may come a moment after the boxes.
    await this.page.waitForTimeout(SETTLES_MS);
  }

  /** Types a figure and leaves it in its box. */
  async type({ point, figure }: Entry): Promise<void> {
    await this.box(point).click();
    await this.box(point).fill(figure);
    await this.page.waitForTimeout(REST_MS);
  }

  async enter(point: string): Promise<void> {
    await this.box(point).press('Enter');
  }

  /** Whether a figure stands in its box, also where the tab that died wrote it down a moment late. */
  async comesBack({ point, figure }: Entry): Promise<boolean> {
    for (let look = 0; look < LOOKS; look++) {
      if ((await this.box(point).inputValue()) === figure) return true;
      await this.page.waitForTimeout(SETTLES_MS);
    }
    return false;
  }

  /** Until everything that was keyed is at the museum. */
  async allSent(): Promise<void> {
    // Reading a box lets whoever must sign in again do so first.
    await this.box(points[0]!).click({ trial: true });
    const sent = this.page.getByText(/^All readings sent/);
    // A tablet that forgets may have nothing to send, and then never says so.
    if (this.seat.forgetful) await sent.waitFor({ timeout: SOON_MS / 4 }).catch(() => undefined);
    else await sent.waitFor({ timeout: SENT_WITHIN_MS });
  }

  /** The tab dies without being told: no handler of the page runs. */
  async kill(): Promise<void> {
    const dying = this.page;
    if (this.seat.forgetful) await dying.evaluate(forgetAll);
    this.page = await this.context.newPage();
    await this.attend(this.page);
    await this.staySignedIn(this.page);
    const session = await this.context.newCDPSession(dying);
    // A renderer that has died answers nothing any more: nobody waits for it long.
    const dead = session.send('Page.crash').catch(() => undefined);
    await Promise.race([dead, this.page.waitForTimeout(DIES_WITHIN_MS)]);
    const gone = dying.close({ runBeforeUnload: false }).catch(() => undefined);
    await Promise.race([gone, this.page.waitForTimeout(DIES_WITHIN_MS)]);
  }

  /** What the tablet shows just now, for whoever must find out why a round came to a halt. */
  async shown(): Promise<string> {
    const text = await this.page
      .locator('body')
      .innerText({ timeout: REST_MS })
      .catch(() => 'a page that is dead');
    const waits = await this.page.evaluate<string>(countAll).catch(() => 'nobody knows what');
    return `${this.page.url()} holds ${waits} and shows: ${text.replace(/\s+/g, ' ').slice(0, 400)}`;
  }

  async close(): Promise<void> {
    await this.context.close();
  }

  /** Says "it lies so" whenever the garment is to be turned. */
  private async attend(page: Page): Promise<void> {
    page.setDefaultTimeout(SOON_MS);
    const lies = page.getByRole('button', { name: /It lies so/ });
    await page.addLocatorHandler(lies, () => lies.click());
  }

  /** Signs in again where a broken network has cost the session: what was keyed waits for that. */
  private async staySignedIn(page: Page): Promise<void> {
    await page.addLocatorHandler(page.getByLabel('Password', { exact: true }), () => sayWhoItIs(page));
  }

  private box(point: string) {
    return this.page.locator(`#reading-${point}-1`);
  }
}

/** Signs in as the reader, also where only the password is asked for again. */
export async function sayWhoItIs(page: Page): Promise<void> {
  const email = page.getByLabel('E-mail address');
  if (await email.isEditable().catch(() => false)) await email.fill(reader.email);
  await page.getByLabel('Password', { exact: true }).fill(reader.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}
