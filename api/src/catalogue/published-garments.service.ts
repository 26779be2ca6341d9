import { Injectable } from '@nestjs/common';
import {
  type PublishedDocument,
  type PublishedGarment,
  PublishedPart,
  type WithdrawalNotice,
} from '@ellwand/shared/records/published-garment';
import type { VersionState } from '@ellwand/shared/records/record-moves';
import type { GarmentFound } from '@ellwand/shared/records/site-catalogue';
import { DataSource } from 'typeorm';
import { InjectCatalogue } from '../common/catalogue-connection';
import { fromJson } from './json-column';

/** A garment with one of its versions; the document is there for the version that was asked for. */
interface FoundRow {
  readonly garment_state: 'published' | 'withdrawn';
  readonly notice: string | null;
  readonly withdrawn_on: string | null;
  readonly version: number;
  readonly state: VersionState;
  readonly published_at: Date;
  /** 1 for the version that was asked for. */
  readonly is_asked: string | number;
  readonly document: unknown;
}

const nothing: GarmentFound = { found: 'nothing' };
const mostVersions = 2 ** 31 - 1;

/** Garments as pages show them, read from the published tables each time: a withdrawal counts at once. */
@Injectable()
export class PublishedGarments {
  constructor(@InjectCatalogue() private readonly catalogue: DataSource) {}

  /** The current version, or the frozen one that is named. What never was published is nothing at all. */
  async find(number: string, version?: number): Promise<GarmentFound> {
    if (!/^[a-z0-9-]{1,80}$/.test(number)) return nothing;
    if (version !== undefined && !(version >= 1 && version <= mostVersions)) return nothing;
    const rows = await this.rows(number, version);
    const row = rows.find((each) => Number(each.is_asked) === 1);
    // A garment that was withdrawn answers so for every version it ever had, but not for others.
    if (!row) return nothing;
    if (row.garment_state === 'withdrawn' || row.state === 'withdrawn') {
      return { found: 'withdrawn', notice: await this.notice(number, row) };
    }
    return { found: 'garment', garment: garmentOf(row, rows) };
  }

  /** One question for the garment and all its versions: pages ask it more often than anything else. */
  private rows(number: string, version: number | undefined): Promise<FoundRow[]> {
    const asked = 'v.version = COALESCE(?, g.current_version)';
    return this.catalogue.query(
      `SELECT g.state AS garment_state, g.notice, DATE_FORMAT(g.withdrawn_on, '%Y-%m-%d') AS withdrawn_on,
          v.version, v.state, v.published_at, ${asked} AS is_asked, IF(${asked}, v.document, NULL) AS document
        FROM published_garment g JOIN published_version v ON v.number = g.number
        WHERE g.number = ? ORDER BY v.version`,
      [version ?? null, version ?? null, number],
    );
  }

  /** A garment published anew has no notice any more, but the versions from before stay withdrawn. */
  private async notice(number: string, { notice, withdrawn_on }: FoundRow): Promise<WithdrawalNotice> {
    return {
      number,
      notice: notice ?? 'This version has been withdrawn. The garment has been published anew since.',
      withdrawnOn: withdrawn_on ?? (await this.lastWithdrawal(number)),
    };
  }

  private async lastWithdrawal(number: string): Promise<string> {
    const rows: { day: string | null }[] = await this.catalogue.query(
      `SELECT DATE_FORMAT(MAX(at), '%Y-%m-%d') AS day FROM published_change
        WHERE number = ? AND happened = 'withdrawn'`,
      [number],
    );
    const day = rows[0]?.day;
    if (!day) throw new Error(`No withdrawal of ${number} has been noted`);
    return day;
  }
}

function garmentOf({ state, document }: FoundRow, rows: readonly FoundRow[]): PublishedGarment {
  const versions = rows.map((row) => ({
    version: row.version,
    publishedAt: row.published_at.toISOString(),
    state: row.state,
  }));
  const published = fromJson(document) as PublishedDocument;
  // Documents from before a field of the parts was kept are given what stands for nothing.
  return { ...published, parts: PublishedPart.array().parse(published.parts), state, versions };
}
