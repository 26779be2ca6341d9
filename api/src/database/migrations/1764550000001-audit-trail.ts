import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * The audit trail, in a schema of its own: MariaDB cannot take a table out of a grant on its schema, and the
 * Workroom's account may only add to this one and read it.
 */
export class AuditTrail1764550000001 implements MigrationInterface {
  readonly name = 'AuditTrail1764550000001';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`CREATE TABLE IF NOT EXISTS ellwand_audit.entry (
      id UUID NOT NULL, at DATETIME(3) NOT NULL, actor_id UUID NULL, actor_name VARCHAR(120) NULL,
      verb VARCHAR(40) NOT NULL, subject_kind VARCHAR(30) NOT NULL, subject_id UUID NULL,
      summary VARCHAR(500) NOT NULL, facts JSON NOT NULL,
      PRIMARY KEY (id), KEY ix_entry_at (at), KEY ix_entry_subject (subject_id, at))`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE IF EXISTS ellwand_audit.entry');
  }
}
