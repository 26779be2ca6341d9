import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity({ name: 'image', database: 'ellwand' })
export class ImageRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ name: 'garment_id', type: 'uuid' }) garmentId: string;
  @Column({ type: 'smallint', unsigned: true }) position: number;
  @Column({ type: 'int', unsigned: true }) version: number;
  @Column({ type: 'varchar', length: 10 }) view: string;
  @Column({ type: 'varchar', length: 1000 }) alt: string;
  @Column({ type: 'varchar', length: 1000 }) caption: string;
  @Column({ type: 'varchar', length: 300 }) credit: string;
  @Column({ type: 'boolean' }) hidden: boolean;
  @Column({ name: 'file_name', type: 'varchar', length: 200 }) fileName: string;
  @Column({ type: 'varchar', length: 8 }) state: 'received' | 'making' | 'ready' | 'refused';
  @Column({ name: 'forms_made', type: 'smallint', unsigned: true }) formsMade: number;
  @Column({ name: 'forms_wanted', type: 'smallint', unsigned: true }) formsWanted: number;
  @Column({ type: 'varchar', length: 500, nullable: true }) refusal: string | null;
  @Column({ name: 'width_px', type: 'int', unsigned: true, nullable: true }) widthPx: number | null;
  @Column({ name: 'height_px', type: 'int', unsigned: true, nullable: true }) heightPx: number | null;
  @Column({ type: 'json' }) widths: number[];
  @Column({ name: 'point_id', type: 'varchar', length: 60, nullable: true }) pointId: string | null;
  @Column({ name: 'taken_on', type: 'date', nullable: true }) takenOn: string | null;
  /** Where the original lies in the store. It is kept and never public. */
  @Column({ name: 'original_key', type: 'varchar', length: 200 }) originalKey: string;
  @Column({ name: 'original_sha256', type: 'char', length: 64 }) originalSha256: string;
  @Column({ name: 'original_bytes', type: 'int', unsigned: true }) originalBytes: number;
  @Column({ name: 'media_type', type: 'varchar', length: 40 }) mediaType: string;
  @Column({ name: 'created_at', type: 'datetime', precision: 3 }) createdAt: Date;
  @Column({ name: 'created_by', type: 'uuid' }) createdBy: string;
  /** A worker that makes the smaller forms holds the picture until then. */
  @Column({ name: 'claimed_until', type: 'datetime', precision: 3, nullable: true })
  claimedUntil: Date | null;
  @Column({ name: 'deleted_at', type: 'datetime', precision: 3, nullable: true }) deletedAt: Date | null;
}
