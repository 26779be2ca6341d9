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

/** Keys so many readings, one after another, and says in ms how long each took to reach the disk. */
export async function keyReadings(page: Page, count: number): Promise<readonly number[]> {
  for (let index = 0; index < count; index++) {
    const box = page.locator(`#reading-${points[index % points.length]}-1`);
    await box.fill(String(300 + index));
    await box.press('Enter');
  }
  await page.waitForFunction(`window.ellwandCommits.length >= ${count}`);
  const commits = await page.evaluate<Commit[]>('window.ellwandCommits');
  const loose = commits.filter(({ durability }) => durability !== 'strict');
  if (loose.length > 0) throw new Error(`${loose.length} readings were not written with strict durability`);
  return commits.map(({ ms }) => ms);
}
