/**
 * `npm run measure:offline`: what the measuring table promises of speed, measured in Chromium on a real Ellwand. How
 * long a reading takes to reach the disk, how long the sheet takes to open without network, and how heavy the
 * applications are. Prints each figure beside what it may be at most; one that is missed ends with 1.
 */
import fs from 'node:fs';
import path from 'node:path';
import { chromium } from 'playwright-core';
import { buildWhatChanged } from '../../lib/builds.mjs';
import { CHROMIUM, installDebianPackages, MARIADB } from '../../lib/debian-packages.mjs';
import { root } from '../../lib/places.mjs';
import { runMain } from '../../lib/plain-failure.mjs';
import { findProgram } from '../../lib/programs.mjs';
import { step } from '../../lib/progress.mjs';
import { makeTestFolder, removeTestFolder } from '../../lib/test-folder.mjs';
import { closeTestHouses, openTestHouse } from '../../lib/test-house.mjs';
import { layTheTable } from '../../drills/offline/museum.js';
import { flags } from '../../drills/offline/table.js';
import { weigh } from './bundles.js';
import { keyReadings } from './commits.js';
import { isWithin, line, type Measured, percentile } from './figures.js';
import { coldStart, prepare, type Seat, wake } from './tablet.js';

const READINGS = 240;
const STARTS = 15;

async function seatAt(folder: string): Promise<Seat> {
  const house = await openTestHouse(root, path.join(folder, 'house'), ['--empty']);
  const { inboxUrl = '', firstAdministrator = '', listens: url } = house;
  const { sheetId } = await layTheTable(url, { inboxUrl, firstAdministrator });
  const profile = path.join(folder, 'tablet');
  fs.mkdirSync(profile, { recursive: true });
  return { chromium: findProgram(CHROMIUM.program) ?? '', profile, url, sheetId };
}

async function weights({ chromium: executablePath, url, sheetId }: Seat): Promise<Measured[]> {
  const browser = await chromium.launch({ executablePath, args: flags });
  try {
    const { site, shell, sheet } = await weigh(browser, url, sheetId);
    return [
      { what: 'scripts of the public front page, brotli', value: site, most: 115, unit: 'KB' },
      {
        what: 'scripts of the Workroom’s list of garments, brotli',
        value: shell,
        most: 160,
        unit: 'KB',
      },
      {
        what: 'scripts of a measuring sheet, brotli',
        value: sheet,
        most: 230,
        unit: 'KB',
      },
    ];
  } finally {
    await browser.close();
  }
}

async function commits(seat: Seat): Promise<Measured[]> {
  const context = await wake(seat);
  try {
    const page = await prepare(context, seat);
    await context.setOffline(true);
    const times = await keyReadings(page, READINGS);
    const median = percentile(times, 0.5).toFixed(1);
    const worst = Math.max(...times).toFixed(1);
    console.log(`${times.length} readings without network: median ${median} ms, slowest ${worst} ms`);
    return [
      {
        what: 'from Enter to the disk, strict, 95 of 100 within',
        value: percentile(times, 0.95),
        most: 20,
        unit: 'ms',
      },
    ];
  } finally {
    await context.close();
  }
}

async function starts(seat: Seat): Promise<Measured[]> {
  const times: number[] = [];
  for (let start = 1; start <= STARTS; start++) times.push(await coldStart(seat));
  console.log(`${STARTS} cold starts without network: ${times.map((ms) => ms.toFixed(0)).join(', ')} ms`);
  return [
    { what: 'sheet opened without network, median', value: percentile(times, 0.5), most: 1000, unit: 'ms' },
  ];
}

void runMain(async () => {
  await installDebianPackages([MARIADB, CHROMIUM], step);
  await buildWhatChanged(root, step);
  const folder = await makeTestFolder(root);
  try {
    const seat = await seatAt(folder);
    const measured = [...(await commits(seat)), ...(await starts(seat)), ...(await weights(seat))];
    for (const one of measured) console.log(line(one));
    return measured.every(isWithin) ? 0 : 1;
  } finally {
    await closeTestHouses();
    await removeTestFolder(folder);
  }
});
