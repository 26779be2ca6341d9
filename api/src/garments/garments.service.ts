import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { readDate } from '@ellwand/shared/records/edtf-date';
import {
  isSameSuffix,
  type Garment,
  type GarmentRecord,
  type NewGarment,
  type NewPart,
} from '@ellwand/shared/records/garment';
import { v7 as uuidv7 } from 'uuid';
import { AuditEntryRow } from '../audit/audit-entry.entity';
import { AuditService } from '../audit/audit.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { conflict, notFound, Refusal } from '../common/refusal';
import { isDuplicate, type Tx, Work } from '../common/work';
import { dropEmptyCutSheet } from '../measuring/cut-sheets/drop-empty-cut-sheet';
import { SheetRow } from '../measuring/sheets/sheet.entity';
import { GarmentEditor } from './garment-editor.entity';
import { GarmentEdits } from './garment-edits';
import { GarmentView } from './garment-view';
import { GarmentRow } from './garment.entity';
import { PartRow } from './part.entity';

/** Garments and their parts: made, described, taken apart. */
@Injectable()
export class GarmentsService {
  constructor(
    private readonly work: Work,
    private readonly edits: GarmentEdits,
    private readonly view: GarmentView,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  read(id: string): Promise<Garment> {
    return this.view.of(this.work.reader, id);
  }

  /**
   * Makes a garment. A repeated request with the same id answers with the garment that it made.
   * @throws Refusal 422 where another garment was asked for under this id before
   */
  make(made: NewGarment, actor: Actor): Promise<Garment> {
    const id = made.id ?? uuidv7();
    return againIfDuplicate(() => this.insert(id, made, actor));
  }

  private insert(id: string, made: NewGarment, actor: Actor): Promise<Garment> {
    return this.work.run(async (tx) => {
      if (await tx.existsBy(GarmentRow, { id })) {
        await refuseOtherRequest(tx, id, made);
        return this.view.of(tx, id);
      }
      refuseUnreadableDate(made.record, '/record/date');
      await refuseUsedNumber(tx, made.record.ownNumber, id, '/record/ownNumber');
      const now = this.clock.now();
      await tx.insert(GarmentRow, {
        ...columnsOf(made.record),
        id,
        stage: 'draft',
        version: 1,
        isPublic: false,
        createdAt: now,
        createdBy: actor.id,
        updatedAt: now,
        updatedBy: actor.id,
      });
      await tx.insert(GarmentEditor, { garmentId: id, userId: actor.id, editedAt: now });
      for (const [position, part] of made.parts.entries()) await insertPart(tx, id, part, position);
      await this.audit.note(tx, actor, {
        verb: 'make',
        subjectKind: 'garment',
        subjectId: id,
        summary: `${actor.name} made the record of ${made.record.ownNumber}`,
        facts: { asked: fingerprint(made) },
      });
      return this.view.of(tx, id);
    });
  }

  rewrite(id: string, seen: number, record: GarmentRecord, actor: Actor): Promise<Garment> {
    return againIfDuplicate(() => this.update(id, seen, record, actor));
  }

  private update(id: string, seen: number, record: GarmentRecord, actor: Actor): Promise<Garment> {
    return this.work.run(async (tx) => {
      const garment = await this.edits.lockAt(tx, id, seen);
      refuseUnreadableDate(record, '/date');
      await refuseUsedNumber(tx, record.ownNumber, id, '/ownNumber');
      await this.edits.edit(tx, actor, garment, columnsOf(record));
      await this.audit.note(tx, actor, {
        verb: 'edit',
        subjectKind: 'garment',
        subjectId: id,
        summary: `${actor.name} edited the record of ${record.ownNumber}`,
        facts: { fields: changedFields(garment.record, record) },
      });
      return this.view.of(tx, id);
    });
  }

  addPart(id: string, seen: number, part: NewPart, actor: Actor): Promise<Garment> {
    return this.work.run(async (tx) => {
      const garment = await this.edits.edit(tx, actor, await this.edits.lockAt(tx, id, seen), {});
      const parts = await tx.find(PartRow, { where: { garmentId: id } });
      const byThemselves = parts.filter(({ wornTogether }) => !wornTogether);
      if (byThemselves.length >= 12) throw conflict('part.too-many', 'A garment has at most twelve parts.');
      if (parts.some((other) => isSameSuffix(other.suffix, part.suffix))) {
        throw conflict('part.number-used', `Part number "${part.suffix}" is used already on this garment.`);
      }
      const position = Math.max(-1, ...byThemselves.map((other) => other.position)) + 1;
      const partId = await insertPart(tx, id, part, position);
      await this.audit.note(tx, actor, {
        verb: 'add',
        subjectKind: 'part',
        subjectId: partId,
        summary: `${actor.name} added ${part.name} to ${garment.ownNumber}`,
      });
      return this.view.of(tx, id);
    });
  }

  /** Takes away a part that nobody has measured or described the cut of yet. */
  removePart(partId: string, seen: number, actor: Actor): Promise<Garment> {
    return this.work.run(async (tx) => {
      const part = await tx.findOne(PartRow, { where: { id: partId } });
      if (!part) throw notFound('part.unknown', 'part');
      const garment = await this.edits.edit(tx, actor, await this.edits.lockAt(tx, part.garmentId, seen), {});
      if (await tx.existsBy(SheetRow, { partId })) {
        throw conflict('part.measured', `${part.name} has a measuring sheet and cannot be taken away.`);
      }
      await refuseTooFew(tx, part);
      await dropEmptyCutSheet(tx, part);
      await tx.delete(PartRow, { id: partId });
      await this.audit.note(tx, actor, {
        verb: 'remove',
        subjectKind: 'part',
        subjectId: partId,
        summary: `${actor.name} took ${part.name} away from ${garment.ownNumber}`,
      });
      return this.view.of(tx, garment.id);
    });
  }
}

/**
 * Another request was under way beside this one, with the same id or number, and was the first. Asked again, this one
 * finds its own garment there, or refuses a number that is used now.
 */
async function againIfDuplicate<T>(attempt: () => Promise<T>): Promise<T> {
  try {
    return await attempt();
  } catch (fault) {
    if (!isDuplicate(fault)) throw fault;
    return attempt();
  }
}

/** What a request asked for, whatever became of the garment since. */
function fingerprint({ record, parts }: NewGarment): string {
  return createHash('sha256').update(JSON.stringify({ record, parts })).digest('hex');
}

async function refuseOtherRequest(tx: Tx, id: string, made: NewGarment): Promise<void> {
  const entry = await tx.findOneBy(AuditEntryRow, { subjectId: id, verb: 'make' });
  if (!entry || !('asked' in entry.facts) || entry.facts.asked === fingerprint(made)) return;
  throw new Refusal(422, 'garment.id-used', 'Another garment was made under this id before.');
}

/** A garment has a part, and what is laid together as worn are two or more. */
async function refuseTooFew(tx: Tx, part: PartRow): Promise<void> {
  if (part.wornTogether) return;
  const parts = await tx.find(PartRow, { where: { garmentId: part.garmentId } });
  const left = parts.filter(({ id, wornTogether }) => id !== part.id && !wornTogether);
  if (left.length === 0) throw conflict('part.last', 'A garment has at least one part.');
  if (left.length < 2 && parts.some(({ wornTogether }) => wornTogether)) {
    const sentence = `Without ${part.name} nothing is left to lay together as worn: take that away first.`;
    throw conflict('part.worn-together', sentence);
  }
}

/** What lists need stands in columns of its own, always the same as in the record. */
function columnsOf(record: GarmentRecord): Pick<GarmentRow, 'ownNumber' | 'title' | 'kind' | 'record'> {
  return { ownNumber: record.ownNumber, title: record.title, kind: record.kind, record };
}

function refuseUnreadableDate({ date }: GarmentRecord, pointer: string): void {
  if (readDate(date)) return;
  const detail = `Write a year or a span, such as 1885, 1885~ (about) or 1858/1861; “${date}” cannot be read`;
  throw new Refusal(400, 'garment.date', detail, {}, [{ pointer, detail }]);
}

async function refuseUsedNumber(tx: Tx, ownNumber: string, exceptId: string, pointer: string): Promise<void> {
  const other = await tx.findOne(GarmentRow, { where: { ownNumber } });
  if (!other || other.id === exceptId) return;
  const message = `${ownNumber} is the number of “${other.title}” already.`;
  throw new Refusal(409, 'garment.number-used', message, {}, [{ pointer, detail: message }]);
}

async function insertPart(tx: Tx, garmentId: string, part: NewPart, position: number): Promise<string> {
  const id = uuidv7();
  await tx.insert(PartRow, {
    id,
    garmentId,
    suffix: part.suffix,
    kind: part.kind,
    name: part.name,
    position,
  });
  return id;
}

function changedFields(before: GarmentRecord, after: GarmentRecord): string[] {
  const fields = Object.keys(after) as (keyof GarmentRecord)[];
  return fields.filter((field) => JSON.stringify(before[field]) !== JSON.stringify(after[field]));
}
