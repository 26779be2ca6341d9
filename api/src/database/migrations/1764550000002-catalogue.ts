import type { MigrationInterface, QueryRunner } from 'typeorm';

const tables = [
  `CREATE TABLE IF NOT EXISTS ellwand_catalogue.published_garment (
    number VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, garment_id UUID NOT NULL,
    state ENUM('published','withdrawn') NOT NULL, current_version INT UNSIGNED NOT NULL,
    title VARCHAR(200) NOT NULL, kind VARCHAR(20) NOT NULL, from_year SMALLINT NOT NULL, to_year SMALLINT NOT NULL,
    first_published_at DATETIME(3) NOT NULL, published_at DATETIME(3) NOT NULL,
    withdrawn_on DATE NULL, notice VARCHAR(1000) NULL,
    PRIMARY KEY (number), CONSTRAINT uq_published_garment UNIQUE (garment_id),
    KEY ix_published_garment_newest (state, published_at))`,
  `CREATE TABLE IF NOT EXISTS ellwand_catalogue.published_version (
    number VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, version INT UNSIGNED NOT NULL,
    state ENUM('current','superseded','withdrawn') NOT NULL, document JSON NOT NULL,
    published_at DATETIME(3) NOT NULL, PRIMARY KEY (number, version),
    CONSTRAINT fk_published_version FOREIGN KEY (number) REFERENCES ellwand_catalogue.published_garment (number))`,
  `CREATE TABLE IF NOT EXISTS ellwand_catalogue.published_measurement (
    number VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, part_number VARCHAR(80) NOT NULL,
    part_name VARCHAR(120) NOT NULL, point_id VARCHAR(60) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    value_mm DECIMAL(10,4) NOT NULL, PRIMARY KEY (number, part_number, point_id),
    KEY ix_published_measurement_value (point_id, value_mm),
    CONSTRAINT fk_published_measurement FOREIGN KEY (number) REFERENCES ellwand_catalogue.published_garment (number))`,
  `CREATE TABLE IF NOT EXISTS ellwand_catalogue.published_facet (
    number VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    facet VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, value VARCHAR(200) NOT NULL,
    label VARCHAR(200) NOT NULL, PRIMARY KEY (number, facet, value), KEY ix_published_facet (facet, value),
    CONSTRAINT fk_published_facet FOREIGN KEY (number) REFERENCES ellwand_catalogue.published_garment (number))`,
  // Search text stands by itself: a table with a FULLTEXT index cannot take a column instantly.
  `CREATE TABLE IF NOT EXISTS ellwand_catalogue.published_text (
    number VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, text MEDIUMTEXT NOT NULL,
    PRIMARY KEY (number), FULLTEXT KEY ft_published_text (text),
    CONSTRAINT fk_published_text FOREIGN KEY (number) REFERENCES ellwand_catalogue.published_garment (number))`,
  `CREATE TABLE IF NOT EXISTS ellwand_catalogue.published_image (
    image_id UUID NOT NULL, number VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    state ENUM('visible','withdrawn') NOT NULL, widths JSON NOT NULL, PRIMARY KEY (image_id),
    KEY ix_published_image_number (number),
    CONSTRAINT fk_published_image FOREIGN KEY (number) REFERENCES ellwand_catalogue.published_garment (number))`,
  // Other processes learn of a publish or a withdrawal by this sequence.
  `CREATE TABLE IF NOT EXISTS ellwand_catalogue.published_change (
    sequence BIGINT UNSIGNED NOT NULL AUTO_INCREMENT, number VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    happened ENUM('published','withdrawn') NOT NULL, at DATETIME(3) NOT NULL, PRIMARY KEY (sequence))`,
];

/** The published copies: all that the public side can read. */
export class Catalogue1764550000002 implements MigrationInterface {
  readonly name = 'Catalogue1764550000002';

  async up(runner: QueryRunner): Promise<void> {
    for (const statement of tables) await runner.query(statement);
  }

  async down(runner: QueryRunner): Promise<void> {
    const names = ['change', 'image', 'text', 'facet', 'measurement', 'version', 'garment'];
    for (const name of names) await runner.query(`DROP TABLE IF EXISTS ellwand_catalogue.published_${name}`);
  }
}
