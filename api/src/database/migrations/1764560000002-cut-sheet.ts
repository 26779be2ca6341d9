import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What a maker needs of a part beyond its girths: one sheet a part, with a version of its own. */
export class CutSheet1764560000002 implements MigrationInterface {
  readonly name = 'CutSheet1764560000002';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS ellwand.cut_sheet (
      part_id UUID NOT NULL, version INT UNSIGNED NOT NULL, body JSON NOT NULL,
      updated_at DATETIME(3) NOT NULL, updated_by UUID NOT NULL, PRIMARY KEY (part_id),
      CONSTRAINT fk_cut_sheet_part FOREIGN KEY (part_id) REFERENCES ellwand.part (id),
      CONSTRAINT fk_cut_sheet_updated_by FOREIGN KEY (updated_by) REFERENCES ellwand.user (id))`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS ellwand.cut_sheet');
  }
}
