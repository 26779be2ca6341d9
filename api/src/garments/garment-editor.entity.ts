import { Column, Entity, PrimaryColumn } from 'typeorm';

/** Who has edited a garment since it was last published: they may not approve what they edited. */
@Entity({ name: 'garment_editor', database: 'ellwand' })
export class GarmentEditor {
  @PrimaryColumn({ name: 'garment_id', type: 'uuid' }) garmentId: string;
  @PrimaryColumn({ name: 'user_id', type: 'uuid' }) userId: string;
  @Column({ name: 'edited_at', type: 'datetime', precision: 3 }) editedAt: Date;
}
