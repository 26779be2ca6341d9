import { emptyCutSheet } from '@ellwand/shared/cut-sheet/keep-lengths';
import { roundsRead } from '@ellwand/shared/cut-sheet/rounds-read';
import { type CutSheet, CutSheetBody } from '@ellwand/shared/records/cut-sheet';
import { toReading } from '@ellwand/shared/records/measured';
import { toMmString } from '@ellwand/shared/units/length';
import type { Tx } from '../../common/work';
import { PartRow } from '../../garments/part.entity';
import { UserRow } from '../../users/user.entity';
import { toStored } from '../readings/stored-reading';
import { readingsOf } from '../sheets/sheet-view';
import { sheetsOf, speakingOf } from '../sheets/speaking-sheet';
import { CutSheetRow } from './cut-sheet.entity';

/** A row's content, with what has been added to the shape since it was written. */
export const bodyOf = (row: CutSheetRow | null): CutSheetBody =>
  row ? CutSheetBody.parse(row.body) : emptyCutSheet;

/** The cut sheet of a part, or nothing where nobody has written any. */
export const cutSheetRow = (tx: Tx, partId: string): Promise<CutSheetRow | null> =>
  tx.findOne(CutSheetRow, { where: { partId } });

/** A part's cut sheet beside the rounds that were read on its measuring sheet. */
export async function viewCutSheet(tx: Tx, partId: string): Promise<CutSheet> {
  const row = await cutSheetRow(tx, partId);
  const by = row && (await tx.findOne(UserRow, { where: { id: row.updatedBy } }));
  const part = await tx.findOneByOrFail(PartRow, { id: partId });
  return {
    partId,
    version: row?.version ?? 0,
    body: bodyOf(row),
    rounds: await roundsOf(tx, part),
    updatedAt: row?.updatedAt.toISOString() ?? null,
    updatedBy: by?.name ?? null,
  };
}

/** Those of the sheet that speaks for the part; while none does, of the newest that is open. */
async function roundsOf(tx: Tx, part: PartRow): Promise<CutSheet['rounds']> {
  const sheets = await sheetsOf(tx, part.id);
  const sheet = speakingOf(part, sheets) ?? sheets.find(({ purpose }) => purpose === 'record');
  if (!sheet) return [];
  const readings = (await readingsOf(tx, sheet.id)).map(toStored).map(toReading);
  return roundsRead(readings).map(({ level, label, value }) => ({
    level,
    label,
    valueMm: toMmString(value),
  }));
}
