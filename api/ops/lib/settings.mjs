// @ts-check
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { parsePort } from './ports.mjs';

/**
 * What a person may choose when opening Ellwand, by environment variables and one option.
 * @typedef {object} Settings
 * @property {number} port of site, Workroom and API
 * @property {string} dataFolder absolute
 * @property {boolean} empty a house without the demonstration
 * @property {string} publicUrl without a slash at its end
 * @property {string | undefined} smtpUrl undefined: the local mail drop
 * @property {boolean} ownDatabase false: a database server that is already there (ELLWAND_DB_HOST)
 */

const DEFAULT_PORT = '4310';
const USAGE = 'Usage: npm start [-- --empty]';

/**
 * @param {NodeJS.ProcessEnv} env
 * @param {readonly string[]} args of the command line
 * @param {string} root the house's folder
 * @returns {Settings}
 */
export function readSettings(env, args, root) {
  const unknown = args.find((arg) => arg !== '--empty');
  if (unknown !== undefined) throw new PlainFailure(`${unknown} is not an option of npm start. ${USAGE}`);
  const port = parsePort('ELLWAND_PORT', given(env, 'ELLWAND_PORT') ?? DEFAULT_PORT);
  return {
    port,
    dataFolder: path.resolve(root, given(env, 'ELLWAND_DATA') ?? '.data'),
    empty: args.includes('--empty'),
    publicUrl: readUrl(given(env, 'ELLWAND_PUBLIC_URL') ?? `http://127.0.0.1:${port}`),
    smtpUrl: given(env, 'ELLWAND_SMTP_URL'),
    ownDatabase: given(env, 'ELLWAND_DB_HOST') === undefined,
  };
}

/**
 * @param {NodeJS.ProcessEnv} env
 * @param {string} name
 * @returns {string | undefined} undefined also where the variable is set to nothing
 */
function given(env, name) {
  const value = env[name]?.trim();
  return value === '' ? undefined : value;
}

/** @param {string} text */
function readUrl(text) {
  if (!URL.canParse(text) || !/^https?:$/.test(new URL(text).protocol)) {
    throw new PlainFailure(`ELLWAND_PUBLIC_URL must be an address like https://example.org, not "${text}".`);
  }
  return text.replace(/\/+$/, '');
}
