import { Injectable } from '@nestjs/common';
import type { NewReading, ReadingResults } from '@ellwand/shared/records/sheet';
import { In, IsNull } from 'typeorm';
import type { z } from 'zod';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { conflict } from '../../common/refusal';
import { type Tx, Work } from '../../common/work';
import { DamageService } from '../damage/damage.service';
import { ProtocolBook } from '../protocols/protocol-book';
import { SheetEdits, type SheetInHand } from '../sheets/sheet-edits';
import { SheetPersonRow } from '../sheets/sheet-person.entity';
import { SheetRow } from '../sheets/sheet.entity';
import { takeIn, type TapeFacts } from './reading-intake';
import { ReadingRow } from './reading.entity';
import { toStored } from './stored-reading';

type Results = z.output<typeof ReadingResults>;
type Result = Results['results'][number];

/**
 * Takes readings in, batch by batch. Each carries its own id, so that a batch sent twice changes nothing; each
 * correction names the reading it replaces, so that two people never overwrite one another without seeing it.
 */
@Injectable()
export class ReadingsService {
  constructor(
    private readonly work: Work,
    private readonly sheets: SheetEdits,
    private readonly protocols: ProtocolBook,
    private readonly damage: DamageService,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  takeIn(sheetId: string, readings: readonly NewReading[], actor: Actor): Promise<Results> {
    return this.work.run(async (tx) => {
      const again = await repeatedBatch(tx, sheetId, readings);
      if (again) return again;
      const inHand = await this.sheets.take(tx, actor, sheetId);
      const facts = await this.tapeFacts(tx, inHand);
      const results: Result[] = [];
      for (const reading of readings) results.push(await this.takeOne(tx, inHand, facts, reading, actor));
      const kept = results.filter(({ outcome }) => outcome === 'kept');
      if (kept.length === 0) return { sheetVersion: inHand.sheet.version, results };
      const { version } = await this.sheets.set(tx, actor, inHand.sheet, {});
      await this.audit.note(tx, actor, {
        verb: 'read',
        subjectKind: 'sheet',
        subjectId: sheetId,
        summary: `${actor.name} entered ${kept.length === 1 ? 'a reading' : `${kept.length} readings`} of ${inHand.part.name}`,
        facts: { readings: kept.map(({ id }) => id) },
      });
      const stored = kept.flatMap(({ reading }) => reading ?? []);
      await this.damage.tell(tx, actor, inHand, facts.protocol, stored);
      return { sheetVersion: version, results };
    });
  }

  private async takeOne(
    tx: Tx,
    { sheet }: SheetInHand,
    facts: TapeFacts,
    reading: NewReading,
    actor: Actor,
  ): Promise<Result> {
    const already = await tx.findOne(ReadingRow, { where: { id: reading.id } });
    if (already) return repeated(already, sheet.id, reading);
    // A repeat of what was kept before the sheet was completed is fine; anything new is not.
    if (sheet.state === 'complete')
      throw conflict('sheet.complete', 'This sheet is complete. Open it again to go on.');
    const intake = takeIn(reading, facts);
    if (!intake.accepted) return { id: reading.id, outcome: 'refused', detail: intake.because };
    const { pointId, round, worn } = reading;
    const standing = await tx.findOne(ReadingRow, {
      where: { sheetId: sheet.id, pointId, round, worn: worn ?? IsNull(), stands: true },
    });
    if ((standing?.id ?? null) !== reading.replaces) return disputed(reading, standing);

    if (standing) await tx.update(ReadingRow, { id: standing.id }, { stands: false });
    const row = this.rowOf(sheet.id, reading, intake, actor);
    await tx.insert(ReadingRow, row);
    return { id: reading.id, outcome: 'kept', reading: toStored(row) };
  }

  private async tapeFacts(tx: Tx, { sheet, part }: SheetInHand): Promise<TapeFacts> {
    const people = await tx.find(SheetPersonRow, { where: { sheetId: sheet.id } });
    return {
      protocol: await this.protocols.at(tx, part, sheet.protocolVersion),
      tapeLengthMm: sheet.tapeLengthMm,
      tapeZeroMm: sheet.tapeZeroMm,
      readers: people.filter(({ duty }) => duty === 'read').map(({ userId }) => userId),
      named: people.map(({ userId }) => userId),
    };
  }

  private rowOf(
    sheetId: string,
    reading: NewReading,
    intake: Extract<ReturnType<typeof takeIn>, { accepted: true }>,
    actor: Actor,
  ): ReadingRow {
    const taken = reading.state === 'taken' ? reading : null;
    return {
      id: reading.id,
      sheetId,
      pointId: reading.pointId,
      round: reading.round,
      worn: reading.worn,
      state: reading.state,
      valueMm: intake.valueMm,
      typed: taken?.typed ?? null,
      unit: intake.unit,
      tapeCount: taken?.tapeCount ?? 0,
      tapeLengthMm: intake.tapeLengthMm,
      gapTyped: taken?.gapTyped || null,
      gapMm: intake.gapMm,
      method: taken?.method ?? null,
      depthTyped: taken?.depthTyped || null,
      depthMm: intake.depthMm,
      levelFoundBy: taken?.levelFoundBy ?? null,
      reason: reading.state === 'not-taken' ? reading.reason : null,
      replaces: reading.replaces,
      stands: true,
      note: reading.note,
      readBy: reading.readBy,
      heldBy: reading.heldBy,
      recordedBy: actor.id,
      device: reading.device,
      keyedAt: new Date(reading.keyedAt),
      receivedAt: this.clock.now(),
    };
  }
}

/**
 * A batch that has been kept whole before, answered from what was kept. It touches neither the sheet nor the record:
 * a tablet that never had its answer may repeat itself after the garment was sent to review or published.
 */
async function repeatedBatch(
  tx: Tx,
  sheetId: string,
  readings: readonly NewReading[],
): Promise<Results | undefined> {
  const rows = await tx.find(ReadingRow, { where: { sheetId, id: In(readings.map(({ id }) => id)) } });
  const kept = new Map(rows.map((row) => [row.id, row]));
  const results = readings.flatMap((reading) => {
    const already = kept.get(reading.id);
    return already ? [repeated(already, sheetId, reading)] : [];
  });
  if (results.length < readings.length) return undefined;
  const { version } = await tx.findOneByOrFail(SheetRow, { id: sheetId });
  return { sheetVersion: version, results };
}

/** The same reading again is answered with what was kept; another one under its id is refused. */
function repeated(already: ReadingRow, sheetId: string, reading: NewReading): Result {
  const same =
    already.sheetId === sheetId &&
    already.pointId === reading.pointId &&
    already.round === reading.round &&
    already.worn === reading.worn &&
    already.state === reading.state &&
    already.typed === (reading.state === 'taken' ? reading.typed : null);
  if (!same)
    return { id: reading.id, outcome: 'refused', detail: 'Another reading was sent under this id before.' };
  return { id: reading.id, outcome: 'already-kept', reading: toStored(already) };
}

function disputed(reading: NewReading, standing: ReadingRow | null): Result {
  const detail = standing
    ? 'Another reading stands at this point and round. Keep one of the two, or keep both as two rounds.'
    : 'The reading that this one corrects does not stand here any more.';
  return {
    id: reading.id,
    outcome: 'conflict',
    detail,
    ...(standing ? { standing: toStored(standing) } : {}),
  };
}
