import type { MigrationInterface, QueryRunner } from 'typeorm';

const readingColumns = [
  `worn ENUM('left','right') NULL AFTER round`,
  `gap_typed VARCHAR(40) NULL AFTER tape_length_mm`,
  `gap_mm DECIMAL(10,4) NULL AFTER gap_typed`,
  `method VARCHAR(12) NULL AFTER gap_mm`,
  `depth_typed VARCHAR(40) NULL AFTER method`,
  `depth_mm DECIMAL(10,4) NULL AFTER depth_typed`,
  `held_by UUID NULL AFTER read_by`,
];

/** One reading stands for each point, round and worn side of a sheet. */
const standingWithSide = `CONCAT(point_id, '#', round, IFNULL(CONCAT('@', worn), ''))`;

const up = [
  ...readingColumns.map((column) => `ALTER TABLE ellwand.reading ADD COLUMN IF NOT EXISTS ${column}`),
  `ALTER TABLE ellwand.reading MODIFY COLUMN standing_at VARCHAR(80) AS (IF(stands, ${standingWithSide}, NULL)) PERSISTENT`,
  `ALTER TABLE ellwand.reading ADD CONSTRAINT fk_reading_held_by FOREIGN KEY IF NOT EXISTS (held_by) REFERENCES ellwand.user (id)`,
  `ALTER TABLE ellwand.sheet ADD COLUMN IF NOT EXISTS repeat_points JSON NOT NULL DEFAULT '[]' AFTER note`,
  `ALTER TABLE ellwand.sheet ADD COLUMN IF NOT EXISTS purpose ENUM('record','study') NOT NULL DEFAULT 'record' AFTER repeat_points`,
  `ALTER TABLE ellwand.part ADD COLUMN IF NOT EXISTS worn_together BOOLEAN NOT NULL DEFAULT FALSE`,
  `CREATE TABLE IF NOT EXISTS ellwand.table_note (
    id UUID NOT NULL, sheet_id UUID NOT NULL, about VARCHAR(12) NOT NULL, body JSON NOT NULL,
    device VARCHAR(80) NOT NULL, said_at DATETIME(3) NOT NULL, said_by UUID NOT NULL, received_at DATETIME(3) NOT NULL,
    PRIMARY KEY (id), KEY ix_table_note_sheet (sheet_id, said_at),
    CONSTRAINT fk_table_note_sheet FOREIGN KEY (sheet_id) REFERENCES ellwand.sheet (id),
    CONSTRAINT fk_table_note_by FOREIGN KEY (said_by) REFERENCES ellwand.user (id))`,
];

const down = [
  `DROP TABLE IF EXISTS ellwand.table_note`,
  `ALTER TABLE ellwand.part DROP COLUMN IF EXISTS worn_together`,
  `ALTER TABLE ellwand.sheet DROP COLUMN IF EXISTS purpose, DROP COLUMN IF EXISTS repeat_points`,
  `ALTER TABLE ellwand.reading DROP FOREIGN KEY IF EXISTS fk_reading_held_by`,
  `ALTER TABLE ellwand.reading DROP KEY IF EXISTS fk_reading_held_by`,
  `ALTER TABLE ellwand.reading MODIFY COLUMN standing_at VARCHAR(70) AS (IF(stands, CONCAT(point_id, '#', round), NULL)) PERSISTENT`,
  ...readingColumns.map(
    (column) => `ALTER TABLE ellwand.reading DROP COLUMN IF EXISTS ${column.split(' ')[0]}`,
  ),
];

/** What a table of two people needs beyond one figure a point: sides, gaps, hands, repeats, and what was said. */
export class AtTheTable1764560000000 implements MigrationInterface {
  readonly name = 'AtTheTable1764560000000';

  async up(runner: QueryRunner): Promise<void> {
    for (const statement of up) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const statement of down) await runner.query(statement);
  }
}
