import type { WornSide } from '@ellwand/shared/readings/worn-side';
import { Column, Entity, PrimaryColumn } from 'typeorm';

/**
 * One value read off the tape, exactly as keyed, beside its exact millimetres. What was keyed is never changed: a
 * correction is a new reading that names the one it replaces, and at most one stands for each point and round. The
 * millimetres follow the sheet's tape, see `other-tape.ts`.
 */
@Entity({ name: 'reading', database: 'ellwand' })
export class ReadingRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ name: 'sheet_id', type: 'uuid' }) sheetId: string;
  @Column({ name: 'point_id', type: 'varchar', length: 60 }) pointId: string;
  @Column({ type: 'tinyint', unsigned: true }) round: number;
  /** Which of a pair, as worn. */
  @Column({ type: 'varchar', length: 5, nullable: true }) worn: WornSide | null;
  @Column({ type: 'varchar', length: 9 }) state: 'taken' | 'not-taken';
  /** The whole value: tapes and rest added, a half doubled, the tape's zero taken off. */
  @Column({ name: 'value_mm', type: 'decimal', precision: 10, scale: 4, nullable: true }) valueMm:
    string | null;
  @Column({ type: 'varchar', length: 40, nullable: true }) typed: string | null;
  @Column({ type: 'varchar', length: 2, nullable: true }) unit: 'mm' | 'cm' | 'in' | null;
  @Column({ name: 'tape_count', type: 'tinyint', unsigned: true }) tapeCount: number;
  @Column({ name: 'tape_length_mm', type: 'decimal', precision: 10, scale: 4, nullable: true }) tapeLengthMm:
    string | null;
  @Column({ name: 'gap_typed', type: 'varchar', length: 40, nullable: true }) gapTyped: string | null;
  @Column({ name: 'gap_mm', type: 'decimal', precision: 10, scale: 4, nullable: true }) gapMm: string | null;
  @Column({ type: 'varchar', length: 12, nullable: true }) method: 'flat-doubled' | null;
  @Column({ name: 'depth_typed', type: 'varchar', length: 40, nullable: true }) depthTyped: string | null;
  @Column({ name: 'depth_mm', type: 'decimal', precision: 10, scale: 4, nullable: true }) depthMm:
    string | null;
  @Column({ name: 'level_found_by', type: 'varchar', length: 12, nullable: true }) levelFoundBy:
    string | null;
  @Column({ type: 'varchar', length: 24, nullable: true }) reason: string | null;
  @Column({ type: 'uuid', nullable: true }) replaces: string | null;
  @Column({ type: 'boolean' }) stands: boolean;
  @Column({ type: 'varchar', length: 500 }) note: string;
  @Column({ name: 'read_by', type: 'uuid' }) readBy: string;
  @Column({ name: 'held_by', type: 'uuid', nullable: true }) heldBy: string | null;
  @Column({ name: 'recorded_by', type: 'uuid' }) recordedBy: string;
  @Column({ type: 'varchar', length: 80 }) device: string;
  @Column({ name: 'keyed_at', type: 'datetime', precision: 3 }) keyedAt: Date;
  @Column({ name: 'received_at', type: 'datetime', precision: 3 }) receivedAt: Date;
}
