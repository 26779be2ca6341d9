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
}
