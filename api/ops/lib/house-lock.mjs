// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { readJsonIfThere, writePrivateFile } from './private-files.mjs';

/**
 * What a started Ellwand says about itself in `running.json` (mode 600), for scripts that wait for it.
 * @typedef {object} Running
 * @property {number} pid of the start script
 * @property {boolean} ready
 * @property {string} [url] of the site
 * @property {string} [workroomUrl]
 * @property {string} [inboxUrl] of the mail drop
 * @property {string} [demonstration] file with the demonstration's accounts
 * @property {string} [firstAdministrator] one-time address of an empty house
 */

/** @param {string} dataFolder */
function placeOf(dataFolder) {
  return path.join(dataFolder, 'running.json');
}

/**
 * Takes the data folder for this process; refuses where another start script holds it.
 * @param {string} dataFolder
 */
export function takeHouse(dataFolder) {
  const other = readRunning(dataFolder);
  if (other && other.pid !== process.pid && isStartScript(other.pid)) {
    throw new PlainFailure(`Ellwand already runs from ${dataFolder} (process ${other.pid}): stop it first.`);
  }
  announce(dataFolder, { pid: process.pid, ready: false });
}

/**
 * @param {string} dataFolder
 * @param {Running} running
 */
export function announce(dataFolder, running) {
  writePrivateFile(placeOf(dataFolder), `${JSON.stringify(running, null, 2)}\n`);
}

/** @param {string} dataFolder */
export function leaveHouse(dataFolder) {
  if (readRunning(dataFolder)?.pid === process.pid) fs.rmSync(placeOf(dataFolder), { force: true });
}

/**
 * @param {string} dataFolder
 * @returns {Running | undefined}
 */
export function readRunning(dataFolder) {
  const value = readJsonIfThere(placeOf(dataFolder));
  return isRunning(value) ? value : undefined;
}

/**
 * @param {unknown} value
 * @returns {value is Running}
 */
function isRunning(value) {
  return typeof value === 'object' && value !== null && 'pid' in value && typeof value.pid === 'number';
}

/**
 * Process ids are used again: the process must also be a start script.
 * @param {number} pid
 */
function isStartScript(pid) {
  try {
    return fs.readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes('start.mjs');
  } catch {
    return false;
  }
}
