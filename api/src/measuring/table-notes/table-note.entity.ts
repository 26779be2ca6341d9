import type { NewTableNote } from '@ellwand/shared/records/table-note';
import { Column, Entity, PrimaryColumn } from 'typeorm';

/** What was said at the table beside readings: kept as it was said, never changed. */
@Entity({ name: 'table_note', database: 'ellwand' })
export class TableNoteRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ name: 'sheet_id', type: 'uuid' }) sheetId: string;
  @Column({ type: 'varchar', length: 12 }) about: NewTableNote['about'];
  /** The note's own fields: everything beside its id, device and moment. */
  @Column({ type: 'json' }) body: object;
  @Column({ type: 'varchar', length: 80 }) device: string;
  @Column({ name: 'said_at', type: 'datetime', precision: 3 }) saidAt: Date;
  @Column({ name: 'said_by', type: 'uuid' }) saidBy: string;
  @Column({ name: 'received_at', type: 'datetime', precision: 3 }) receivedAt: Date;
  /** What became of it since: laid into the record, or set aside; null while it waits, or where nothing is to become of it. */
  @Column({ type: 'varchar', length: 10, nullable: true }) settled: 'laid-in' | 'set-aside' | null;
  @Column({ name: 'settled_by', type: 'uuid', nullable: true }) settledBy: string | null;
  @Column({ name: 'settled_at', type: 'datetime', precision: 3, nullable: true }) settledAt: Date | null;
}
