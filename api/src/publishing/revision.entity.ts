import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Snapshot } from './snapshot';

/** What was sent to review, frozen: the version that is published is made from this and nothing later. */
@Entity({ name: 'revision', database: 'ellwand' })
export class RevisionRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ name: 'garment_id', type: 'uuid' }) garmentId: string;
  @Column({ type: 'int', unsigned: true }) number: number;
  @Column({ type: 'varchar', length: 10 }) outcome:
    'in-review' | 'returned' | 'approved' | 'published' | 'set-aside';
  @Column({ type: 'json' }) snapshot: Snapshot;
  @Column({ name: 'submitted_by', type: 'uuid' }) submittedBy: string;
  @Column({ name: 'submitted_at', type: 'datetime', precision: 3 }) submittedAt: Date;
  @Column({ name: 'decided_by', type: 'uuid', nullable: true }) decidedBy: string | null;
  @Column({ name: 'decided_at', type: 'datetime', precision: 3, nullable: true }) decidedAt: Date | null;
  @Column({ type: 'varchar', length: 2000, nullable: true }) reason: string | null;
  @Column({ name: 'published_version', type: 'int', unsigned: true, nullable: true }) publishedVersion:
    number | null;
}
