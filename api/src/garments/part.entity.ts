import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { Column, Entity, PrimaryColumn } from 'typeorm';

/** What is measured by itself: a dress of a bodice and a skirt has two. */
@Entity({ name: 'part', database: 'ellwand' })
export class PartRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ name: 'garment_id', type: 'uuid' }) garmentId: string;
  @Column({ type: 'varchar', length: 8 }) suffix: string;
  @Column({ type: 'varchar', length: 20 }) kind: GarmentKind;
  @Column({ type: 'varchar', length: 120 }) name: string;
  @Column({ type: 'smallint', unsigned: true }) position: number;
  /** Not a part by itself but all of them, laid together as worn. */
  @Column({ name: 'worn_together', type: 'boolean' }) wornTogether: boolean;
  /** The sheet that was chosen to speak for the part; none where its newest complete one does by itself. */
  @Column({ name: 'speaking_sheet_id', type: 'uuid', nullable: true }) speakingSheetId: string | null;
  @Column({ name: 'speaking_because', type: 'varchar', length: 500, nullable: true }) speakingBecause:
    string | null;
  @Column({ name: 'speaking_by', type: 'uuid', nullable: true }) speakingBy: string | null;
  @Column({ name: 'speaking_at', type: 'datetime', precision: 3, nullable: true }) speakingAt: Date | null;
}
