import { execFileSync } from 'node:child_process';
import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { DATABASE_VARIABLE, OWN_FOLDER_VARIABLE } from './test-database';

export const databaseScript = resolve(__dirname, '../../ops/database.mjs');

/** Starts one throw-away MariaDB for all spec files, unless the runner has handed one over. */
export default function startDatabase(): void {
  if (process.env[DATABASE_VARIABLE]) return;
  const folder = mkdtempSync(join(tmpdir(), 'ellwand-test-'));
  const said = execFileSync(process.execPath, [databaseScript, 'start', '--data', folder], {
    encoding: 'utf8',
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  process.env[DATABASE_VARIABLE] = said.trim();
  process.env[OWN_FOLDER_VARIABLE] = folder;
}
