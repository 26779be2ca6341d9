import { Injectable } from '@nestjs/common';
import type { PublishedDocument } from '@ellwand/shared/records/published-garment';
import { Clock } from '../../common/clock';
import type { Tx } from '../../common/work';
import { facetRows, measurementRows, searchText } from './search-rows';

export interface Notice {
  readonly notice: string;
  /** A calendar day, UTC. */
  readonly withdrawnOn: string;
}

/**
 * Writes the published copy into the catalogue's schema, in the transaction of the verb. The current version's
 * search rows replace the ones before; frozen versions stay as they are.
 */
@Injectable()
export class CatalogueWriter {
  constructor(private readonly clock: Clock) {}

  async publish(tx: Tx, garmentId: string, document: PublishedDocument): Promise<void> {
    const now = this.clock.now();
    const { number, version, title, kind, date } = document;
    await tx.query(
      `INSERT INTO ellwand_catalogue.published_garment
         (number, garment_id, state, current_version, title, kind, from_year, to_year, first_published_at, published_at)
       VALUES (?, ?, 'published', ?, ?, ?, ?, ?, ?, ?)
       ON DUPLICATE KEY UPDATE state = 'published', current_version = VALUES(current_version), title = VALUES(title),
         kind = VALUES(kind), from_year = VALUES(from_year), to_year = VALUES(to_year),
         published_at = VALUES(published_at), withdrawn_on = NULL, notice = NULL`,
      [number, garmentId, version, title, kind, date.fromYear, date.toYear, now, now],
    );
    await tx.query(
      "UPDATE ellwand_catalogue.published_version SET state = 'superseded' WHERE number = ? AND state = 'current'",
      [number],
    );
    await tx.query(
      `INSERT INTO ellwand_catalogue.published_version (number, version, state, document, published_at)
       VALUES (?, ?, 'current', ?, ?)`,
      [number, version, JSON.stringify(document), now],
    );
    await this.replaceSearchRows(tx, document);
    await this.showImages(tx, document);
    await this.tell(tx, number, 'published');
  }

  /** Takes every version, picture and search row of a garment out of public view at once. */
  async withdraw(tx: Tx, number: string, { notice, withdrawnOn }: Notice): Promise<void> {
    await tx.query(
      "UPDATE ellwand_catalogue.published_garment SET state = 'withdrawn', notice = ?, withdrawn_on = ? WHERE number = ?",
      [notice, withdrawnOn, number],
    );
    await tx.query("UPDATE ellwand_catalogue.published_version SET state = 'withdrawn' WHERE number = ?", [
      number,
    ]);
    await tx.query("UPDATE ellwand_catalogue.published_image SET state = 'withdrawn' WHERE number = ?", [
      number,
    ]);
    await this.clearSearchRows(tx, number);
    await this.tell(tx, number, 'withdrawn');
  }

  private async replaceSearchRows(tx: Tx, document: PublishedDocument): Promise<void> {
    const { number } = document;
    await this.clearSearchRows(tx, number);
    for (const { facet, value, label } of facetRows(document)) {
      await tx.query(
        // What the database holds for the same word, such as "straße" and "strasse", is kept once.
        `INSERT INTO ellwand_catalogue.published_facet (number, facet, value, label) VALUES (?, ?, ?, ?)
         ON DUPLICATE KEY UPDATE label = label`,
        [number, facet, value, label],
      );
    }
    for (const row of measurementRows(document)) {
      const { partNumber, partName, pointId, ownGroup, ownLabel, valueMm } = row;
      await tx.query(
        `INSERT INTO ellwand_catalogue.published_measurement (number, part_number, part_name, point_id, own_group, own_label, value_mm)
         VALUES (?, ?, ?, ?, ?, ?, ?)`,
        [number, partNumber, partName, pointId, ownGroup, ownLabel, valueMm],
      );
    }
    await tx.query('INSERT INTO ellwand_catalogue.published_text (number, text) VALUES (?, ?)', [
      number,
      searchText(document),
    ]);
  }

  private async clearSearchRows(tx: Tx, number: string): Promise<void> {
    for (const table of ['facet', 'measurement', 'text']) {
      await tx.query(`DELETE FROM ellwand_catalogue.published_${table} WHERE number = ?`, [number]);
    }
  }

  /** Pictures of earlier versions that are still public stay visible with them. */
  private async showImages(tx: Tx, document: PublishedDocument): Promise<void> {
    for (const image of document.images) {
      await tx.query(
        `INSERT INTO ellwand_catalogue.published_image (image_id, number, state, widths) VALUES (?, ?, 'visible', ?)
         ON DUPLICATE KEY UPDATE state = 'visible', widths = VALUES(widths)`,
        [image.id, document.number, JSON.stringify(image.widths)],
      );
    }
  }

  private async tell(tx: Tx, number: string, happened: 'published' | 'withdrawn'): Promise<void> {
    await tx.query('INSERT INTO ellwand_catalogue.published_change (number, happened, at) VALUES (?, ?, ?)', [
      number,
      happened,
      this.clock.now(),
    ]);
  }
}
