import type { Role } from '@ellwand/shared/records/roles';
import { expect, type Locator, type Page, test } from '@playwright/test';
import { expectAccessible } from './support/axe.js';
import { demonstrationHouse } from './support/demonstration.js';

const widths = [390, 820, 1280];
/** Run twice against one house, the second run makes another point and another version. */
const pointName = `Pad to tape ${Date.now() % 100_000}`;

async function signInAs(page: Page, role: Role): Promise<void> {
  const house = demonstrationHouse();
  const { email, password } = house.account(role);
  await page.goto(`${house.url}/workroom/sign-in`);
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Garments', level: 1 })).toBeVisible();
}

async function lookAt(page: Page, screen: string): Promise<void> {
  for (const width of widths) {
    await page.setViewportSize({ width, height: 900 });
    await expectAccessible(page, `${screen} at ${width} px`);
    const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    expect(overflow, `${screen} is wider than ${width} px`).toBeLessThanOrEqual(0);
  }
}

async function tap(drawing: Locator, across: number, down: number): Promise<void> {
  await drawing.scrollIntoViewIfNeeded();
  const box = await drawing.boundingBox();
  if (!box) throw new Error('the drawing is not shown');
  await drawing.click({ position: { x: box.width * across, y: box.height * down } });
}

test('an administrator makes a protocol’s next version, with a point drawn on the garment', async ({
  page,
}) => {
  await signInAs(page, 'administrator');
  await page.getByRole('link', { name: 'Protocols', exact: true }).click();
  await expect(page.getByRole('link', { name: 'Bustles' })).toBeVisible();
  await lookAt(page, 'the protocols');
  await page.getByRole('link', { name: 'Bustles' }).click();
  const title = page.getByRole('heading', { name: /^What changes in version \d+$/ });
  await expect(title).toBeVisible();
  const version = Number(/\d+/.exec((await title.textContent()) ?? '')?.[0]);
  await lookAt(page, 'a protocol');

  await page.getByRole('button', { name: 'Make a point of our own' }).click();
  await page.getByLabel('Name').fill(pointName);
  await page.getByLabel('Definition').fill('From the top of the pad down to the tape beneath it.');
  await page.getByLabel('From', { exact: true }).fill('the upper edge of the pad');
  await page.getByLabel('To', { exact: true }).fill('the upper edge of the tape');
  await page.getByLabel('Handling step').selectOption('Back up');
  await page.getByLabel('Searched with').selectOption('Bustle');
  const drawing = page.getByTestId('line-drawing').getByRole('img');
  await tap(drawing, 0.5, 0.4);
  await tap(drawing, 0.5, 0.7);
  await expect(page.getByLabel(/^Down, place/)).toHaveCount(2);
  await page.getByLabel('Across, place 1, millimetres').press('Shift+ArrowUp');
  await lookAt(page, 'an own point');
  await page.getByRole('button', { name: 'Put it in the protocol' }).click();

  await page.getByRole('button', { name: `Up ${pointName}` }).click();
  await page.getByLabel('Why there is a new version').fill('To pad a figure from the tape up.');
  await page.getByRole('button', { name: `Make version ${version}` }).click();
  await expect(page.getByText(`Version ${version} is made. New sheets are taken by it.`)).toBeVisible();
  const versions = page.getByRole('region', { name: 'Versions' });
  await expect(versions.getByText(`Own point “${pointName}” asked for, may be left out.`)).toBeVisible();
  await page.getByRole('link', { name: 'All protocols' }).click();
  const card = page.getByRole('listitem').filter({ hasText: 'Bustles' });
  await expect(card).toContainText(`Version ${version}`);
});

test('a recorder reads a protocol and its versions, and changes nothing', async ({ page }) => {
  await signInAs(page, 'recorder');
  await page.getByRole('link', { name: 'Protocols', exact: true }).click();
  await page.getByRole('link', { name: 'Skirts' }).click();
  await expect(page.getByText('Band to drapery tapes', { exact: true })).toBeVisible();
  await expect(page.getByRole('button', { name: /^(Drop|Up|Down|Add|Make)/ })).toHaveCount(0);
  await lookAt(page, 'a protocol to read');
  await page.getByRole('link', { name: 'Show version 1' }).click();
  await expect(page.getByText(/An earlier version/)).toBeVisible();
  await expect(page.getByText('Band to drapery tapes', { exact: true })).toHaveCount(0);
});
