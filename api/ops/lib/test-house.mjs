// @ts-check
import { spawn } from 'node:child_process';
import path from 'node:path';
import { readRunning } from './house-lock.mjs';
import { PlainFailure } from './plain-failure.mjs';
import { freePort } from './ports.mjs';
import { findProgram, pause } from './programs.mjs';
import { endProcess, hasEnded } from './supervised.mjs';

/** The demonstration's pictures take the longest, on two busy cores. */
const OPEN_WITHIN_MS = 5 * 60_000;
const CLOSED_WITHIN_MS = 90_000;
const POLL_MS = 200;

/** @type {Set<import('node:child_process').ChildProcess>} */
const openHouses = new Set();

/** Closes every house that was opened here. */
export async function closeTestHouses() {
  const closing = [...openHouses].map((child) => endProcess(child, CLOSED_WITHIN_MS));
  openHouses.clear();
  await Promise.all(closing);
}

/**
 * Opens a whole Ellwand by its own start script, with a data folder and ports of its own.
 * @param {string} root
 * @param {string} dataFolder
 * @param {string[]} args of start.mjs
 * @param {NodeJS.ProcessEnv} [settings] beyond port and data folder
 * @returns {Promise<import('./house-lock.mjs').Running & { listens: string }>} its addresses, and where it listens
 */
export async function openTestHouse(root, dataFolder, args, settings = {}) {
  const port = await freePort();
  const child = spawnStart(root, args, {
    ELLWAND_PORT: String(port),
    ELLWAND_DATA: dataFolder,
    ...settings,
  });
  openHouses.add(child);
  let output = '';
  const keep = (/** @type {Buffer} */ chunk) => (output += chunk.toString());
  child.stdout.on('data', keep);
  child.stderr.on('data', keep);
  const deadline = Date.now() + OPEN_WITHIN_MS;
  for (;;) {
    const running = readRunning(dataFolder);
    if (running?.ready) return { ...running, listens: `http://127.0.0.1:${port}` };
    if (hasEnded(child) || Date.now() > deadline) {
      throw new PlainFailure('Ellwand did not open for the tests; its last words are above.', {
        detail: output,
      });
    }
    await pause(POLL_MS);
  }
}

/**
 * @param {string} root
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} settings
 */
function spawnStart(root, args, settings) {
  const inherited = Object.entries(process.env).filter(([name]) => !name.startsWith('ELLWAND_'));
  const setpriv = findProgram('setpriv');
  const [program = '', ...rest] = [
    ...(setpriv ? [setpriv, '--pdeathsig', 'TERM'] : []),
    process.execPath,
    path.join(root, 'api', 'ops', 'start.mjs'),
  ];
  return spawn(program, [...rest, ...args], {
    cwd: root,
    env: { ...Object.fromEntries(inherited), ...settings },
    detached: true,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
}
