// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { stopDatabase } from './database-server.mjs';
import { isAlive } from './programs.mjs';

const RUN = /^run-(\d+)$/;

/**
 * A folder for one run of the tests, below `.test-data`. What runs that were killed have left is removed first.
 * @param {string} root
 * @returns {Promise<string>} absolute
 */
export async function makeTestFolder(root) {
  const all = path.join(root, '.test-data');
  fs.mkdirSync(all, { recursive: true });
  for (const name of fs.readdirSync(all)) {
    const pid = RUN.exec(name)?.[1];
    if (pid !== undefined && !isAlive(Number(pid))) await removeTestFolder(path.join(all, name));
  }
  const folder = path.join(all, `run-${process.pid}`);
  fs.rmSync(folder, { recursive: true, force: true });
  fs.mkdirSync(folder);
  return folder;
}

/**
 * Stops the databases that still run from a test folder, then removes it.
 * @param {string} folder
 */
export async function removeTestFolder(folder) {
  for (const name of fs.existsSync(folder) ? fs.readdirSync(folder) : []) {
    await stopDatabase(path.join(folder, name));
  }
  fs.rmSync(folder, { recursive: true, force: true });
}
