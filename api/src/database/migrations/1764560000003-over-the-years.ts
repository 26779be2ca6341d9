import type { MigrationInterface, QueryRunner } from 'typeorm';

const choiceColumns = [
  'speaking_sheet_id UUID NULL',
  'speaking_because VARCHAR(500) NULL',
  'speaking_by UUID NULL',
  'speaking_at DATETIME(3) NULL',
];

const settledColumns = ['settled VARCHAR(10) NULL', 'settled_by UUID NULL', 'settled_at DATETIME(3) NULL'];

const foreignKeys = [
  ['part', 'fk_part_speaking_sheet', 'speaking_sheet_id', 'sheet'],
  ['part', 'fk_part_speaking_by', 'speaking_by', 'user'],
  ['table_note', 'fk_table_note_settled_by', 'settled_by', 'user'],
] as const;

const up = [
  ...choiceColumns.map((column) => `ALTER TABLE ellwand.part ADD COLUMN IF NOT EXISTS ${column}`),
  ...settledColumns.map((column) => `ALTER TABLE ellwand.table_note ADD COLUMN IF NOT EXISTS ${column}`),
  ...foreignKeys.map(
    ([table, name, column, to]) =>
      `ALTER TABLE ellwand.${table} ADD CONSTRAINT ${name} FOREIGN KEY IF NOT EXISTS (${column}) REFERENCES ellwand.${to} (id)`,
  ),
];

const dropped = (table: string, columns: readonly string[]) =>
  `ALTER TABLE ellwand.${table} ${columns.map((column) => `DROP COLUMN IF EXISTS ${column.split(' ')[0]}`).join(', ')}`;

const down = [
  ...foreignKeys.flatMap(([table, name]) => [
    `ALTER TABLE ellwand.${table} DROP FOREIGN KEY IF EXISTS ${name}`,
    `ALTER TABLE ellwand.${table} DROP KEY IF EXISTS ${name}`,
  ]),
  dropped('table_note', settledColumns),
  dropped('part', choiceColumns),
];

/** Which of a part's sheets speaks for it, and why; what became of what was noted at the table. */
export class OverTheYears1764560000003 implements MigrationInterface {
  readonly name = 'OverTheYears1764560000003';

  async up(runner: QueryRunner): Promise<void> {
    for (const statement of up) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const statement of down) await runner.query(statement);
  }
}
