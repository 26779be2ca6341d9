import { Injectable } from '@nestjs/common';
import type { PartSheets, SpeakingSheet } from '@ellwand/shared/records/part-sheets';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { conflict, notFound } from '../../common/refusal';
import { type Tx, Work } from '../../common/work';
import { GarmentEdits } from '../../garments/garment-edits';
import { PartRow } from '../../garments/part.entity';
import { SheetRow } from '../sheets/sheet.entity';
import { PartSheetsView } from './part-sheets-view';

/** Several sheets of one part over the years, and which of them speaks for it in publication. */
@Injectable()
export class PartSheetsService {
  constructor(
    private readonly work: Work,
    private readonly garments: GarmentEdits,
    private readonly view: PartSheetsView,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  async read(partId: string): Promise<PartSheets> {
    return this.view.of(this.work.reader, await partRow(this.work.reader, partId));
  }

  /** Lets a complete record sheet speak for the part, with a reason; null leaves it to the newest again. */
  choose(
    partId: string,
    seen: number,
    { sheetId, reason }: SpeakingSheet,
    actor: Actor,
  ): Promise<PartSheets> {
    return this.work.run(async (tx) => {
      const { garmentId } = await partRow(tx, partId);
      const garment = await this.garments.edit(
        tx,
        actor,
        await this.garments.lockAt(tx, garmentId, seen),
        {},
      );
      const chosen = sheetId === null ? null : await chosenSheet(tx, sheetId, partId);
      const by = { speakingBecause: reason, speakingBy: actor.id, speakingAt: this.clock.now() };
      const nobody = { speakingBecause: null, speakingBy: null, speakingAt: null };
      await tx.update(PartRow, { id: partId }, { speakingSheetId: sheetId, ...(chosen ? by : nobody) });
      const part = await partRow(tx, partId);
      const what = chosen ? `the sheet of ${chosen.measuredOn}` : 'the newest complete sheet';
      await this.audit.note(tx, actor, {
        verb: 'choose',
        subjectKind: 'part',
        subjectId: partId,
        summary: `${actor.name} lets ${what} speak for ${part.name} of ${garment.ownNumber}: ${reason}`,
        facts: { sheetId, reason },
      });
      return this.view.of(tx, part);
    });
  }
}

async function partRow(tx: Tx, id: string): Promise<PartRow> {
  const part = await tx.findOneBy(PartRow, { id });
  if (!part) throw notFound('part.unknown', 'part');
  return part;
}

/** @throws Refusal 404, 409 where the sheet is open, another part's, or for study */
async function chosenSheet(tx: Tx, sheetId: string, partId: string): Promise<SheetRow> {
  const sheet = await tx.findOneBy(SheetRow, { id: sheetId });
  if (!sheet) throw notFound('sheet.unknown', 'measuring sheet');
  if (sheet.partId !== partId)
    throw conflict('sheet.other-part', 'That sheet is of another part and cannot speak for this one.');
  if (sheet.purpose === 'study')
    throw conflict('sheet.for-study', 'A study sheet never speaks for its part.');
  if (sheet.state === 'open')
    throw conflict('sheet.open', 'An open sheet does not speak for its part yet. Complete it first.');
  return sheet;
}
