import { Column, Entity, PrimaryColumn } from 'typeorm';

/** Why a finding is all right as it stands. Its key holds the figures, so that a new reading asks anew. */
@Entity({ name: 'finding_answer', database: 'ellwand' })
export class FindingAnswerRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ name: 'sheet_id', type: 'uuid' }) sheetId: string;
  @Column({ name: 'finding_key', type: 'varchar', length: 200 }) findingKey: string;
  @Column({ type: 'varchar', length: 500 }) reason: string;
  @Column({ name: 'answered_by', type: 'uuid' }) answeredBy: string;
  @Column({ name: 'answered_at', type: 'datetime', precision: 3 }) answeredAt: Date;
}
