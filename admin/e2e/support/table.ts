import { expect, type Page } from '@playwright/test';

/** What is keyed at a point: figures; whole tapes and a rest; or why it cannot be taken. */
export type Keyed =
  string | { readonly tapes: string; readonly rest: string } | { readonly notTaken: string };

/** Says "it lies so" when the garment has been turned; the question comes once for each handling step. */
async function turnWhenAsked(page: Page): Promise<void> {
  const goOn = page.getByRole('button', { name: 'It lies so: go on' });
  if (await goOn.isVisible()) await goOn.click();
}

/** Keys every point in handling order, going on with Enter as at the table. */
export async function keySheet(page: Page, keyed: Readonly<Record<string, Keyed>>): Promise<void> {
  await expect(page.getByRole('button', { name: 'It lies so: go on' })).toBeVisible();
  for (const [point, value] of Object.entries(keyed)) {
    await turnWhenAsked(page);
    await keyPoint(page, point, value);
  }
  await expect(page.getByRole('banner').getByRole('status')).toHaveText(/^All readings sent/);
}

async function keyPoint(page: Page, point: string, value: Keyed): Promise<void> {
  const box = page.getByRole('textbox', { name: new RegExp(`^${point}\\s*, millimetres`) });
  if (typeof value === 'string') {
    await box.fill(value);
    await box.press('Enter');
  } else if ('tapes' in value) {
    const count = page.getByRole('textbox', { name: `${point}, whole tapes` });
    await count.fill(value.tapes);
    await count.press('Enter');
    await expect(box).toBeFocused();
    await box.fill(value.rest);
    await box.press('Enter');
  } else {
    await box.focus();
    await turnWhenAsked(page);
    await page.getByRole('button', { name: 'Cannot be taken' }).click();
    await page.getByRole('radio', { name: value.notTaken }).check();
    await page.getByRole('button', { name: 'Keep the reason' }).click();
  }
}

export async function showTab(page: Page, name: string | RegExp): Promise<void> {
  await page.getByRole('tab', { name }).click();
}

/** Answers the first open finding that says this. */
export async function answerFinding(page: Page, says: RegExp, reason: string): Promise<void> {
  await showTab(page, /^Findings/);
  // Questions stand before notes, which may name the same points.
  const finding = page.getByRole('listitem').filter({ hasText: says }).first();
  await finding.getByLabel('Or say why it is right').fill(reason);
  await finding.getByRole('button', { name: 'Keep the reason' }).click();
  await expect(finding).toContainText(reason);
}

export async function completeSheet(page: Page): Promise<void> {
  await showTab(page, 'Box list');
  await page.getByRole('button', { name: 'Complete the sheet' }).click();
  await expect(page.getByRole('button', { name: 'Reopen the sheet' })).toBeVisible();
}
