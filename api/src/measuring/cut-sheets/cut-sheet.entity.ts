import type { CutSheetBody } from '@ellwand/shared/records/cut-sheet';
import { Column, Entity, PrimaryColumn } from 'typeorm';

/** What a maker needs of one part beyond its girths. A part without a row has an empty one, at version 0. */
@Entity({ name: 'cut_sheet', database: 'ellwand' })
export class CutSheetRow {
  @PrimaryColumn({ name: 'part_id', type: 'uuid' }) partId: string;
  @Column({ type: 'int', unsigned: true }) version: number;
  @Column({ type: 'json' }) body: CutSheetBody;
  @Column({ name: 'updated_at', type: 'datetime', precision: 3 }) updatedAt: Date;
  @Column({ name: 'updated_by', type: 'uuid' }) updatedBy: string;
}
