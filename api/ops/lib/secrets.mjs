// @ts-check
import { randomBytes } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { roles } from './grants.mjs';
import { readJsonIfThere, writePrivateFile } from './private-files.mjs';

/** 32 random bytes: as strong as the HMAC-SHA-256 that they sign with. */
const SECRET_BYTES = 32;

/**
 * The installation's signing secret, made once and kept in `secret` (mode 600).
 * @param {string} dataFolder
 * @returns {string}
 */
export function signingSecret(dataFolder) {
  const file = path.join(dataFolder, 'secret');
  if (!fs.existsSync(file)) writePrivateFile(file, `${randomWord()}\n`);
  return fs.readFileSync(file, 'utf8').trim();
}

/**
 * Passwords of the database's accounts, made once and kept in `database-accounts.json` (mode 600).
 * @param {string} dataFolder
 * @returns {import('./grants.mjs').Passwords}
 */
export function databasePasswords(dataFolder) {
  const file = path.join(dataFolder, 'database-accounts.json');
  const kept = readJsonIfThere(file);
  if (isPasswords(kept)) return kept;
  const made = { owner: randomWord(), workroom: randomWord(), catalogue: randomWord() };
  writePrivateFile(file, `${JSON.stringify(made, null, 2)}\n`);
  return made;
}

/** URL-safe letters only, so that the word stands in SQL, in a URL and in the environment unescaped. */
function randomWord() {
  return randomBytes(SECRET_BYTES).toString('base64url');
}

/**
 * @param {unknown} value
 * @returns {value is import('./grants.mjs').Passwords}
 */
function isPasswords(value) {
  if (typeof value !== 'object' || value === null) return false;
  const words = Object.entries(value);
  return roles.every((role) => words.some(([name, word]) => name === role && typeof word === 'string'));
}
