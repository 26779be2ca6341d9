import { Entity, PrimaryColumn } from 'typeorm';

/** Who did what at the table. Whoever is named here may not approve what was measured. */
@Entity({ name: 'sheet_person', database: 'ellwand' })
export class SheetPersonRow {
  @PrimaryColumn({ name: 'sheet_id', type: 'uuid' }) sheetId: string;
  @PrimaryColumn({ name: 'user_id', type: 'uuid' }) userId: string;
  @PrimaryColumn({ type: 'varchar', length: 8 }) duty: 'read' | 'held' | 'wrote';
}
