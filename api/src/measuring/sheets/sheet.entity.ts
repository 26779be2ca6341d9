import type { SheetPurpose } from '@ellwand/shared/records/sheet';
import { Column, Entity, PrimaryColumn } from 'typeorm';

/** The measuring of one part. Lengths are exact decimals of a millimetre, kept as strings. */
@Entity({ name: 'sheet', database: 'ellwand' })
export class SheetRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ name: 'part_id', type: 'uuid' }) partId: string;
  @Column({ name: 'protocol_version', type: 'smallint', unsigned: true }) protocolVersion: number;
  @Column({ type: 'varchar', length: 8 }) state: 'open' | 'complete';
  @Column({ type: 'int', unsigned: true }) version: number;
  @Column({ name: 'alone_because', type: 'varchar', length: 500 }) aloneBecause: string;
  @Column({ name: 'measured_on', type: 'date' }) measuredOn: string;
  @Column({ type: 'varchar', length: 200 }) place: string;
  @Column({ type: 'varchar', length: 20 }) support: string;
  @Column({ type: 'varchar', length: 120 }) tape: string;
  @Column({ name: 'tape_length_mm', type: 'decimal', precision: 10, scale: 4 }) tapeLengthMm: string;
  @Column({ name: 'tape_zero_mm', type: 'decimal', precision: 10, scale: 4 }) tapeZeroMm: string;
  @Column({ name: 'fastening_pair', type: 'varchar', length: 300 }) fasteningPair: string;
  @Column({ type: 'varchar', length: 4000 }) note: string;
  @Column({ name: 'repeat_points', type: 'json' }) repeatPoints: string[];
  @Column({ type: 'varchar', length: 8 }) purpose: SheetPurpose;
  @Column({ name: 'created_at', type: 'datetime', precision: 3 }) createdAt: Date;
  @Column({ name: 'created_by', type: 'uuid' }) createdBy: string;
  @Column({ name: 'updated_at', type: 'datetime', precision: 3 }) updatedAt: Date;
  @Column({ name: 'updated_by', type: 'uuid' }) updatedBy: string;
  @Column({ name: 'completed_at', type: 'datetime', precision: 3, nullable: true }) completedAt: Date | null;
}
