import { execFileSync } from 'node:child_process';
import { rmSync } from 'node:fs';
import { databaseScript } from './start-database';
import { OWN_FOLDER_VARIABLE } from './test-database';

/** Stops and removes the server that `start-database` has started; one that was handed over stays. */
export default function stopDatabase(): void {
  const folder = process.env[OWN_FOLDER_VARIABLE];
  if (!folder) return;
  execFileSync(process.execPath, [databaseScript, 'stop', '--data', folder], { stdio: 'inherit' });
  rmSync(folder, { recursive: true, force: true });
}
