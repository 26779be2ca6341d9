import { Injectable } from '@nestjs/common';
import type { NewSheet, Sheet, SheetFacts } from '@ellwand/shared/records/sheet';
import { In } from 'typeorm';
import { v7 as uuidv7 } from 'uuid';
import type { z } from 'zod';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { conflict, notFound, Refusal } from '../../common/refusal';
import { type Tx, Work } from '../../common/work';
import { GarmentEdits } from '../../garments/garment-edits';
import { PartRow } from '../../garments/part.entity';
import { UserRow } from '../../users/user.entity';
import { workOutAgain } from '../readings/other-tape';
import { FindingsService } from '../findings/findings.service';
import { ProtocolBook } from '../protocols/protocol-book';
import { SheetEdits } from './sheet-edits';
import { SheetPersonRow } from './sheet-person.entity';
import { SheetView } from './sheet-view';
import { SheetRow } from './sheet.entity';

type SheetShown = z.output<typeof Sheet>;

/** Measuring sheets: opened, their facts kept true, completed, opened again. */
@Injectable()
export class SheetsService {
  constructor(
    private readonly work: Work,
    private readonly garments: GarmentEdits,
    private readonly sheets: SheetEdits,
    private readonly view: SheetView,
    private readonly protocols: ProtocolBook,
    private readonly findings: FindingsService,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  read(id: string): Promise<SheetShown> {
    return this.view.of(this.work.reader, id);
  }

  /** Opens a sheet for a part, by the protocol as it stands now. Repeating the request opens one sheet. */
  open(
    partId: string,
    { id = uuidv7(), facts }: z.output<typeof NewSheet>,
    actor: Actor,
  ): Promise<SheetShown> {
    return this.work.run(async (tx) => {
      const part = await tx.findOne(PartRow, { where: { id: partId } });
      if (!part) throw notFound('part.unknown', 'part');
      if (await isOpened(tx, id, partId)) return this.view.of(tx, id);
      refuseFuture(facts.measuredOn, this.clock.now(), '/facts/measuredOn');
      await this.garments.lock(tx, part.garmentId);
      if (facts.purpose === 'record') await this.garments.noteMeasuring(tx, actor, part.garmentId);
      // Asked again now that the garment is locked: the same request may have been under way beside this one.
      if (await isOpened(tx, id, partId)) return this.view.of(tx, id);
      const now = this.clock.now();
      await tx.insert(SheetRow, {
        ...columnsOf(facts),
        id,
        partId,
        protocolVersion: (await this.protocols.current(tx, part)).version,
        state: 'open',
        version: 1,
        createdAt: now,
        createdBy: actor.id,
        updatedAt: now,
        updatedBy: actor.id,
      });
      await namePeople(tx, id, facts.people, '/facts/people');
      await this.note(tx, actor, 'open', id, `${actor.name} opened a measuring sheet for ${part.name}`);
      return this.view.of(tx, id);
    });
  }

  setFacts(id: string, seen: number, facts: SheetFacts, actor: Actor): Promise<SheetShown> {
    return this.work.run(async (tx) => {
      const { sheet, part } = await this.sheets.takeAt(tx, actor, id, seen);
      refuseComplete(sheet);
      refuseFuture(facts.measuredOn, this.clock.now(), '/measuredOn');
      const dropped = await namePeople(tx, id, facts.people, '/people');
      // What was for study is for the record from now on.
      if (facts.purpose === 'record') await this.garments.noteMeasuring(tx, actor, part.garmentId);
      // Whoever held the tape held it, also when the sheet names them no more.
      await this.sheets.noteHands(tx, { sheet, part }, dropped);
      const protocol = await this.protocols.at(tx, part, sheet.protocolVersion);
      const reworked = await workOutAgain(tx, id, protocol, { before: sheet, after: facts });
      await this.sheets.set(tx, actor, sheet, columnsOf(facts));
      await this.audit.note(tx, actor, {
        verb: 'edit',
        subjectKind: 'sheet',
        subjectId: id,
        summary: `${actor.name} changed who, where or how ${part.name} was measured`,
        facts: { named: facts.people.map(({ userId, duty }) => `${duty} ${userId}`), dropped, reworked },
      });
      return this.view.of(tx, id);
    });
  }

  /** Completes a sheet: every point read or given a reason, no stop left open. */
  complete(id: string, seen: number, actor: Actor): Promise<SheetShown> {
    return this.work.run(async (tx) => {
      const { sheet, part } = await this.sheets.takeAt(tx, actor, id, seen);
      refuseComplete(sheet);
      await this.findings.refuseUnfinished(tx, id);
      await this.sheets.set(tx, actor, sheet, { state: 'complete', completedAt: this.clock.now() });
      await this.note(
        tx,
        actor,
        'complete',
        id,
        `${actor.name} completed the measuring sheet of ${part.name}`,
      );
      return this.view.of(tx, id);
    });
  }

  reopen(id: string, seen: number, actor: Actor): Promise<SheetShown> {
    return this.work.run(async (tx) => {
      const { sheet, part } = await this.sheets.takeAt(tx, actor, id, seen);
      if (sheet.state === 'open') throw conflict('sheet.open', 'This sheet is open already.');
      await this.sheets.set(tx, actor, sheet, { state: 'open', completedAt: null });
      await this.note(
        tx,
        actor,
        'reopen',
        id,
        `${actor.name} opened the measuring sheet of ${part.name} again`,
      );
      return this.view.of(tx, id);
    });
  }

  private note(tx: Tx, actor: Actor, verb: string, sheetId: string, summary: string): Promise<void> {
    return this.audit.note(tx, actor, { verb, subjectKind: 'sheet', subjectId: sheetId, summary });
  }
}

/** @throws Refusal 409 where the id was used for a sheet of another part */
async function isOpened(tx: Tx, id: string, partId: string): Promise<boolean> {
  const sheet = await tx.findOne(SheetRow, { where: { id } });
  if (sheet && sheet.partId !== partId)
    throw conflict('sheet.id-used', 'Another sheet was opened under this id.');
  return sheet !== null;
}

function refuseComplete(sheet: SheetRow): void {
  if (sheet.state === 'complete')
    throw conflict('sheet.complete', 'This sheet is complete. Open it again to change it.');
}

/** Today, anywhere on earth: the table may stand east of the server. */
function refuseFuture(day: string, now: Date, pointer: string): void {
  const latest = new Date(now.getTime() + 14 * 3_600_000).toISOString().slice(0, 10);
  if (day <= latest) return;
  const detail = `${day} is still to come: say the day on which it was measured`;
  throw new Refusal(400, 'sheet.future', detail, {}, [{ pointer, detail }]);
}

/** The sheet's own columns; people stand in a table of their own. */
function columnsOf({ people: _people, ...columns }: SheetFacts) {
  return columns;
}

/**
 * Names these people and nobody else. Whoever is named already stays so, also once they have left the museum.
 * @returns who was named before and is no more
 */
async function namePeople(
  tx: Tx,
  sheetId: string,
  people: SheetFacts['people'],
  pointer: string,
): Promise<string[]> {
  const before = await tx.find(SheetPersonRow, { where: { sheetId } });
  const ids = [...new Set(people.map((person) => person.userId))];
  const added = ids.filter((id) => !before.some(({ userId }) => userId === id));
  const known = await tx.countBy(UserRow, { id: In(added), active: true });
  if (known !== added.length) {
    const errors = [{ pointer, detail: 'Name people who work here now' }];
    throw new Refusal(
      400,
      'sheet.unknown-person',
      'The sheet names somebody who does not work here.',
      {},
      errors,
    );
  }
  await tx.delete(SheetPersonRow, { sheetId });
  const once = new Map(people.map(({ userId, duty }) => [`${userId} ${duty}`, { sheetId, userId, duty }]));
  await tx.insert(SheetPersonRow, [...once.values()]);
  return [...new Set(before.map(({ userId }) => userId))].filter((userId) => !ids.includes(userId));
}
