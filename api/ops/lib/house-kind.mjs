// @ts-check
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { readJsonIfThere, writePrivateFile } from './private-files.mjs';

/**
 * What a data folder was opened as, kept in `house.json`. `filled` is false while the first filling runs.
 * @typedef {{ opened: 'demonstration' | 'empty', filled: boolean }} HouseKind
 */

/** @param {string} dataFolder */
function placeOf(dataFolder) {
  return path.join(dataFolder, 'house.json');
}

/**
 * @param {string} dataFolder
 * @returns {HouseKind | undefined} undefined: a new house
 */
export function readHouseKind(dataFolder) {
  const value = readJsonIfThere(placeOf(dataFolder));
  return isHouseKind(value) ? value : undefined;
}

/**
 * @param {string} dataFolder
 * @param {HouseKind} kind
 */
export function writeHouseKind(dataFolder, kind) {
  writePrivateFile(placeOf(dataFolder), `${JSON.stringify(kind)}\n`);
}

/**
 * Refuses --empty on a house that was opened with the demonstration: it would not become empty by that.
 * @param {HouseKind | undefined} kind
 * @param {boolean} empty
 * @param {string} dataFolder
 */
export function requireSameKind(kind, empty, dataFolder) {
  if (!empty || kind === undefined || kind.opened === 'empty') return;
  throw new PlainFailure(
    `${dataFolder} already holds the demonstration: choose another folder with ELLWAND_DATA to open an empty house.`,
  );
}

/**
 * @param {unknown} value
 * @returns {value is HouseKind}
 */
function isHouseKind(value) {
  return (
    typeof value === 'object' &&
    value !== null &&
    'opened' in value &&
    (value.opened === 'demonstration' || value.opened === 'empty') &&
    'filled' in value &&
    typeof value.filled === 'boolean'
  );
}
