import 'reflect-metadata';
import { DataSource } from 'typeorm';
import { readEnvironment } from '../config/environment';
import { workroomConnection } from '../database/connections';
import { newFirstToken } from './first-administrator.service';

/**
 * Prints the one-time address by which an empty house gets its first administrator; nothing once there is somebody.
 * The secret stands behind `#`, which browsers do not send: no log on the way sees it.
 */
async function printAddress(): Promise<void> {
  const environment = readEnvironment(process.env);
  const source = await new DataSource(workroomConnection(environment)).initialize();
  try {
    const token = await source.transaction((tx) => newFirstToken(tx, new Date()));
    if (token) process.stdout.write(`${environment.publicUrl}/workroom/first-administrator#${token}\n`);
  } finally {
    await source.destroy();
  }
}

printAddress().catch((fault: unknown) => {
  process.stderr.write(`${fault instanceof Error ? fault.message : String(fault)}\n`);
  process.exitCode = 1;
});
