// @ts-check
import { runAsAdministrator } from './database-server.mjs';
import { accountStatements, accounts, grantStatements } from './grants.mjs';
import { databasePasswords } from './secrets.mjs';

/**
 * @typedef {{ user: string, password: string, grants: string[] }} DatabaseAccount
 * @typedef {Record<import('./grants.mjs').Role, DatabaseAccount>} DatabaseAccounts
 */

/**
 * Makes schemas, accounts and grants in a running embedded server, or puts them right again: each start
 * applies them anew, so that neither a changed table of grants nor a stray GRANT survives.
 * @param {string} dataFolder
 * @returns {Promise<DatabaseAccounts>}
 */
export async function applyAccounts(dataFolder) {
  const passwords = databasePasswords(dataFolder);
  await runAsAdministrator(dataFolder, accountStatements(passwords));
  const account = (/** @type {import('./grants.mjs').Role} */ role) => ({
    user: accounts[role].user,
    password: passwords[role],
    grants: grantStatements(role),
  });
  return { owner: account('owner'), workroom: account('workroom'), catalogue: account('catalogue') };
}
