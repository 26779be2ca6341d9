// @ts-check
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';

/** Folders of a workspace that no build reads. */
const APART = new Set(['node_modules', 'dist', 'e2e', 'test', 'bench', 'ops', 'coverage', 'testing']);
const SPEC = /\.spec\.tsx?$/;

/**
 * A fingerprint of everything a build reads: names and contents of files, in a fixed order.
 * @param {string} root
 * @param {readonly string[]} entries files and folders, relative to root; what is missing counts as such
 * @returns {string} SHA-256, hexadecimal
 */
export function hashSources(root, entries) {
  const hash = createHash('sha256');
  for (const file of entries.flatMap((entry) => filesIn(root, entry)).sort()) {
    hash.update(`${file}\0`);
    hash.update(fs.readFileSync(path.join(root, file)));
    hash.update('\0');
  }
  return hash.digest('hex');
}

/**
 * @param {string} root
 * @param {string} entry
 * @returns {string[]} relative to root
 */
function filesIn(root, entry) {
  const status = fs.statSync(path.join(root, entry), { throwIfNoEntry: false });
  if (!status) return [];
  if (status.isFile()) return SPEC.test(entry) ? [] : [entry];
  return fs
    .readdirSync(path.join(root, entry))
    .filter((name) => !APART.has(name))
    .flatMap((name) => filesIn(root, path.join(entry, name)));
}
