import type { MigrationInterface, QueryRunner } from 'typeorm';

const up = [
  `CREATE TABLE IF NOT EXISTS ellwand.protocol (
    id UUID NOT NULL, kind VARCHAR(20) NOT NULL, worn_together BOOLEAN NOT NULL, version SMALLINT UNSIGNED NOT NULL,
    body JSON NOT NULL, note VARCHAR(400) NOT NULL, made_by UUID NOT NULL, made_at DATETIME(3) NOT NULL,
    PRIMARY KEY (id), UNIQUE KEY uq_protocol_version (kind, worn_together, version),
    CONSTRAINT fk_protocol_made_by FOREIGN KEY (made_by) REFERENCES ellwand.user (id))`,
  // What a museum's own point is called and searched by: the catalogue's own copy of the code knows nothing of it.
  `ALTER TABLE ellwand_catalogue.published_measurement ADD COLUMN IF NOT EXISTS own_group VARCHAR(20) NULL AFTER point_id`,
  `ALTER TABLE ellwand_catalogue.published_measurement ADD COLUMN IF NOT EXISTS own_label VARCHAR(80) NULL AFTER own_group`,
];

const down = [
  `ALTER TABLE ellwand_catalogue.published_measurement DROP COLUMN IF EXISTS own_label, DROP COLUMN IF EXISTS own_group`,
  `DROP TABLE IF EXISTS ellwand.protocol`,
];

/** Protocols that administrators made, from version 2 on; the first ones are the house's and live in code. */
export class Protocols1764560000001 implements MigrationInterface {
  readonly name = 'Protocols1764560000001';

  async up(runner: QueryRunner): Promise<void> {
    for (const statement of up) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const statement of down) await runner.query(statement);
  }
}
