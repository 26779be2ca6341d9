// @ts-check
import { spawnSync } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { firstLineOf } from './programs.mjs';

/**
 * As whom the database server runs.
 * @typedef {object} ServerIdentity
 * @property {number} [uid] of the process, where it is another account than the invoking one
 * @property {number} [gid]
 * @property {string[]} flags further flags of the server
 * @property {string} [remark] a sentence for the person who started it
 */

/** @type {ServerIdentity} */
const INVOKING_ACCOUNT = { flags: [] };

/** As root the server runs only when told so by name. */
const ROOT_FLAGS = ['--user=root'];

/**
 * Decides as whom the server runs, and gives that account its folder. Root hands it to the unprivileged
 * `mysql`, if that account can reach the folder; everyone else runs it as themselves. A folder that is already filled
 * stays with its owner.
 * @param {string} folder the server's own folder inside the data folder; exists
 * @returns {ServerIdentity}
 */
export function settleServerIdentity(folder) {
  const me = invokingUser();
  const filled = path.join(folder, 'files');
  if (fs.existsSync(filled)) return identityOfOwner(fs.statSync(filled).uid, me, folder);
  return me === 0 ? identityUnderRoot(folder) : INVOKING_ACCOUNT;
}

/** @returns {number} */
function invokingUser() {
  if (!process.getuid) throw new PlainFailure('Ellwand runs on Linux: this system has no user ids.');
  return process.getuid();
}

/**
 * @param {number} owner
 * @param {number} me
 * @param {string} folder
 * @returns {ServerIdentity}
 */
function identityOfOwner(owner, me, folder) {
  const mysql = me === 0 ? mysqlAccount() : undefined;
  if (mysql && owner === mysql.uid) return { ...mysql, flags: [] };
  if (owner === me) return me === 0 ? { flags: ROOT_FLAGS } : INVOKING_ACCOUNT;
  throw new PlainFailure(
    `The database in ${folder} was made by another account (user id ${owner}): start Ellwand as that account.`,
  );
}

/**
 * @param {string} folder
 * @returns {ServerIdentity}
 */
function identityUnderRoot(folder) {
  const mysql = mysqlAccount();
  if (!mysql)
    return { flags: ROOT_FLAGS, remark: 'There is no account mysql: the database server runs as root.' };
  // The data folder may be passed through, not listed; what lies in it is readable by its owner alone.
  fs.chmodSync(path.dirname(folder), 0o711);
  fs.chownSync(folder, mysql.uid, mysql.gid);
  if (canWrite(folder, mysql)) return { ...mysql, flags: [] };
  fs.chownSync(folder, 0, 0);
  return {
    flags: ROOT_FLAGS,
    remark: `The account mysql cannot reach ${folder}: the database server runs as root instead.`,
  };
}

/** @returns {{ uid: number, gid: number } | undefined} */
function mysqlAccount() {
  const uid = firstLineOf('id', ['-u', 'mysql']);
  const gid = firstLineOf('id', ['-g', 'mysql']);
  return uid && gid ? { uid: Number(uid), gid: Number(gid) } : undefined;
}

/**
 * @param {string} folder
 * @param {{ uid: number, gid: number }} account
 */
function canWrite(folder, account) {
  return spawnSync('test', ['-w', folder], { ...account, cwd: '/' }).status === 0;
}
