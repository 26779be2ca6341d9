import 'reflect-metadata';
import { DataSource } from 'typeorm';
import { readEnvironment } from '../config/environment';
import { ownerConnection } from './connections';

/** Brings the schemas up to date as their owner; run by the start script before the API. */
async function migrate(): Promise<void> {
  const source = await new DataSource(ownerConnection(readEnvironment(process.env))).initialize();
  try {
    const done = await source.runMigrations();
    for (const migration of done) process.stdout.write(`Migrated: ${migration.name}\n`);
  } finally {
    await source.destroy();
  }
}

migrate().catch((fault: unknown) => {
  process.stderr.write(`Migrations failed: ${fault instanceof Error ? fault.message : String(fault)}\n`);
  process.exitCode = 1;
});
