// @ts-check
import { applyAccounts } from './database-accounts.mjs';
import { startDatabase } from './database-server.mjs';
import { freePort } from './ports.mjs';

/**
 * Starts a MariaDB for the API's tests and says in the environment where it is. It ends with this process.
 *
 * - ELLWAND_TEST_DATABASE: the same JSON that `database.mjs start` prints
 * - ELLWAND_TEST_DATABASE_DATA: what to hand to `database.mjs schemas --data`
 * @param {string} dataFolder
 * @returns {Promise<NodeJS.ProcessEnv>}
 */
export async function startTestDatabase(dataFolder) {
  const { port, socket, pid } = await startDatabase({ dataFolder, port: await freePort() });
  const accounts = await applyAccounts(dataFolder);
  return {
    ELLWAND_TEST_DATABASE: JSON.stringify({ port, socket, pid, accounts }),
    ELLWAND_TEST_DATABASE_DATA: dataFolder,
  };
}
