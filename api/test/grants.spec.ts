import { createConnection, type Connection } from 'mysql2/promise';
import { v7 as uuidv7 } from 'uuid';
import { type House, openHouse } from './harness/house';
import { testDatabase } from './harness/test-database';

type AccountName = 'owner' | 'workroom' | 'catalogue';

const { port, accounts } = testDatabase();

async function connectAs(name: AccountName): Promise<Connection> {
  const { user, password } = accounts[name];
  return createConnection({ host: '127.0.0.1', port, user, password });
}

/** MariaDB's refusals: command denied on a table, on a database; access denied to a database; needs a privilege. */
const denials = [1142, 1044, 1045, 1227, 1370, 1143];

describe('what each account of the database may do (ASVS 13.2.2)', () => {
  let house: House;
  const connections = new Map<AccountName, Connection>();
  beforeAll(async () => {
    house = await openHouse();
    for (const name of ['owner', 'workroom', 'catalogue'] as const)
      connections.set(name, await connectAs(name));
  });
  afterAll(async () => {
    for (const connection of connections.values()) await connection.end();
    await house.close();
  });

  const as = (name: AccountName) => {
    const connection = connections.get(name);
    if (!connection) throw new Error(`Not connected as ${name}`);
    return connection;
  };

  async function denied(name: AccountName, statement: string): Promise<void> {
    const fault: unknown = await as(name)
      .query(statement)
      .then(
        () => undefined,
        (thrown: unknown) => thrown,
      );
    const errno = fault instanceof Error && 'errno' in fault ? fault.errno : 'it was allowed';
    expect({ statement, isDenied: denials.includes(errno as number), errno }).toEqual({
      statement,
      isDenied: true,
      errno,
    });
  }

  it.each(['owner', 'workroom', 'catalogue'] as const)(
    'is written down for %s, and is nothing beside',
    async (name) => {
      const [rows] = await as(name).query('SHOW GRANTS');
      const shown = (rows as Record<string, string>[]).flatMap((row) => Object.values(row));
      const grants = shown.filter((line) => !line.startsWith('GRANT USAGE ON *.* '));
      expect(grants.sort()).toEqual([...accounts[name].grants].sort());
      expect(shown.join('\n')).not.toMatch(/GRANT OPTION|SUPER|FILE|PROCESS/);
    },
  );

  describe('the catalogue', () => {
    it('reads what is published', async () => {
      await expect(
        as('catalogue').query('SELECT * FROM ellwand_catalogue.published_garment'),
      ).resolves.toBeDefined();
    });

    it('cannot read a draft, a person or the trail', async () => {
      for (const table of [
        'ellwand.garment',
        'ellwand.revision',
        'ellwand.user',
        'ellwand.session',
        'ellwand_audit.entry',
      ]) {
        await denied('catalogue', `SELECT * FROM ${table}`);
      }
      const [rows] = await as('catalogue').query('SHOW DATABASES');
      const names = (rows as { Database: string }[]).map((row) => row.Database);
      expect(names.sort()).toEqual(['ellwand_catalogue', 'information_schema']);
    });

    it('cannot write anything anywhere', async () => {
      const tables: { name: string }[] = await house.owner.source.query(
        `SELECT CONCAT(table_schema, '.', table_name) AS name FROM information_schema.tables
          WHERE table_schema LIKE 'ellwand%'`,
      );
      expect(tables.length).toBeGreaterThan(20);
      for (const { name } of tables) {
        await denied('catalogue', `DELETE FROM ${name}`);
        await denied('catalogue', `INSERT INTO ${name} () VALUES ()`);
        await denied('catalogue', `DROP TABLE ${name}`);
      }
      await denied('catalogue', 'CREATE TABLE ellwand_catalogue.mine (id INT)');
      await denied('catalogue', "UPDATE ellwand_catalogue.published_garment SET state = 'published'");
    });
  });

  describe('the Workroom', () => {
    const id = uuidv7();
    beforeAll(() =>
      as('workroom').query(
        `INSERT INTO ellwand_audit.entry (id, at, verb, subject_kind, summary, facts)
         VALUES (?, UTC_TIMESTAMP(3), 'try', 'user', 'Written once', '{}')`,
        [id],
      ),
    );

    it('adds to the trail and reads it, and can neither change nor take away what is there', async () => {
      await denied('workroom', `UPDATE ellwand_audit.entry SET summary = 'Never happened'`);
      await denied('workroom', 'DELETE FROM ellwand_audit.entry');
      await denied('workroom', 'TRUNCATE TABLE ellwand_audit.entry');
      await denied('workroom', `REPLACE INTO ellwand_audit.entry SELECT * FROM ellwand_audit.entry`);
      await denied(
        'workroom',
        `INSERT INTO ellwand_audit.entry SELECT * FROM ellwand_audit.entry ON DUPLICATE KEY UPDATE summary = 'Never happened'`,
      );
      const [rows] = await as('workroom').query('SELECT summary FROM ellwand_audit.entry WHERE id = ?', [id]);
      expect(rows).toEqual([{ summary: 'Written once' }]);
    });

    it('cannot change the form of any table, nor read or write files', async () => {
      for (const schema of ['ellwand', 'ellwand_catalogue', 'ellwand_audit']) {
        await denied('workroom', `CREATE TABLE ${schema}.mine (id INT)`);
      }
      await denied('workroom', 'ALTER TABLE ellwand.user ADD COLUMN mine INT');
      await denied('workroom', 'DROP TABLE ellwand.mail_outbox');
      await denied('workroom', "SELECT 1 INTO OUTFILE '/tmp/ellwand-never'");
      await denied('workroom', 'SET GLOBAL innodb_flush_log_at_trx_commit = 0');
    });
  });

  it('does not let the schemas’ owner out of the three schemas', async () => {
    await denied('owner', 'CREATE DATABASE elsewhere');
    await denied('owner', 'SELECT * FROM mysql.user');
    await denied('owner', 'SET GLOBAL general_log = 1');
  });
});
