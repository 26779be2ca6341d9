import { Injectable } from '@nestjs/common';
import type {
  PublishedDocument,
  PublishedGarment,
  WithdrawalNotice,
} from '@ellwand/shared/records/published-garment';
import type { VersionState } from '@ellwand/shared/records/record-moves';
import type { GarmentFound } from '@ellwand/shared/records/site-catalogue';
import { DataSource } from 'typeorm';
import { InjectCatalogue } from '../common/catalogue-connection';
import { fromJson } from './json-column';

interface FoundRow {
  readonly garment_state: 'published' | 'withdrawn';
  readonly notice: string | null;
  readonly withdrawn_on: string | null;
  readonly state: VersionState | null;
  readonly document: unknown;
}
interface VersionRow {
  readonly version: number;
  readonly published_at: Date;
  readonly state: VersionState;
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
    const row = await this.row(number, version);
    if (!row) return nothing;
    if (row.garment_state === 'withdrawn' || row.state === 'withdrawn') {
      // A garment that was withdrawn answers so for every version it ever had, but not for others.
      if (row.state === null) return nothing;
      return { found: 'withdrawn', notice: await this.notice(number, row) };
    }
    if (row.state === null || row.document === null) return nothing;
    return { found: 'garment', garment: await this.garment(number, row.state, row.document) };
  }

  private async row(number: string, version: number | undefined): Promise<FoundRow | undefined> {
    const rows: FoundRow[] = await this.catalogue.query(
      `SELECT g.state AS garment_state, g.notice, DATE_FORMAT(g.withdrawn_on, '%Y-%m-%d') AS withdrawn_on,
          v.state, v.document
        FROM published_garment g
        LEFT JOIN published_version v ON v.number = g.number AND v.version = COALESCE(?, g.current_version)
        WHERE g.number = ?`,
      [version ?? null, number],
    );
    return rows[0];
  }

  private async garment(number: string, state: VersionState, document: unknown): Promise<PublishedGarment> {
    const rows: VersionRow[] = await this.catalogue.query(
      'SELECT version, published_at, state FROM published_version WHERE number = ? ORDER BY version',
      [number],
    );
    const versions = rows.map((row) => ({
      version: row.version,
      publishedAt: row.published_at.toISOString(),
      state: row.state,
    }));
    return { ...(fromJson(document) as PublishedDocument), state, versions };
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
