import { GarmentRecord } from '@ellwand/shared/records/garment';
import { toProtocolView } from '@ellwand/shared/records/protocol';
import { supportLabels, supports } from '@ellwand/shared/records/sheet';
import { IsNull } from 'typeorm';
import type { Tx } from '../common/work';
import { GarmentEditor } from '../garments/garment-editor.entity';
import type { GarmentRow } from '../garments/garment.entity';
import { PartRow } from '../garments/part.entity';
import { bodyOf, cutSheetRow } from '../measuring/cut-sheets/cut-sheet-view';
import type { ProtocolBook } from '../measuring/protocols/protocol-book';
import { toStored, trimmedMm } from '../measuring/readings/stored-reading';
import { choiceOf } from '../measuring/part-sheets/choice';
import { peopleOf, readingsOf } from '../measuring/sheets/sheet-view';
import { sheetsOf, speakingOf } from '../measuring/sheets/speaking-sheet';
import { ImageRow } from '../media/image.entity';
import { toImage } from '../media/image-view';
import type { Snapshot, SnapshotPart, SnapshotSheet } from './snapshot';

/** Freezes a garment as it stands: what is reviewed is what is published, whatever happens in between. */
export async function takeSnapshot(tx: Tx, garment: GarmentRow, protocols: ProtocolBook): Promise<Snapshot> {
  const parts = await tx.find(PartRow, { where: { garmentId: garment.id }, order: { position: 'ASC' } });
  const frozen: SnapshotPart[] = [];
  for (const part of parts) {
    frozen.push({
      id: part.id,
      suffix: part.suffix,
      kind: part.kind,
      name: part.name,
      wornTogether: part.wornTogether,
      sheet: await speakingSheet(tx, part, protocols),
      cutSheet: bodyOf(await cutSheetRow(tx, part.id)),
    });
  }
  const images = await tx.find(ImageRow, {
    where: { garmentId: garment.id, deletedAt: IsNull(), state: 'ready' },
    order: { position: 'ASC', id: 'ASC' },
  });
  const editors = await tx.find(GarmentEditor, { where: { garmentId: garment.id } });
  return {
    garmentId: garment.id,
    record: GarmentRecord.parse(garment.record),
    parts: frozen,
    images: images.map(toImage),
    editedBy: editors.map((editor) => editor.userId),
  };
}

async function speakingSheet(tx: Tx, part: PartRow, protocols: ProtocolBook): Promise<SnapshotSheet | null> {
  const sheet = speakingOf(part, await sheetsOf(tx, part.id));
  if (!sheet) return null;
  const support = supports.find((id) => id === sheet.support);
  const readings = await readingsOf(tx, sheet.id);
  return {
    id: sheet.id,
    protocolVersion: sheet.protocolVersion,
    protocol: toProtocolView(await protocols.at(tx, part, sheet.protocolVersion)),
    measuredOn: sheet.measuredOn,
    support: support ? supportLabels[support] : sheet.support,
    tape: sheet.tape,
    tapeLengthMm: trimmedMm(sheet.tapeLengthMm),
    fasteningPair: sheet.fasteningPair,
    people: await peopleOf(tx, sheet.id),
    readings: readings.map(toStored),
    chosen: part.speakingSheetId === sheet.id ? await choiceOf(tx, part) : null,
  };
}
