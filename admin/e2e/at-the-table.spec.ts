import { type BrowserContext, expect, type Locator, type Page, test } from '@playwright/test';
import { expectAccessible } from './support/axe.js';
import { demonstrationHouse } from './support/demonstration.js';
import { newSheets } from './support/new-sheets.js';

/** What is keyed at each point, in handling order; whole tapes before a rest. */
type Keyed = readonly (readonly [point: string, figure: string, tapes?: string])[];

const bodice: Keyed = [
  ['bust', '872'],
  ['waist', '606'],
  ['inner-waist-band', '592'],
  ['neck', '372'],
  ['side-seam', '188'],
  ['armscye', '424'],
  ['cuff', '228'],
  ['neck-to-hem-front', '458', '0'],
  ['waist-to-hem-front', '118'],
  ['point-depth', '62'],
  ['shoulder-seam', '104'],
  ['across-front', '322'],
  ['sleeve-outer', '588'],
  ['sleeve-under', '438'],
  ['sleeve-widest', '186'],
  ['elbow', '151'],
  ['across-back', '312'],
  ['underarm-to-underarm-back', '392'],
  ['neck-to-hem-back', '498', '0'],
  ['waist-to-hem-back', '112'],
];
const skirt: Keyed = [
  ['waistband', '612'],
  ['hip', '982'],
  ['hem', '742', '3'],
  ['hem-depth', '94'],
  ['own-band-to-drapery-tapes', '312'],
  ['waist-to-hem-front', '1020'],
  ['waist-to-hem-side', '1048'],
  ['waist-to-hem-back', '1184'],
  ['opening', '262'],
];

const box = (page: Page, point: string): Locator => page.locator(`#reading-${point}-1`);
const tapes = (page: Page, point: string): Locator => page.locator(`#count-${point}-1`);
const lies = (page: Page): Locator => page.getByRole('button', { name: /It lies so/ });

async function signIn(page: Page, role: 'recorder' | 'curator'): Promise<void> {
  const house = demonstrationHouse();
  const { email, password } = house.account(role);
  await page.goto(`${house.url}/workroom/sign-in`);
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Garments', level: 1 })).toBeVisible();
}

const sheetAddress = (id: string | undefined) => `/workroom/sheets/${id ?? ''}`;

/** The box of a point has the focus, or the garment is to be turned first: then that is said, by this means. */
async function reach(page: Page, wanted: Locator, sayItLies: () => Promise<void>): Promise<void> {
  await expect(async () => {
    if (await lies(page).isVisible()) await sayItLies();
    await expect(wanted).toBeFocused({ timeout: 400 });
  }).toPass({ timeout: 15_000 });
}

/** The same where nothing has the focus, as on a tablet: the row is the one that is lit. */
async function reachRow(page: Page, point: string): Promise<void> {
  await expect(async () => {
    if (await lies(page).isVisible()) await lies(page).tap();
    await expect(page.locator(`#row-${point}-1`)).toHaveAttribute('aria-current', 'step', { timeout: 400 });
  }).toPass({ timeout: 15_000 });
}

async function keyByKeyboard(page: Page, keyed: Keyed): Promise<void> {
  const byEnter = () => page.keyboard.press('Enter');
  for (const [point, figure, count] of keyed) {
    const hasCount = (await tapes(page, point).count()) > 0;
    await reach(page, hasCount ? tapes(page, point) : box(page, point), byEnter);
    if (hasCount) {
      await page.keyboard.type(count ?? '0');
      await page.keyboard.press('Enter');
      await expect(box(page, point)).toBeFocused();
    }
    await page.keyboard.type(figure);
    await page.keyboard.press('Enter');
  }
  await expect(page.getByText(/^All readings sent/)).toBeVisible();
}

async function keyByTouch(page: Page, keyed: Keyed): Promise<void> {
  const keypad = page.getByRole('group', { name: 'Keypad' });
  const tapFigures = async (figure: string) => {
    for (const digit of figure) await keypad.getByRole('button', { name: digit, exact: true }).tap();
  };
  const next = () => keypad.getByRole('button', { name: 'Next', exact: true }).tap();
  for (const [point, figure, count] of keyed) {
    const hasCount = (await tapes(page, point).count()) > 0;
    await reachRow(page, point);
    if (hasCount) {
      await tapes(page, point).tap();
      await tapFigures(count ?? '0');
      await box(page, point).tap();
    }
    await tapFigures(figure);
    await next();
  }
  await expect(page.getByText(/^All readings sent/)).toBeVisible();
}

async function expectTaken(page: Page, keyed: Keyed): Promise<void> {
  await page.reload();
  for (const [point, figure] of keyed) await expect(box(page, point)).toHaveValue(figure);
  await expect(page.getByText(`${keyed.length} of ${keyed.length} points`)).toBeVisible();
}

test('a bodice and a skirt are keyed by keyboard alone', async ({ page }) => {
  await signIn(page, 'recorder');
  const sheets = await newSheets(page);
  for (const [part, keyed] of [
    ['Bodice', bodice],
    ['Skirt', skirt],
  ] as const) {
    await page.goto(sheetAddress(sheets[part]));
    await keyByKeyboard(page, keyed);
    await expectTaken(page, keyed);
  }
  // What was keyed last is taken back into its box, and read again.
  await page.keyboard.press('Alt+6');
  await expect(page.getByRole('button', { name: 'Prepare for the table' })).toBeVisible();
  await page.keyboard.press('Alt+1');
  await expect(box(page, 'waistband')).toBeVisible();
});

test.describe('by touch alone', () => {
  test.use({ viewport: { width: 768, height: 1024 }, hasTouch: true });

  test('a bodice and a skirt are keyed on the sheet’s own keypad', async ({ page }) => {
    await signIn(page, 'recorder');
    const sheets = await newSheets(page);
    for (const [part, keyed] of [
      ['Bodice', bodice],
      ['Skirt', skirt],
    ] as const) {
      await page.goto(sheetAddress(sheets[part]));
      await lies(page).tap();
      const keypad = page.getByRole('button', { name: 'Keypad' });
      if ((await keypad.getAttribute('aria-pressed')) !== 'true') await keypad.tap();
      await keyByTouch(page, keyed);
      await expectTaken(page, keyed);
    }
  });
});

test('axe finds nothing on the sheet, whatever it shows', async ({ page }) => {
  await signIn(page, 'recorder');
  const sheets = await newSheets(page);
  await page.goto(sheetAddress(sheets['Skirt']));
  await expectAccessible(page, 'how the garment lies');
  await lies(page).click();
  await box(page, 'waistband').fill('1950');
  await box(page, 'waistband').press('Enter');
  await expect(page.getByText(/^All readings sent/)).toBeVisible();
  for (const size of [
    { width: 390, height: 844 },
    { width: 768, height: 1024 },
    { width: 1280, height: 900 },
  ]) {
    await page.setViewportSize(size);
    for (const tab of ['Readings', /^Findings/, 'Worked out', 'Noted', 'Box list', 'Facts']) {
      await page.getByRole('tab', { name: tab }).click();
      await expectAccessible(page, `${String(tab)} at ${size.width} px`);
    }
    await page.getByRole('tab', { name: 'Readings' }).click();
    await page.getByRole('button', { name: 'Change hands' }).click();
    await expectAccessible(page, `hands at ${size.width} px`);
    await page.getByRole('button', { name: 'Back to the sheet' }).click();
  }
  await page.goto('/workroom/tray');
  await expectAccessible(page, 'the tray');
});

test('two browsers at one sheet: both arrive, and a true conflict is shown and decided', async ({
  browser,
}) => {
  const [first, second] = await Promise.all([openAt(browser.newContext()), openAt(browser.newContext())]);
  await signIn(first, 'recorder');
  await signIn(second, 'curator');
  const { Skirt } = await newSheets(first);
  for (const page of [first, second]) {
    await page.goto(sheetAddress(Skirt));
    await lies(page).click();
  }
  await key(first, 'waistband', '612');
  await key(second, 'hip', '982');
  for (const page of [first, second]) {
    await page.reload();
    await expect(box(page, 'waistband')).toHaveValue('612');
    await expect(box(page, 'hip')).toHaveValue('982');
  }
  // Both read the depth of the hem before either has heard of the other.
  await second.context().setOffline(true);
  await second.bringToFront();
  await box(second, 'hem-depth').fill('96');
  await box(second, 'hem-depth').press('Enter');
  await expect(second.getByText('Kept on this tablet')).toBeVisible();
  await key(first, 'hem-depth', '94');
  await second.context().setOffline(false);
  await expect(second.getByText('1 reading needs your decision')).toBeVisible({ timeout: 45_000 });
  const row = second.locator('#row-hem-depth-1');
  await expect(row).toContainText('96');
  await expect(row).toContainText('94');
  await row.getByRole('button', { name: 'Keep both and read again' }).click();
  await expect(second.locator('#reading-hem-depth-2')).toHaveValue('96');
  await expect(box(second, 'hem-depth')).toHaveValue('94');
  await first.reload();
  await expect(first.locator('#reading-hem-depth-2')).toHaveValue('96');
  for (const page of [first, second]) await page.context().close();
});

async function openAt(opening: Promise<BrowserContext>): Promise<Page> {
  return (await opening).newPage();
}

async function key(page: Page, point: string, figure: string): Promise<void> {
  await box(page, point).fill(figure);
  await box(page, point).press('Enter');
  await expect(page.getByText(/^All readings sent/)).toBeVisible();
}
