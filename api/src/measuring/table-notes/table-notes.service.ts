import { isDeepStrictEqual } from 'node:util';
import type { NewTableNote, TableNoteResults } from '@ellwand/shared/records/table-note';
import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { Refusal } from '../../common/refusal';
import { type Tx, Work } from '../../common/work';
import { UserRow } from '../../users/user.entity';
import { FindingsService } from '../findings/findings.service';
import { SheetEdits, type SheetInHand } from '../sheets/sheet-edits';
import { SheetPersonRow } from '../sheets/sheet-person.entity';
import { SheetRow } from '../sheets/sheet.entity';
import { toStoredNotes } from './stored-note';
import { TableNoteRow } from './table-note.entity';

type Result = TableNoteResults['results'][number];
/** What a note does beside being kept: nothing more, something worth telling, or why it is kept nowhere. */
type Effect =
  { readonly kept: true; readonly detail?: string } | { readonly kept: false; readonly detail: string };

/** Takes in what was said at the table. Each note carries its own id, so that a batch sent twice says nothing twice. */
@Injectable()
export class TableNotesService {
  constructor(
    private readonly work: Work,
    private readonly sheets: SheetEdits,
    private readonly findings: FindingsService,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  takeIn(sheetId: string, notes: readonly NewTableNote[], actor: Actor): Promise<TableNoteResults> {
    return this.work.run(async (tx) => {
      const again = await repeatedBatch(tx, sheetId, notes);
      if (again) return again;
      const inHand = await this.sheets.takeToNote(tx, actor, sheetId);
      const results: Result[] = [];
      for (const note of notes) results.push(await this.takeOne(tx, inHand, note, actor));
      const kept = results.filter(({ outcome }) => outcome === 'kept');
      if (kept.length === 0) return { sheetVersion: inHand.sheet.version, results };
      const { version } = await this.sheets.set(tx, actor, inHand.sheet, {});
      await this.audit.note(tx, actor, {
        verb: 'note',
        subjectKind: 'sheet',
        subjectId: sheetId,
        summary: `${actor.name} noted at the table of ${inHand.part.name}: ${saidIn(notes)}`,
        facts: { notes: kept.map(({ id }) => id) },
      });
      return { sheetVersion: version, results };
    });
  }

  private async takeOne(tx: Tx, inHand: SheetInHand, note: NewTableNote, actor: Actor): Promise<Result> {
    const already = await tx.findOneBy(TableNoteRow, { id: note.id });
    if (already) return repeated(tx, already, inHand.sheet.id, note);
    const effect = saidTooLate(inHand.sheet, note) ?? (await this.effectOf(tx, inHand, note, actor));
    if (!effect.kept) return { id: note.id, outcome: 'refused', detail: effect.detail };
    const row = this.rowOf(inHand.sheet.id, note, actor);
    await tx.insert(TableNoteRow, row);
    const [stored] = await toStoredNotes(tx, [row]);
    return {
      id: note.id,
      outcome: 'kept',
      ...(effect.detail ? { detail: effect.detail } : {}),
      ...(stored ? { note: stored } : {}),
    };
  }

  private effectOf(tx: Tx, inHand: SheetInHand, note: NewTableNote, actor: Actor): Promise<Effect> {
    if (note.about === 'hands') return this.nameHands(tx, inHand, note);
    if (note.about === 'answer') return this.answer(tx, inHand, note, actor);
    return Promise.resolve({ kept: true });
  }

  /** Whoever had their hands at the garment is named on the sheet from then on, also when others take over. */
  private async nameHands(
    tx: Tx,
    inHand: SheetInHand,
    { people }: Extract<NewTableNote, { about: 'hands' }>,
  ): Promise<Effect> {
    const { sheet } = inHand;
    const named = await tx.find(SheetPersonRow, { where: { sheetId: sheet.id } });
    const ids = [...new Set(people.map(({ userId }) => userId))];
    const added = ids.filter((id) => !named.some(({ userId }) => userId === id));
    if ((await tx.countBy(UserRow, { id: In(added), active: true })) !== added.length) {
      return { kept: false, detail: 'It names somebody who does not work here.' };
    }
    const fresh = people.filter(
      ({ userId, duty }) => !named.some((one) => one.userId === userId && one.duty === duty),
    );
    const rows = new Map(
      fresh.map(({ userId, duty }) => [`${userId} ${duty}`, { sheetId: sheet.id, userId, duty }]),
    );
    if (rows.size > 0) await tx.insert(SheetPersonRow, [...rows.values()]);
    await this.sheets.noteHands(tx, inHand, ids);
    return { kept: true };
  }

  /** An answer that comes too late answers nothing; what was said stays all the same. */
  private async answer(
    tx: Tx,
    { sheet }: SheetInHand,
    { key, reason }: Extract<NewTableNote, { about: 'answer' }>,
    actor: Actor,
  ): Promise<Effect> {
    try {
      const answered = await this.findings.answerIfAsked(tx, { sheetId: sheet.id, key, reason }, actor);
      if (answered) return { kept: true };
      return { kept: true, detail: 'That is not asked any more; the readings have changed.' };
    } catch (fault) {
      // One answer that words cannot give must not hold up what else was said.
      if (fault instanceof Refusal) return { kept: false, detail: fault.message };
      throw fault;
    }
  }

  private rowOf(sheetId: string, note: NewTableNote, actor: Actor): TableNoteRow {
    const { id, about, device } = note;
    return {
      ...{ id, sheetId, about, device, body: bodyOf(note) },
      saidAt: new Date(note.saidAt),
      saidBy: actor.id,
      receivedAt: this.clock.now(),
      ...{ settled: null, settledBy: null, settledAt: null },
    };
  }
}

/** A sitting cannot begin on a sheet that was complete by then; whatever else is said of it is kept. */
function saidTooLate({ completedAt }: SheetRow, { about, saidAt }: NewTableNote): Effect | null {
  const opens = about === 'begun' || about === 'hands' || about === 'cautions';
  if (!opens || completedAt === null || new Date(saidAt) <= completedAt) return null;
  return { kept: false, detail: 'This sheet is complete. Open it again to go on.' };
}

const saidWords: Readonly<Record<NewTableNote['about'], string>> = {
  begun: 'a sitting begins',
  paused: 'it is put away for now',
  hands: 'whose hands are at it',
  cautions: 'the cautions were read',
  described: 'what was seen',
  answer: 'an answer to a finding',
};

function saidIn(notes: readonly NewTableNote[]): string {
  return [...new Set(notes.map(({ about }) => saidWords[about]))].join(', ');
}

const carried = ['id', 'about', 'device', 'saidAt'];

/** What was said, without what carried it here. */
function bodyOf(note: NewTableNote): object {
  return Object.fromEntries(Object.entries(note).filter(([field]) => !carried.includes(field)));
}

/** A batch that was kept whole before is answered from what was kept, whatever became of the record since. */
async function repeatedBatch(
  tx: Tx,
  sheetId: string,
  notes: readonly NewTableNote[],
): Promise<TableNoteResults | undefined> {
  const rows = await tx.find(TableNoteRow, { where: { sheetId, id: In(notes.map(({ id }) => id)) } });
  if (rows.length < new Set(notes.map(({ id }) => id)).size) return undefined;
  const byId = new Map(rows.map((row) => [row.id, row]));
  const results: Result[] = [];
  for (const note of notes) {
    const row = byId.get(note.id);
    if (row) results.push(await repeated(tx, row, sheetId, note));
  }
  const { version } = await tx.findOneByOrFail(SheetRow, { id: sheetId });
  return { sheetVersion: version, results };
}

/** The same note again is answered with what was kept; another one under its id is refused. */
async function repeated(tx: Tx, row: TableNoteRow, sheetId: string, note: NewTableNote): Promise<Result> {
  const { id, about } = note;
  if (row.sheetId !== sheetId || row.about !== about || !isDeepStrictEqual(row.body, bodyOf(note))) {
    return { id, outcome: 'refused', detail: 'Something else was said under this id before.' };
  }
  const [stored] = await toStoredNotes(tx, [row]);
  return { id, outcome: 'already-kept', ...(stored ? { note: stored } : {}) };
}
