/** What is asked of a connection: a TypeORM data source is one. */
interface Asked {
  query(statement: string): Promise<unknown>;
}

/**
 * Every commit must reach the disk before it is acknowledged: at 2 a power cut loses up to a second of what people
 * typed, at 0 even the end of the database process does.
 * @throws Error with one sentence, where the server is set otherwise
 */
export async function refuseUnlessDurable(source: Asked): Promise<void> {
  const rows = (await source.query('SELECT @@GLOBAL.innodb_flush_log_at_trx_commit AS setting')) as {
    setting: number | string;
  }[];
  const setting = Number(rows[0]?.setting);
  if (setting !== 1) {
    throw new Error(
      `The database may lose what it has acknowledged: set innodb_flush_log_at_trx_commit to 1, it is ${setting}.`,
    );
  }
}
