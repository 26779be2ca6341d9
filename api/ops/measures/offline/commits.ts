import type { Page } from 'playwright-core';
import { points } from '../../drills/offline/table.js';

/**
 * Notes, for each reading, how long it takes from the press of Enter until its transaction on the device's database is
 * complete, with the durability that was asked for.
 */
export const watchCommits = `(() => {
  let pressedAt = null;
  const commits = [];
  addEventListener('keydown', (event) => { if (event.key === 'Enter') pressedAt = performance.now(); }, true);
  const begin = IDBDatabase.prototype.transaction;
  IDBDatabase.prototype.transaction = function (stores, mode, options) {
    const transaction = begin.call(this, stores, mode, options);
    if (mode === 'readwrite' && [].concat(stores).includes('outbox') && pressedAt !== null) {
      const from = pressedAt;
      pressedAt = null;
      transaction.addEventListener('complete', () =>
        commits.push({ ms: performance.now() - from, durability: transaction.durability }));
    }
    return transaction;
  };
  window.ellwandCommits = commits;
})()`;

interface Commit {
  readonly ms: number;
  readonly durability: string;
}

/** No hand reads the next figure off a tape sooner. */
const REST_MS = 400;

/** Keys so many readings, one after another, and says in ms how long each took to reach the disk. */
export async function keyReadings(page: Page, count: number): Promise<readonly number[]> {
  for (let index = 0; index < count; index++) {
    const box = page.locator(`#reading-${points[index % points.length]}-1`);
    await box.fill(String(300 + index));
    await box.press('Enter');
    await page.waitForTimeout(REST_MS);
  }
  const commits = await settled(page, count);
  const loose = commits.filter(({ durability }) => durability !== 'strict');
  if (loose.length > 0) throw new Error(`${loose.length} readings were not written with strict durability`);
  return commits.map(({ ms }) => ms);
}

const LOOKS = 200;
const BETWEEN_LOOKS_MS = 50;

/** The page's policy lets nobody evaluate within it while it waits: it is asked again and again from outside. */
async function settled(page: Page, count: number): Promise<readonly Commit[]> {
  for (let look = 0; look < LOOKS; look++) {
    const commits = await page.evaluate<Commit[]>('window.ellwandCommits');
    if (commits.length >= count) return commits;
    await page.waitForTimeout(BETWEEN_LOOKS_MS);
  }
  throw new Error(
    `Not all of ${count} readings reached the disk within ${(LOOKS * BETWEEN_LOOKS_MS) / 1000} s`,
  );
}
