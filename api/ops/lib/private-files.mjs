// @ts-check
import fs from 'node:fs';
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';

/**
 * Makes a folder that only its owner may list and read (mode 700), or leaves an existing one as it is.
 * @param {string} folder
 * @returns {string} the folder's absolute path
 */
export function makePrivateFolder(folder) {
  const absolute = path.resolve(folder);
  try {
    fs.mkdirSync(path.dirname(absolute), { recursive: true });
    if (!fs.existsSync(absolute)) fs.mkdirSync(absolute, { mode: 0o700 });
    fs.accessSync(absolute, fs.constants.W_OK | fs.constants.X_OK);
  } catch (error) {
    throw new PlainFailure(`This account may not write to ${absolute} (${codeOf(error)}).`);
  }
  return absolute;
}

/**
 * Writes a file of mode 600 in one step: a reader sees the old text or the new one, never half.
 * @param {string} file
 * @param {string} text
 */
export function writePrivateFile(file, text) {
  const draft = `${file}.${process.pid}.new`;
  const handle = fs.openSync(draft, 'w', 0o600);
  try {
    fs.writeSync(handle, text);
    fs.fsyncSync(handle);
  } finally {
    fs.closeSync(handle);
  }
  fs.renameSync(draft, file);
}

/**
 * Reads a JSON file, or answers undefined where there is none.
 * @param {string} file
 * @returns {unknown}
 */
export function readJsonIfThere(file) {
  try {
    return JSON.parse(fs.readFileSync(file, 'utf8'));
  } catch (error) {
    if (codeOf(error) === 'ENOENT') return undefined;
    throw new PlainFailure(`${file} cannot be read (${codeOf(error)}).`);
  }
}

/**
 * The system's code of an error (`EACCES`), or its message where it has none.
 * @param {unknown} error
 * @returns {string}
 */
export function codeOf(error) {
  if (error instanceof Error && 'code' in error && typeof error.code === 'string') return error.code;
  return error instanceof Error ? error.message : String(error);
}
