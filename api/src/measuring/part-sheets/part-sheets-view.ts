import { Injectable } from '@nestjs/common';
import { type Protocol, pointsOf } from '@ellwand/shared/protocols/protocol';
import type { Reading } from '@ellwand/shared/readings/reading';
import { shownUncertainty } from '@ellwand/shared/readings/uncertainty';
import { notTakenBySide, valuesBySide } from '@ellwand/shared/readings/values-by-side';
import { toReading } from '@ellwand/shared/records/measured';
import type { PartSheets, SheetOfPart } from '@ellwand/shared/records/part-sheets';
import type { StoredTableNote } from '@ellwand/shared/records/table-note';
import { toMmString } from '@ellwand/shared/units/length';
import type { Tx } from '../../common/work';
import { GarmentRow } from '../../garments/garment.entity';
import type { PartRow } from '../../garments/part.entity';
import { RevisionRow } from '../../publishing/revision.entity';
import { ProtocolBook } from '../protocols/protocol-book';
import { toStored } from '../readings/stored-reading';
import { peopleOf, readingsOf } from '../sheets/sheet-view';
import type { SheetRow } from '../sheets/sheet.entity';
import { sheetsOf, speakingOf } from '../sheets/speaking-sheet';
import { tableNotesOf } from '../table-notes/stored-note';
import { choiceOf } from './choice';

/** Puts the sheets of a part beside one another: what each read, which one speaks, which one the public sees. */
@Injectable()
export class PartSheetsView {
  constructor(private readonly protocols: ProtocolBook) {}

  async of(tx: Tx, part: PartRow): Promise<PartSheets> {
    const garment = await tx.findOneByOrFail(GarmentRow, { id: part.garmentId });
    const newestFirst = await sheetsOf(tx, part.id);
    const speaking = speakingOf(part, newestFirst);
    const protocols: Protocol[] = [];
    const sheets: SheetOfPart[] = [];
    for (const sheet of newestFirst) {
      const protocol = await this.protocols.at(tx, part, sheet.protocolVersion);
      protocols.push(protocol);
      sheets.unshift(await sheetOf(tx, sheet, protocol));
    }
    const choice = speaking && speaking.id === part.speakingSheetId ? await choiceOf(tx, part) : null;
    return {
      partId: part.id,
      garmentId: garment.id,
      version: garment.version,
      ownNumber: garment.ownNumber,
      title: garment.title,
      partName: part.name,
      partSuffix: part.suffix,
      kind: part.kind,
      wornTogether: part.wornTogether,
      points: pointsAsked(protocols),
      speaking: speaking ? { sheetId: speaking.id } : null,
      chosen: speaking && choice ? { sheetId: speaking.id, ...choice } : null,
      published: await publishedSheet(tx, garment, part.id),
      sheets,
    };
  }
}

async function sheetOf(tx: Tx, sheet: SheetRow, protocol: Protocol): Promise<SheetOfPart> {
  const readings = (await readingsOf(tx, sheet.id)).map((row) => toReading(toStored(row)));
  return {
    id: sheet.id,
    state: sheet.state,
    purpose: sheet.purpose,
    measuredOn: sheet.measuredOn,
    protocolVersion: sheet.protocolVersion,
    people: await peopleOf(tx, sheet.id),
    note: sheet.note,
    remarks: (await tableNotesOf(tx, sheet.id)).flatMap(remarkOf),
    ...figuresOf(readings, protocol),
  };
}

function figuresOf(
  readings: readonly Reading[],
  protocol: Protocol,
): Pick<SheetOfPart, 'values' | 'notTaken'> {
  const pointIds = protocol.points.map(({ pointId }) => pointId);
  return {
    values: pointIds.flatMap((pointId) =>
      valuesBySide(readings, pointId, protocol.ownPoints).map(({ worn, accepted, rounds }) => ({
        pointId,
        worn,
        valueMm: toMmString(accepted.value),
        uncertaintyMm: toMmString(shownUncertainty(accepted.uncertaintyMm)),
        rounds: accepted.n,
        tapeJoins: accepted.tapeJoins,
        method: rounds.some(({ method }) => method === 'flat-doubled') ? ('flat-doubled' as const) : null,
      })),
    ),
    notTaken: pointIds.flatMap((pointId) =>
      notTakenBySide(readings, pointId).map(({ worn, reason }) => ({ pointId, worn, reason })),
    ),
  };
}

/** What was seen of its state: the label and the fastenings are the record's, whichever sheet told of them. */
function remarkOf(note: StoredTableNote): SheetOfPart['remarks'] {
  if (note.about !== 'described' || (note.thing !== 'condition' && note.thing !== 'remark')) return [];
  const { id, thing, text, byName, saidAt } = note;
  return [{ id, thing, text, byName, saidAt }];
}

function pointsAsked(newestFirst: readonly Protocol[]): PartSheets['points'] {
  const points = newestFirst
    .flatMap(pointsOf)
    .map(({ id, name, how }) => ({ pointId: id, label: name, how }));
  return points.filter(
    ({ pointId }, index) => points.findIndex((earlier) => earlier.pointId === pointId) === index,
  );
}

/** The sheet behind what the public sees now. */
async function publishedSheet(
  tx: Tx,
  { id, isPublic, publishedVersion }: GarmentRow,
  partId: string,
): Promise<PartSheets['published']> {
  if (!isPublic || publishedVersion === null) return null;
  const revision = await tx.findOneBy(RevisionRow, { garmentId: id, publishedVersion });
  const sheet = revision?.snapshot.parts.find((part) => part.id === partId)?.sheet;
  return sheet ? { sheetId: sheet.id, version: publishedVersion } : null;
}
