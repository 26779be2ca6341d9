import { Column, Entity, PrimaryColumn } from 'typeorm';

/** One named setting of the museum. */
@Entity({ name: 'setting', database: 'ellwand' })
export class SettingRow {
  @PrimaryColumn({ type: 'varchar', length: 80 }) name: string;
  @Column({ type: 'json' }) value: unknown;
}
