// @ts-check
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { readJsonIfThere } from './private-files.mjs';
import { plainEnvironment, run } from './programs.mjs';

/**
 * @typedef {{ version?: string, link?: boolean, optional?: boolean, devOptional?: boolean,
 *             extraneous?: boolean }} LockEntry
 * @typedef {Record<string, LockEntry>} LockPackages
 */

/** npm gives its reason first and explains all its options after it. */
const NPM_REASON = 1_000;

/**
 * Brings node_modules to what the lock file says; does nothing where it is so already.
 * @param {string} root
 * @param {<T>(label: string, work: () => Promise<T>) => Promise<T>} step
 */
export async function installNpmPackages(root, step) {
  const wanted = lockPackages(path.join(root, 'package-lock.json'));
  const installed = lockPackages(path.join(root, 'node_modules', '.package-lock.json'));
  if (isInstalled(wanted, installed)) return;
  const { code, output } = await step('Installing npm packages', () =>
    run('npm', ['ci', '--no-audit', '--no-fund'], { cwd: root, env: plainEnvironment() }),
  );
  if (code !== 0) {
    throw new PlainFailure('npm ci failed: its reason is above.', { detail: output.slice(0, NPM_REASON) });
  }
}

/**
 * Whether every package of the lock file is there in its version. Optional packages may be missing: those of
 * other systems always are. Extraneous ones, which nothing asks for, npm ci leaves out.
 * @param {LockPackages} wanted
 * @param {LockPackages} installed
 */
export function isInstalled(wanted, installed) {
  return Object.entries(wanted)
    .filter(([place, entry]) => place.includes('node_modules/') && entry.extraneous !== true)
    .every(([place, entry]) => {
      const there = installed[place];
      if (!there) return entry.optional === true || entry.devOptional === true;
      return there.version === entry.version && there.link === entry.link;
    });
}

/**
 * @param {string} file
 * @returns {LockPackages}
 */
function lockPackages(file) {
  const lock = readJsonIfThere(file);
  return hasPackages(lock) ? lock.packages : {};
}

/**
 * @param {unknown} value
 * @returns {value is { packages: LockPackages }}
 */
function hasPackages(value) {
  return typeof value === 'object' && value !== null && 'packages' in value;
}
