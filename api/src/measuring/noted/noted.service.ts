import type { NotedAtTable, NotedList, Settlement } from '@ellwand/shared/records/noted';
import { describedLabels } from '@ellwand/shared/records/table-note';
import { Injectable } from '@nestjs/common';
import { In, IsNull } from 'typeorm';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { notFound } from '../../common/refusal';
import { type Tx, Work } from '../../common/work';
import { GarmentRow } from '../../garments/garment.entity';
import { PartRow } from '../../garments/part.entity';
import { SheetRow } from '../sheets/sheet.entity';
import { toStoredNotes } from '../table-notes/stored-note';
import { TableNoteRow } from '../table-notes/table-note.entity';

/** What was described at the table and waits to be laid into the record. The note itself is never changed. */
@Injectable()
export class NotedService {
  constructor(
    private readonly work: Work,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  async list(garmentId: string): Promise<NotedList> {
    const { reader } = this.work;
    if (!(await reader.existsBy(GarmentRow, { id: garmentId }))) throw notFound('garment.unknown', 'garment');
    return listOf(reader, garmentId);
  }

  /** Says what became of a note; whoever was first said it. @returns what still waits of its garment */
  settle(noteId: string, how: Settlement, actor: Actor): Promise<NotedList> {
    return this.work.run(async (tx) => {
      const note = await tx.findOneBy(TableNoteRow, { id: noteId, about: 'described' });
      if (!note) throw notFound('note.unknown', 'note');
      const sheet = await tx.findOneByOrFail(SheetRow, { id: note.sheetId });
      const part = await tx.findOneByOrFail(PartRow, { id: sheet.partId });
      const settled = { settled: how, settledBy: actor.id, settledAt: this.clock.now() };
      const { affected } = await tx.update(TableNoteRow, { id: noteId, settled: IsNull() }, settled);
      if (affected === 1) {
        const [stored] = await toStoredNotes(tx, [note]);
        const thing = stored?.about === 'described' ? describedLabels[stored.thing].toLowerCase() : 'note';
        const became = how === 'laid-in' ? 'laid into the record' : 'set aside';
        await this.audit.note(tx, actor, {
          verb: 'settle',
          subjectKind: 'garment',
          subjectId: part.garmentId,
          summary: `${actor.name} ${became} what was noted of ${part.name} at the table: ${thing}`,
          facts: { note: noteId, how },
        });
      }
      return listOf(tx, part.garmentId);
    });
  }
}

async function listOf(tx: Tx, garmentId: string): Promise<NotedList> {
  const parts = await tx.findBy(PartRow, { garmentId });
  const sheets = await tx.findBy(SheetRow, { partId: In(parts.map(({ id }) => id)) });
  const rows = await tx.find(TableNoteRow, {
    where: { sheetId: In(sheets.map(({ id }) => id)), about: 'described', settled: IsNull() },
    order: { saidAt: 'ASC', id: 'ASC' },
  });
  const stored = await toStoredNotes(tx, rows);
  const items = stored.flatMap((note, index): NotedAtTable[] => {
    const sheet = sheets.find(({ id }) => id === rows[index]?.sheetId);
    const part = parts.find(({ id }) => id === sheet?.partId);
    if (note.about !== 'described' || !sheet || !part) return [];
    const { id, thing, text, byName, saidAt } = note;
    const { measuredOn } = sheet;
    return [{ id, sheetId: sheet.id, measuredOn, partName: part.name, thing, text, byName, saidAt }];
  });
  return { items };
}
