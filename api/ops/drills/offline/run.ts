/**
 * `npm run drill:offline -- --rounds N [--control]`: types readings into a real Workroom while tabs and the API are
 * killed and the network breaks, then holds what was typed against what MariaDB has kept. Its last line is
 * `N rounds: 0 lost, 0 doubled`; anything else ends with 1. With --control the tablet forgets what waits when a tab
 * dies, and the drill must find losses.
 */
import fs from 'node:fs';
import path from 'node:path';
import { parseArgs } from 'node:util';
import { buildWhatChanged } from '../../lib/builds.mjs';
import { runAsAdministrator } from '../../lib/database-server.mjs';
import { CHROMIUM, installDebianPackages, MARIADB } from '../../lib/debian-packages.mjs';
import { root } from '../../lib/places.mjs';
import { runMain } from '../../lib/plain-failure.mjs';
import { freePort } from '../../lib/ports.mjs';
import { findProgram } from '../../lib/programs.mjs';
import { step } from '../../lib/progress.mjs';
import { makeTestFolder, removeTestFolder } from '../../lib/test-folder.mjs';
import { closeTestHouses, openTestHouse } from '../../lib/test-house.mjs';
import { BreakingProxy } from './breaking-proxy.js';
import { type Entry, reckon } from './ledger.js';
import { layTheTable } from './museum.js';
import { dice, playRound } from './rounds.js';
import { Tablet } from './table.js';

const MOST_ROUNDS = 2_000;
async function keptIn(dataFolder: string): Promise<readonly Entry[]> {
  const rows = await runAsAdministrator(dataFolder, ['SELECT point_id, typed FROM ellwand.reading']);
  return rows
    .split('\n')
    .filter((line) => line.includes('\t'))
    .map((line) => {
      const [point = '', figure = ''] = line.split('\t');
      return { point, figure };
    });
}

interface Drill {
  readonly rounds: number;
  readonly control: boolean;
  readonly folder: string;
}

async function drill({ rounds, control, folder }: Drill): Promise<boolean> {
  const dataFolder = path.join(folder, 'house');
  const outside = await freePort();
  const url = `http://127.0.0.1:${outside}`;
  const house = await openTestHouse(root, dataFolder, ['--empty'], { ELLWAND_PUBLIC_URL: url });
  const inside = Number(/:(\d+)$/.exec(house.listens ?? '')?.[1]);
  const proxy = await BreakingProxy.open(outside, () => inside);
  const { inboxUrl = '', firstAdministrator = '' } = house;
  const { sheetId } = await layTheTable(url, { inboxUrl, firstAdministrator });
  const profile = path.join(folder, 'tablet');
  fs.mkdirSync(profile, { recursive: true });
  const chromium = findProgram(CHROMIUM.program) ?? '';
  const seat = { chromium, profile, url, sheetId, forgetful: control };
  const tablet = await Tablet.open(seat);
  const typed: Entry[] = [];
  try {
    await tablet.signIn();
    await tablet.openSheet();
    const roll = dice(rounds);
    for (let round = 1; round <= rounds; round++) {
      const scene = await playRound({ tablet, proxy, dataFolder, typed }, roll);
      console.log(`round ${round} of ${rounds}: ${scene}, ${typed.length} figures typed so far`);
    }
    const { lost, doubled, strange } = reckon(typed, await keptIn(dataFolder));
    for (const [what, entries] of Object.entries({ lost, doubled, strange })) {
      for (const { point, figure } of entries) console.log(`${what}: ${point} ${figure}`);
    }
    console.log(`${typed.length} figures typed, ${proxy.lost} answers lost on their way`);
    console.log(`${rounds} rounds: ${lost.length} lost, ${doubled.length} doubled`);
    return lost.length + doubled.length + strange.length === 0;
  } catch (fault) {
    console.log(await tablet.shown());
    throw fault;
  } finally {
    await tablet.close();
    await proxy.close();
  }
}

function readArguments(): { rounds: number; control: boolean } {
  const { values } = parseArgs({
    options: { rounds: { type: 'string', default: '10' }, control: { type: 'boolean', default: false } },
  });
  const rounds = Number(values.rounds);
  if (!Number.isInteger(rounds) || rounds < 1 || rounds > MOST_ROUNDS)
    throw new Error(`--rounds takes a whole number from 1 to ${MOST_ROUNDS}, not “${values.rounds}”`);
  return { rounds, control: values.control };
}

void runMain(async () => {
  const asked = readArguments();
  await installDebianPackages([MARIADB, CHROMIUM], step);
  await buildWhatChanged(root, step);
  const folder = await makeTestFolder(root);
  try {
    const clean = await drill({ ...asked, folder });
    return clean === asked.control ? 1 : 0;
  } finally {
    await closeTestHouses();
    await removeTestFolder(folder);
  }
});
