import { Column, Entity, PrimaryColumn } from 'typeorm';

/** Who did what, when. The account that writes it can neither change nor delete it. */
@Entity({ name: 'entry', database: 'ellwand_audit' })
export class AuditEntryRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ type: 'datetime', precision: 3 }) at: Date;
  @Column({ name: 'actor_id', type: 'uuid', nullable: true }) actorId: string | null;
  @Column({ name: 'actor_name', type: 'varchar', length: 120, nullable: true }) actorName: string | null;
  @Column({ type: 'varchar', length: 40 }) verb: string;
  @Column({ name: 'subject_kind', type: 'varchar', length: 30 }) subjectKind: string;
  @Column({ name: 'subject_id', type: 'uuid', nullable: true }) subjectId: string | null;
  @Column({ type: 'varchar', length: 500 }) summary: string;
  @Column({ type: 'json' }) facts: object;
}
