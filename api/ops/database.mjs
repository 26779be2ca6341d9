// @ts-check
/**
 * An embedded MariaDB by hand, for tests and for looking into a stopped house:
 *
 *   node api/ops/database.mjs start --data DIR [--port P]
 *       makes DIR/database on the first call, starts the server on 127.0.0.1:P (a free port when not given), makes
 *       the schemas and the accounts with their grants, leaves the server running, and prints one line of JSON:
 *       { "port", "socket", "pid", "accounts": { "owner" | "workroom" | "catalogue": { "user", "password", "grants" } } }
 *       where "grants" are the lines that SHOW GRANTS must answer beside USAGE. The server's process id is in
 *       DIR/database/mariadbd.pid; the machine's account that ran this is its administrator over the socket.
 *   node api/ops/database.mjs schemas --data DIR --suffix _w1
 *       makes ellwand_w1, ellwand_catalogue_w1 and ellwand_audit_w1 and grants the same accounts the same rights on them.
 *   node api/ops/database.mjs stop --data DIR
 *       stops the server, cleanly, and returns once it is gone. DIR may then be removed.
 */
import { parseArgs } from 'node:util';
import { applyAccounts } from './lib/database-accounts.mjs';
import { runAsAdministrator, startDatabase, stopDatabase } from './lib/database-server.mjs';
import { schemaSetStatements } from './lib/grants.mjs';
import { PlainFailure, runMain } from './lib/plain-failure.mjs';
import { freePort, parsePort } from './lib/ports.mjs';

const USAGE = 'Usage: node api/ops/database.mjs start|schemas|stop --data DIR [--port P] [--suffix _NAME]';

await runMain(async () => {
  const { command, data, port, suffix } = readArguments();
  if (command === 'start') return start(data, port);
  if (command === 'stop') return stopDatabase(data);
  if (command === 'schemas' && /^_[a-z0-9_]{1,20}$/.test(suffix)) {
    await runAsAdministrator(data, schemaSetStatements(suffix));
    return;
  }
  throw new PlainFailure(USAGE);
});

/**
 * @param {string} data
 * @param {string | undefined} port
 */
async function start(data, port) {
  const chosen = port === undefined ? await freePort() : parsePort('--port', port);
  const server = await startDatabase({ dataFolder: data, port: chosen, outliveParent: true });
  if (server.remark) console.error(server.remark);
  const accounts = await applyAccounts(data);
  console.log(JSON.stringify({ port: server.port, socket: server.socket, pid: server.pid, accounts }));
}

function readArguments() {
  try {
    const { positionals, values } = parseArgs({
      allowPositionals: true,
      options: { data: { type: 'string' }, port: { type: 'string' }, suffix: { type: 'string' } },
    });
    if (values.data !== undefined) {
      return { command: positionals[0], data: values.data, port: values.port, suffix: values.suffix ?? '' };
    }
  } catch {
    // An unknown option: the usage line says what there is.
  }
  throw new PlainFailure(USAGE);
}
