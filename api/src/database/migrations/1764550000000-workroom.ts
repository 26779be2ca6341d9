import type { MigrationInterface, QueryRunner } from 'typeorm';

const people = [
  `CREATE TABLE IF NOT EXISTS ellwand.user (
    id UUID NOT NULL, email VARCHAR(254) COLLATE utf8mb4_bin NOT NULL, name VARCHAR(120) NOT NULL,
    roles JSON NOT NULL, password_hash CHAR(60) CHARACTER SET ascii COLLATE ascii_bin NULL,
    active BOOLEAN NOT NULL DEFAULT TRUE, version INT UNSIGNED NOT NULL DEFAULT 1,
    created_at DATETIME(3) NOT NULL, last_sign_in_at DATETIME(3) NULL,
    PRIMARY KEY (id), CONSTRAINT uq_user_email UNIQUE (email))`,
  `CREATE TABLE IF NOT EXISTS ellwand.invitation (
    id UUID NOT NULL, email VARCHAR(254) COLLATE utf8mb4_bin NOT NULL, name VARCHAR(120) NOT NULL,
    roles JSON NOT NULL, token_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    invited_by UUID NULL, created_at DATETIME(3) NOT NULL, expires_at DATETIME(3) NOT NULL,
    accepted_at DATETIME(3) NULL, withdrawn_at DATETIME(3) NULL,
    PRIMARY KEY (id), CONSTRAINT uq_invitation_token UNIQUE (token_hash),
    CONSTRAINT fk_invitation_invited_by FOREIGN KEY (invited_by) REFERENCES ellwand.user (id))`,
  `CREATE TABLE IF NOT EXISTS ellwand.session (
    id UUID NOT NULL, user_id UUID NOT NULL,
    refresh_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    previous_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NULL,
    rotated_at DATETIME(3) NULL, created_at DATETIME(3) NOT NULL, idle_ends_at DATETIME(3) NOT NULL,
    ends_at DATETIME(3) NOT NULL, revoked_at DATETIME(3) NULL, agent VARCHAR(200) NOT NULL DEFAULT '',
    PRIMARY KEY (id), CONSTRAINT uq_session_refresh UNIQUE (refresh_hash), KEY ix_session_previous (previous_hash),
    CONSTRAINT fk_session_user FOREIGN KEY (user_id) REFERENCES ellwand.user (id))`,
  `CREATE TABLE IF NOT EXISTS ellwand.sign_in_slowdown (
    key_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, failures INT UNSIGNED NOT NULL,
    last_failed_at DATETIME(3) NOT NULL, PRIMARY KEY (key_hash))`,
  `CREATE TABLE IF NOT EXISTS ellwand.mail_outbox (
    id UUID NOT NULL, recipient VARCHAR(254) NOT NULL, subject VARCHAR(300) NOT NULL,
    body_text TEXT NOT NULL, body_html MEDIUMTEXT NOT NULL, created_at DATETIME(3) NOT NULL,
    sent_at DATETIME(3) NULL, attempts INT UNSIGNED NOT NULL DEFAULT 0, next_attempt_at DATETIME(3) NOT NULL,
    last_fault VARCHAR(500) NULL, PRIMARY KEY (id), KEY ix_mail_outbox_due (sent_at, next_attempt_at))`,
  `CREATE TABLE IF NOT EXISTS ellwand.setting (
    name VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, value JSON NOT NULL, PRIMARY KEY (name))`,
];

const records = [
  `CREATE TABLE IF NOT EXISTS ellwand.garment (
    id UUID NOT NULL, own_number VARCHAR(60) NOT NULL, title VARCHAR(200) NOT NULL,
    kind VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, record JSON NOT NULL,
    stage ENUM('draft','in-review','approved','published','withdrawn') NOT NULL DEFAULT 'draft',
    version INT UNSIGNED NOT NULL DEFAULT 1,
    public_number VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NULL,
    published_version INT UNSIGNED NULL, is_public BOOLEAN NOT NULL DEFAULT FALSE,
    created_at DATETIME(3) NOT NULL, created_by UUID NOT NULL,
    updated_at DATETIME(3) NOT NULL, updated_by UUID NOT NULL,
    PRIMARY KEY (id), CONSTRAINT uq_garment_own_number UNIQUE (own_number),
    CONSTRAINT uq_garment_public_number UNIQUE (public_number), KEY ix_garment_stage (stage, updated_at),
    KEY ix_garment_updated (updated_at),
    CONSTRAINT fk_garment_created_by FOREIGN KEY (created_by) REFERENCES ellwand.user (id),
    CONSTRAINT fk_garment_updated_by FOREIGN KEY (updated_by) REFERENCES ellwand.user (id))`,
  `CREATE TABLE IF NOT EXISTS ellwand.garment_editor (
    garment_id UUID NOT NULL, user_id UUID NOT NULL, edited_at DATETIME(3) NOT NULL,
    PRIMARY KEY (garment_id, user_id),
    CONSTRAINT fk_garment_editor_garment FOREIGN KEY (garment_id) REFERENCES ellwand.garment (id),
    CONSTRAINT fk_garment_editor_user FOREIGN KEY (user_id) REFERENCES ellwand.user (id))`,
  `CREATE TABLE IF NOT EXISTS ellwand.part (
    id UUID NOT NULL, garment_id UUID NOT NULL, suffix VARCHAR(8) NOT NULL DEFAULT '',
    kind VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, name VARCHAR(120) NOT NULL,
    position SMALLINT UNSIGNED NOT NULL, PRIMARY KEY (id),
    CONSTRAINT uq_part_suffix UNIQUE (garment_id, suffix),
    CONSTRAINT fk_part_garment FOREIGN KEY (garment_id) REFERENCES ellwand.garment (id))`,
  `CREATE TABLE IF NOT EXISTS ellwand.revision (
    id UUID NOT NULL, garment_id UUID NOT NULL, number INT UNSIGNED NOT NULL,
    outcome ENUM('in-review','returned','approved','published','set-aside') NOT NULL,
    snapshot JSON NOT NULL, submitted_by UUID NOT NULL, submitted_at DATETIME(3) NOT NULL,
    decided_by UUID NULL, decided_at DATETIME(3) NULL, reason VARCHAR(2000) NULL,
    published_version INT UNSIGNED NULL, PRIMARY KEY (id),
    CONSTRAINT uq_revision_number UNIQUE (garment_id, number),
    CONSTRAINT fk_revision_garment FOREIGN KEY (garment_id) REFERENCES ellwand.garment (id),
    CONSTRAINT fk_revision_submitted_by FOREIGN KEY (submitted_by) REFERENCES ellwand.user (id),
    CONSTRAINT fk_revision_decided_by FOREIGN KEY (decided_by) REFERENCES ellwand.user (id))`,
  `CREATE TABLE IF NOT EXISTS ellwand.image (
    id UUID NOT NULL, garment_id UUID NOT NULL, position SMALLINT UNSIGNED NOT NULL,
    version INT UNSIGNED NOT NULL DEFAULT 1, view VARCHAR(10) NOT NULL, alt VARCHAR(1000) NOT NULL DEFAULT '',
    caption VARCHAR(1000) NOT NULL DEFAULT '', credit VARCHAR(300) NOT NULL DEFAULT '',
    hidden BOOLEAN NOT NULL DEFAULT FALSE, file_name VARCHAR(200) NOT NULL,
    state ENUM('received','making','ready','refused') NOT NULL DEFAULT 'received',
    forms_made SMALLINT UNSIGNED NOT NULL DEFAULT 0, forms_wanted SMALLINT UNSIGNED NOT NULL DEFAULT 0,
    refusal VARCHAR(500) NULL, width_px INT UNSIGNED NULL, height_px INT UNSIGNED NULL, widths JSON NOT NULL,
    point_id VARCHAR(60) NULL, taken_on DATE NULL, original_key VARCHAR(200) NOT NULL,
    original_sha256 CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    original_bytes INT UNSIGNED NOT NULL, media_type VARCHAR(40) NOT NULL, created_at DATETIME(3) NOT NULL,
    created_by UUID NOT NULL, claimed_until DATETIME(3) NULL, deleted_at DATETIME(3) NULL,
    PRIMARY KEY (id), KEY ix_image_garment (garment_id, position), KEY ix_image_state (state, claimed_until),
    CONSTRAINT fk_image_garment FOREIGN KEY (garment_id) REFERENCES ellwand.garment (id),
    CONSTRAINT fk_image_created_by FOREIGN KEY (created_by) REFERENCES ellwand.user (id))`,
];

const measuring = [
  `CREATE TABLE IF NOT EXISTS ellwand.sheet (
    id UUID NOT NULL, part_id UUID NOT NULL, protocol_version SMALLINT UNSIGNED NOT NULL,
    state ENUM('open','complete') NOT NULL DEFAULT 'open', version INT UNSIGNED NOT NULL DEFAULT 1,
    alone_because VARCHAR(500) NOT NULL DEFAULT '', measured_on DATE NOT NULL, place VARCHAR(200) NOT NULL,
    support VARCHAR(20) NOT NULL, tape VARCHAR(120) NOT NULL, tape_length_mm DECIMAL(10,4) NOT NULL,
    tape_zero_mm DECIMAL(10,4) NOT NULL DEFAULT 0, fastening_pair VARCHAR(300) NOT NULL DEFAULT '',
    note VARCHAR(4000) NOT NULL DEFAULT '', created_at DATETIME(3) NOT NULL, created_by UUID NOT NULL,
    updated_at DATETIME(3) NOT NULL, updated_by UUID NOT NULL, completed_at DATETIME(3) NULL,
    PRIMARY KEY (id), KEY ix_sheet_part (part_id, measured_on),
    CONSTRAINT fk_sheet_part FOREIGN KEY (part_id) REFERENCES ellwand.part (id),
    CONSTRAINT fk_sheet_created_by FOREIGN KEY (created_by) REFERENCES ellwand.user (id),
    CONSTRAINT fk_sheet_updated_by FOREIGN KEY (updated_by) REFERENCES ellwand.user (id))`,
  `CREATE TABLE IF NOT EXISTS ellwand.sheet_person (
    sheet_id UUID NOT NULL, user_id UUID NOT NULL, duty ENUM('read','held','wrote') NOT NULL,
    PRIMARY KEY (sheet_id, user_id, duty),
    CONSTRAINT fk_sheet_person_sheet FOREIGN KEY (sheet_id) REFERENCES ellwand.sheet (id),
    CONSTRAINT fk_sheet_person_user FOREIGN KEY (user_id) REFERENCES ellwand.user (id))`,
  `CREATE TABLE IF NOT EXISTS ellwand.reading (
    id UUID NOT NULL, sheet_id UUID NOT NULL,
    point_id VARCHAR(60) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, round TINYINT UNSIGNED NOT NULL,
    state ENUM('taken','not-taken') NOT NULL, value_mm DECIMAL(10,4) NULL, typed VARCHAR(40) NULL,
    unit ENUM('mm','cm','in') NULL, tape_count TINYINT UNSIGNED NOT NULL DEFAULT 0,
    tape_length_mm DECIMAL(10,4) NULL, level_found_by VARCHAR(12) NULL, reason VARCHAR(24) NULL,
    replaces UUID NULL, stands BOOLEAN NOT NULL DEFAULT TRUE, note VARCHAR(500) NOT NULL DEFAULT '',
    read_by UUID NOT NULL, recorded_by UUID NOT NULL, device VARCHAR(80) NOT NULL,
    keyed_at DATETIME(3) NOT NULL, received_at DATETIME(3) NOT NULL, sequence BIGINT UNSIGNED NOT NULL AUTO_INCREMENT,
    standing_at VARCHAR(70) AS (IF(stands, CONCAT(point_id, '#', round), NULL)) PERSISTENT,
    PRIMARY KEY (id), CONSTRAINT uq_reading_sequence UNIQUE (sequence),
    CONSTRAINT uq_reading_standing UNIQUE (sheet_id, standing_at), CONSTRAINT uq_reading_replaces UNIQUE (replaces),
    CONSTRAINT ck_reading_state CHECK ((state = 'taken') = (value_mm IS NOT NULL) AND (state = 'taken') = (reason IS NULL)),
    CONSTRAINT fk_reading_sheet FOREIGN KEY (sheet_id) REFERENCES ellwand.sheet (id),
    CONSTRAINT fk_reading_replaces FOREIGN KEY (replaces) REFERENCES ellwand.reading (id),
    CONSTRAINT fk_reading_read_by FOREIGN KEY (read_by) REFERENCES ellwand.user (id),
    CONSTRAINT fk_reading_recorded_by FOREIGN KEY (recorded_by) REFERENCES ellwand.user (id))`,
  `CREATE TABLE IF NOT EXISTS ellwand.finding_answer (
    id UUID NOT NULL, sheet_id UUID NOT NULL, finding_key VARCHAR(200) NOT NULL, reason VARCHAR(500) NOT NULL,
    answered_by UUID NOT NULL, answered_at DATETIME(3) NOT NULL, PRIMARY KEY (id),
    CONSTRAINT uq_finding_answer UNIQUE (sheet_id, finding_key),
    CONSTRAINT fk_finding_answer_sheet FOREIGN KEY (sheet_id) REFERENCES ellwand.sheet (id),
    CONSTRAINT fk_finding_answer_by FOREIGN KEY (answered_by) REFERENCES ellwand.user (id))`,
];

const tables = [
  'finding_answer',
  'reading',
  'sheet_person',
  'sheet',
  'image',
  'revision',
  'part',
  'garment_editor',
  'garment',
];
const peopleTables = ['setting', 'mail_outbox', 'sign_in_slowdown', 'session', 'invitation', 'user'];

/** People, records, pictures and measuring, in the Workroom's schema. Each statement may be run again. */
export class Workroom1764550000000 implements MigrationInterface {
  readonly name = 'Workroom1764550000000';

  async up(runner: QueryRunner): Promise<void> {
    for (const statement of [...people, ...records, ...measuring]) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const table of [...tables, ...peopleTables])
      await runner.query(`DROP TABLE IF EXISTS ellwand.${table}`);
  }
}
