import type { GarmentKind } from '@ellwand/shared/points/kinds';
import type { ProtocolView } from '@ellwand/shared/records/protocol';
import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A version of a protocol that an administrator made, from 2 on. Added, never changed or taken away. */
@Entity({ name: 'protocol', database: 'ellwand' })
export class ProtocolRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ type: 'varchar', length: 20 }) kind: GarmentKind;
  @Column({ name: 'worn_together', type: 'boolean' }) wornTogether: boolean;
  @Column({ type: 'smallint', unsigned: true }) version: number;
  @Column({ type: 'json' }) body: Pick<ProtocolView, 'points' | 'ownPoints'>;
  @Column({ type: 'varchar', length: 400 }) note: string;
  @Column({ name: 'made_by', type: 'uuid' }) madeBy: string;
  @Column({ name: 'made_at', type: 'datetime', precision: 3 }) madeAt: Date;
}
