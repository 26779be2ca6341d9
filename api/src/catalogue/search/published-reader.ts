import { Injectable } from '@nestjs/common';
import { PublishedImage } from '@ellwand/shared/records/published-garment';
import { fromMmString } from '@ellwand/shared/units/length';
import { DataSource } from 'typeorm';
import { z } from 'zod';
import { InjectCatalogue } from '../../common/catalogue-connection';
import { fromJson } from '../json-column';
import { type IndexedGarment, type IndexedMeasurement, namedPoint } from './indexed-garment';

interface GarmentRow {
  readonly number: string;
  readonly title: string;
  readonly kind: string;
  readonly from_year: number;
  readonly to_year: number;
  readonly published_at: Date;
  readonly date_display: string;
  readonly image: unknown;
  /** JSON: a day or null for each part. */
  readonly measured_on: unknown;
  readonly text: string | null;
}
interface FacetRow {
  readonly number: string;
  readonly facet: string;
  readonly value: string;
  readonly label: string;
}
interface MeasurementRow {
  readonly number: string;
  readonly point_id: string;
  readonly part_name: string;
  readonly own_group: string | null;
  readonly own_label: string | null;
  readonly value_mm: string;
}
interface ChangeRow {
  readonly sequence: string;
  readonly number: string;
}

/** One publish or withdrawal, as the published tables tell of it. */
export interface Change {
  readonly sequence: number;
  readonly number: string;
}

/** Reads from the published tables what the search needs, and nothing more. */
@Injectable()
export class PublishedReader {
  constructor(@InjectCatalogue() private readonly catalogue: DataSource) {}

  /** Numbers of everything that is published now. */
  async numbers(): Promise<string[]> {
    const rows: { number: string }[] = await this.catalogue.query(
      "SELECT number FROM published_garment WHERE state = 'published' ORDER BY number",
    );
    return rows.map(({ number }) => number);
  }

  /** Changes after a point in the sequence, oldest first. */
  async changesAfter(sequence: number): Promise<Change[]> {
    const rows: ChangeRow[] = await this.catalogue.query(
      'SELECT sequence, number FROM published_change WHERE sequence > ? ORDER BY sequence',
      [sequence],
    );
    return rows.map((row) => ({ sequence: Number(row.sequence), number: row.number }));
  }

  /** The last change's place in the sequence; 0 where there was none. */
  async lastSequence(): Promise<number> {
    const rows: { last: string | null }[] = await this.catalogue.query(
      'SELECT MAX(sequence) AS last FROM published_change',
    );
    return Number(rows[0]?.last ?? 0);
  }

  /** Those of the garments that are published, as they are now. */
  async read(numbers: readonly string[]): Promise<IndexedGarment[]> {
    if (numbers.length === 0) return [];
    const garments: GarmentRow[] = await this.catalogue.query(
      `SELECT g.number, g.title, g.kind, g.from_year, g.to_year, g.published_at, t.text,
          JSON_VALUE(v.document, '$.date.display') AS date_display, JSON_EXTRACT(v.document, '$.images[0]') AS image,
          JSON_EXTRACT(v.document, '$.parts[*].measuredOn') AS measured_on
        FROM published_garment g
        JOIN published_version v ON v.number = g.number AND v.version = g.current_version
        LEFT JOIN published_text t ON t.number = g.number
        WHERE g.number IN (?) AND g.state = 'published'`,
      [numbers],
    );
    const facets: FacetRow[] = await this.catalogue.query(
      'SELECT number, facet, value, label FROM published_facet WHERE number IN (?)',
      [numbers],
    );
    const measurements: MeasurementRow[] = await this.catalogue.query(
      `SELECT number, point_id, own_group, own_label, part_name, value_mm FROM published_measurement
        WHERE number IN (?)
        ORDER BY number, part_number, point_id`,
      [numbers],
    );
    const facetsOf = grouped(facets);
    const measurementsOf = grouped(measurements);
    return garments.map((row) =>
      indexed(row, facetsOf.get(row.number) ?? [], measurementsOf.get(row.number) ?? []),
    );
  }
}

function indexed(
  row: GarmentRow,
  facets: readonly FacetRow[],
  measurements: readonly MeasurementRow[],
): IndexedGarment {
  return {
    number: row.number,
    title: row.title,
    kind: row.kind,
    dateDisplay: row.date_display,
    fromYear: row.from_year,
    toYear: row.to_year,
    publishedAt: row.published_at.getTime(),
    measuredOn: latestOf(row.measured_on),
    image: row.image === null ? null : PublishedImage.parse(fromJson(row.image)),
    facets: facets.map(({ facet, value, label }) => ({ facet, value, label })),
    measurements: measurements.map((measured): IndexedMeasurement => ({
      ...namedPoint(measured.point_id, { group: measured.own_group, label: measured.own_label }),
      partName: measured.part_name,
      value: fromMmString(measured.value_mm),
    })),
    text: row.text ?? '',
  };
}

function grouped<T extends { readonly number: string }>(rows: readonly T[]): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const row of rows) {
    const group = groups.get(row.number);
    if (group) group.push(row);
    else groups.set(row.number, [row]);
  }
  return groups;
}

/** The last day on which any part was measured; nothing where none was. */
function latestOf(days: unknown): string {
  return z
    .array(z.string().nullable())
    .catch([])
    .parse(fromJson(days))
    .reduce<string>((latest, day) => (day !== null && day > latest ? day : latest), '');
}
