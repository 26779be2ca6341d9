import { DataSource } from 'typeorm';
import type { Environment } from '../../src/config/environment';
import { ownerConnection } from '../../src/database/connections';

const schemas = ['ellwand', 'ellwand_catalogue', 'ellwand_audit'];

/** The schemas' owner: brings them up to date once a spec file, and empties them between tests. */
export class Owner {
  private constructor(
    readonly source: DataSource,
    private readonly tables: readonly string[],
  ) {}

  static async open(environment: Environment): Promise<Owner> {
    const source = await new DataSource(ownerConnection(environment)).initialize();
    await source.runMigrations();
    const rows: { name: string }[] = await source.query(
      `SELECT CONCAT(table_schema, '.', table_name) AS name FROM information_schema.tables
        WHERE table_schema IN (?, ?, ?) AND table_name <> 'migration'`,
      schemas,
    );
    return new Owner(
      source,
      rows.map((row) => row.name),
    );
  }

  /** Deletes every row of every table; foreign keys would else ask for an order. */
  async empty(): Promise<void> {
    const runner = this.source.createQueryRunner();
    try {
      await runner.query('SET FOREIGN_KEY_CHECKS = 0');
      for (const table of this.tables) await runner.query(`DELETE FROM ${table}`);
      await runner.query('SET FOREIGN_KEY_CHECKS = 1');
    } finally {
      await runner.release();
    }
  }

  close(): Promise<void> {
    return this.source.destroy();
  }
}
