import { fromMmString, toMmString } from '@ellwand/shared/units/length';
import { LevelFoundBy, NotTakenReason, type StoredReading } from '@ellwand/shared/records/sheet';
import type { ReadingRow } from './reading.entity';

/** DECIMAL(10,4) comes back as "612.0000"; lengths travel without trailing zeros. */
export function trimmedMm(decimal: string): string {
  return toMmString(fromMmString(decimal));
}

/** A reading as it travels and as it is frozen. */
export function toStored(row: ReadingRow): StoredReading {
  return {
    id: row.id,
    pointId: row.pointId,
    round: row.round,
    worn: row.worn,
    state: row.state,
    valueMm: row.valueMm === null ? null : trimmedMm(row.valueMm),
    typed: row.typed,
    unit: row.unit,
    tapeCount: row.tapeCount,
    tapeLengthMm: row.tapeLengthMm === null ? null : trimmedMm(row.tapeLengthMm),
    gapTyped: row.gapTyped,
    gapMm: row.gapMm === null ? null : trimmedMm(row.gapMm),
    method: row.method,
    depthTyped: row.depthTyped,
    depthMm: row.depthMm === null ? null : trimmedMm(row.depthMm),
    levelFoundBy: LevelFoundBy.nullable().parse(row.levelFoundBy),
    reason: NotTakenReason.nullable().parse(row.reason),
    replaces: row.replaces,
    stands: row.stands,
    note: row.note,
    readBy: row.readBy,
    heldBy: row.heldBy,
    recordedBy: row.recordedBy,
    device: row.device,
    keyedAt: row.keyedAt.toISOString(),
    receivedAt: row.receivedAt.toISOString(),
  };
}
