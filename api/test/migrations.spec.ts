import { DataSource } from 'typeorm';
import { workroomConnection } from '../src/database/connections';
import { type House, openHouse } from './harness/house';

interface Column {
  readonly table: string;
  readonly column: string;
  readonly nullable: 'YES' | 'NO';
}

describe('the migrations', () => {
  let house: House;
  beforeAll(async () => {
    house = await openHouse();
  });
  afterAll(() => house.close());

  const columns = (): Promise<Column[]> =>
    house.owner.source.query(
      `SELECT CONCAT(table_schema, '.', table_name) AS \`table\`, column_name AS \`column\`, is_nullable AS nullable
         FROM information_schema.columns
        WHERE table_schema IN ('ellwand', 'ellwand_catalogue', 'ellwand_audit') AND table_name <> 'migration'
        ORDER BY 1, ordinal_position`,
    );

  it('go down to nothing and up again to the same tables', async () => {
    await house.empty();
    const before = await columns();
    expect(before.length).toBeGreaterThan(100);
    const { migrations } = house.owner.source;
    for (let left = migrations.length; left > 0; left--) await house.owner.source.undoLastMigration();
    expect(await columns()).toEqual([]);
    await house.owner.source.runMigrations();
    expect(await columns()).toEqual(before);
  });

  it('may be run again after being cut off at any statement', async () => {
    const runner = house.owner.source.createQueryRunner();
    for (const migration of house.owner.source.migrations) await migration.up(runner);
    await runner.release();
    expect(await house.owner.source.showMigrations()).toBe(false);
  });

  it('make every column that an entity reads or writes, as nullable as the entity says', async () => {
    const made = new Map((await columns()).map((each) => [`${each.table}.${each.column}`, each.nullable]));
    const source = await new DataSource(workroomConnection(house.environment)).initialize();
    const wanted = source.entityMetadatas.flatMap((entity) =>
      entity.columns.map((column) => ({
        name: `${entity.database}.${entity.tableName}.${column.databaseName}`,
        nullable: column.isNullable ? 'YES' : 'NO',
      })),
    );
    await source.destroy();
    expect(wanted.filter(({ name, nullable }) => made.get(name) !== nullable)).toEqual([]);
  });
});
