import { type Browser, type BrowserContext, expect, type Page } from '@playwright/test';
import { expectAccessible } from './axe.js';
import type { EmptyHouse } from './house.js';

export interface Colleague {
  readonly name: string;
  readonly email: string;
  readonly password: string;
  readonly role: 'Recorder' | 'Curator' | 'Administrator';
}

/** Each person has a browser of their own, with their own cookies. */
export interface Seat {
  readonly person: Colleague;
  readonly context: BrowserContext;
  readonly page: Page;
}

const desktop = { width: 1280, height: 900 };

export async function takeSeat(browser: Browser, person: Colleague, viewport = desktop): Promise<Seat> {
  const context = await browser.newContext({ viewport, locale: 'en-GB', timezoneId: 'UTC' });
  return { person, context, page: await context.newPage() };
}

/** The one-time address that the house printed leads to the first administrator. */
export async function openTheHouse({ page, person }: Seat, house: EmptyHouse): Promise<void> {
  await page.goto(house.firstAdministrator);
  await expect(page.getByRole('heading', { name: 'The first administrator' })).toBeVisible();
  await expectAccessible(page, 'the first administrator');
  await page.getByLabel('Your name').fill(person.name);
  await page.getByLabel('E-mail address').fill(person.email);
  await page.getByLabel('New password').fill(person.password);
  await page.getByRole('button', { name: 'Open the house' }).click();
  await expect(page.getByRole('heading', { name: 'People', level: 1 })).toBeVisible();
}

export async function invite({ page }: Seat, colleague: Colleague): Promise<void> {
  const form = page.getByRole('form', { name: 'Invite a colleague' });
  await form.getByLabel('Name', { exact: true }).fill(colleague.name);
  await form.getByLabel('E-mail address').fill(colleague.email);
  await form.getByRole('checkbox', { name: new RegExp(`^${colleague.role}`) }).check();
  await form.getByRole('button', { name: /invit/i }).click();
  await expect(page.getByRole('main')).toContainText(colleague.email);
}

/** Opens the letter in the mail drop and follows its link, as the colleague would. */
export async function acceptByLetter({ page, person }: Seat, house: EmptyHouse): Promise<void> {
  const letter = page.getByRole('link', { name: new RegExp(person.email.replaceAll('.', '\\.')) });
  await expect(async () => {
    await page.goto(house.inboxUrl);
    await expect(letter).toBeVisible({ timeout: 500 });
  }).toPass({ timeout: 20_000 });
  await letter.click();
  await page.getByRole('article').getByRole('link').first().click();
  await expect(page.getByRole('heading', { name: /^Welcome to/ })).toBeVisible();
  await expectAccessible(page, 'the invitation');
  await page.getByLabel('New password').fill(person.password);
  await page.getByRole('button', { name: 'Set the password and go in' }).click();
  await expect(page.getByRole('heading', { name: 'Garments', level: 1 })).toBeVisible();
}

export async function signIn({ page, person }: Seat, house: EmptyHouse): Promise<void> {
  await page.goto(`${house.url}/workroom/sign-in`);
  await expectAccessible(page, 'sign-in');
  await page.getByLabel('E-mail address').fill(person.email);
  await page.getByLabel('Password', { exact: true }).fill(person.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Garments', level: 1 })).toBeVisible();
}

export async function signOut({ page }: Seat): Promise<void> {
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
}
