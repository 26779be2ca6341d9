import { Injectable } from '@nestjs/common';
import { GarmentRecord } from '@ellwand/shared/records/garment';
import { toProtocolView } from '@ellwand/shared/records/protocol';
import { Sheet } from '@ellwand/shared/records/sheet';
import { In, IsNull } from 'typeorm';
import type { z } from 'zod';
import { notFound } from '../../common/refusal';
import type { Tx } from '../../common/work';
import { GarmentRow } from '../../garments/garment.entity';
import { PartRow } from '../../garments/part.entity';
import { ImageRow } from '../../media/image.entity';
import { UserRow } from '../../users/user.entity';
import { ProtocolBook } from '../protocols/protocol-book';
import { ReadingRow } from '../readings/reading.entity';
import { toStored, trimmedMm } from '../readings/stored-reading';
import { tableNotesOf } from '../table-notes/stored-note';
import { SheetPersonRow } from './sheet-person.entity';
import { SheetRow } from './sheet.entity';

type SheetShown = z.output<typeof Sheet>;

/** Puts together a measuring sheet with all that the table needs: who, what, which cautions, every reading. */
@Injectable()
export class SheetView {
  constructor(private readonly protocols: ProtocolBook) {}

  /** @throws Refusal 404 */
  async of(tx: Tx, sheetId: string): Promise<SheetShown> {
    const sheet = await tx.findOne(SheetRow, { where: { id: sheetId } });
    if (!sheet) throw notFound('sheet.unknown', 'measuring sheet');
    const part = await tx.findOneOrFail(PartRow, { where: { id: sheet.partId } });
    const garment = await tx.findOneOrFail(GarmentRow, { where: { id: part.garmentId } });
    const readings = await readingsOf(tx, sheetId);
    const protocol = await this.protocols.at(tx, part, sheet.protocolVersion);
    const newest = await this.protocols.current(tx, part);
    return {
      id: sheet.id,
      version: sheet.version,
      partId: part.id,
      garmentId: garment.id,
      garmentVersion: garment.version,
      kind: part.kind,
      protocolVersion: sheet.protocolVersion,
      protocol: toProtocolView(protocol),
      newestProtocolVersion: newest.version,
      wornTogether: part.wornTogether,
      state: sheet.state,
      facts: factsOf(sheet, await peopleOf(tx, sheetId)),
      garment: headingOf(garment, part, await firstImage(tx, garment.id)),
      readings: readings.map(toStored),
      tableNotes: await tableNotesOf(tx, sheetId),
    };
  }
}

/** Every reading of a sheet, replaced ones too, in the order in which they were keyed. */
export function readingsOf(tx: Tx, sheetId: string): Promise<ReadingRow[]> {
  return tx.find(ReadingRow, { where: { sheetId }, order: { keyedAt: 'ASC', id: 'ASC' } });
}

export async function peopleOf(tx: Tx, sheetId: string): Promise<SheetShown['facts']['people']> {
  const rows = await tx.find(SheetPersonRow, { where: { sheetId } });
  if (rows.length === 0) return [];
  const users = await tx.find(UserRow, { where: { id: In(rows.map((row) => row.userId)) } });
  const names = new Map(users.map((user) => [user.id, user.name]));
  return rows.map(({ userId, duty }) => ({ userId, duty, name: names.get(userId) ?? '' }));
}

function factsOf(sheet: SheetRow, people: SheetShown['facts']['people']): SheetShown['facts'] {
  return {
    people,
    aloneBecause: sheet.aloneBecause,
    measuredOn: sheet.measuredOn,
    place: sheet.place,
    support: Sheet.shape.facts.shape.support.parse(sheet.support),
    tape: sheet.tape,
    tapeLengthMm: trimmedMm(sheet.tapeLengthMm),
    tapeZeroMm: trimmedMm(sheet.tapeZeroMm),
    fasteningPair: sheet.fasteningPair,
    note: sheet.note,
    repeatPoints: sheet.repeatPoints,
    purpose: sheet.purpose,
  };
}

function headingOf(garment: GarmentRow, part: PartRow, firstImageId: string | null): SheetShown['garment'] {
  const record = GarmentRecord.parse(garment.record);
  return {
    ownNumber: record.ownNumber,
    title: record.title,
    date: record.date,
    maker: record.maker,
    partName: part.name,
    partSuffix: part.suffix,
    firstImageId,
    handling: record.handling,
    hazards: record.hazards,
  };
}

async function firstImage(tx: Tx, garmentId: string): Promise<string | null> {
  const image = await tx.findOne(ImageRow, {
    where: { garmentId, state: 'ready', deletedAt: IsNull() },
    order: { position: 'ASC', id: 'ASC' },
  });
  return image?.id ?? null;
}
