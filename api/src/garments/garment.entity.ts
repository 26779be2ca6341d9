import type { GarmentRecord } from '@ellwand/shared/records/garment';
import type { RecordStage } from '@ellwand/shared/records/record-moves';
import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A garment as the Workroom keeps it. `ownNumber`, `title` and `kind` repeat the record, for lists. */
@Entity({ name: 'garment', database: 'ellwand' })
export class GarmentRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ name: 'own_number', type: 'varchar', length: 60 }) ownNumber: string;
  @Column({ type: 'varchar', length: 200 }) title: string;
  @Column({ type: 'varchar', length: 20 }) kind: string;
  @Column({ type: 'json' }) record: GarmentRecord;
  @Column({ type: 'varchar', length: 12 }) stage: RecordStage;
  /** Compare and set: every verb that changes the garment names the version it saw. */
  @Column({ type: 'int', unsigned: true }) version: number;
  @Column({ name: 'public_number', type: 'varchar', length: 80, nullable: true }) publicNumber: string | null;
  @Column({ name: 'published_version', type: 'int', unsigned: true, nullable: true }) publishedVersion:
    number | null;
  @Column({ name: 'is_public', type: 'boolean' }) isPublic: boolean;
  @Column({ name: 'created_at', type: 'datetime', precision: 3 }) createdAt: Date;
  @Column({ name: 'created_by', type: 'uuid' }) createdBy: string;
  @Column({ name: 'updated_at', type: 'datetime', precision: 3 }) updatedAt: Date;
  @Column({ name: 'updated_by', type: 'uuid' }) updatedBy: string;
}
