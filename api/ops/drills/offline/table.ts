import { type BrowserContext, chromium, type Page } from 'playwright-core';
import type { Entry } from './ledger.js';
import { reader } from './museum.js';

const flags = [
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

/** Points of the sheet that take one figure each, by what their boxes are called. */
export const points: readonly string[] = [
  'Bust or chest',
  'Waist',
  'Inner waist band',
  'Neck',
  'Side seam',
  'Armscye',
  'Cuff',
];

export interface Seat {
  readonly chromium: string;
  readonly profile: string;
  readonly url: string;
  readonly sheetId: string;
  /** Run before every page, for the control that must fail. */
  readonly initScript?: string;
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
    if (seat.initScript) await context.addInitScript(seat.initScript);
    const page = context.pages()[0] ?? (await context.newPage());
    page.setDefaultTimeout(SOON_MS);
    return new Tablet(seat, context, page);
  }

  async signIn(): Promise<void> {
    await this.page.goto(`${this.seat.url}/workroom/sign-in`);
    await this.page.getByLabel('E-mail address').fill(reader.email);
    await this.page.getByLabel('Password', { exact: true }).fill(reader.password);
    await this.page.getByRole('button', { name: 'Sign in' }).click();
    await this.page.getByRole('heading', { name: 'Garments', level: 1 }).waitFor();
    // The shell must be on this tablet before the network goes.
    await this.page.evaluate('navigator.serviceWorker.ready.then(() => true)');
  }

  /** Opens the sheet, from the tablet alone where there is no network, and goes past what is said once. */
  async openSheet(): Promise<void> {
    await this.page.goto(`${this.seat.url}/workroom/sheets/${this.seat.sheetId}`);
    const lies = this.page.getByRole('button', { name: /It lies so/ });
    await lies.or(this.box(points[0]!)).first().waitFor();
    // The question covers the boxes, and may come a moment after them.
    await this.page.waitForTimeout(SETTLES_MS);
    if (await lies.isVisible()) await lies.click();
    await this.box(points[0]!).waitFor();
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

  figureIn(point: string): Promise<string> {
    return this.box(point).inputValue();
  }

  /** Until everything that was keyed is at the museum. */
  async allSent(): Promise<void> {
    await this.page.getByText(/^All readings sent/).waitFor({ timeout: 90_000 });
  }

  /** The tab dies without being told: no handler of the page runs. */
  async kill(): Promise<void> {
    const dying = this.page;
    this.page = await this.context.newPage();
    this.page.setDefaultTimeout(SOON_MS);
    const session = await this.context.newCDPSession(dying);
    await session.send('Page.crash').catch(() => undefined);
    await dying.close({ runBeforeUnload: false }).catch(() => undefined);
  }

  async close(): Promise<void> {
    await this.context.close();
  }

  private box(point: string) {
    return this.page.getByRole('textbox', { name: new RegExp(`^${point}\\s*, millimetres`) });
  }
}
