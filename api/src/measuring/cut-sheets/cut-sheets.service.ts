import { keptCutSheet } from '@ellwand/shared/cut-sheet/keep-lengths';
import type { CutSheet, CutSheetBody, NewCutSheet } from '@ellwand/shared/records/cut-sheet';
import { Injectable } from '@nestjs/common';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { Clock } from '../../common/clock';
import { staleVersion } from '../../common/if-match';
import { notFound } from '../../common/refusal';
import { type Tx, Work } from '../../common/work';
import { GarmentEdits } from '../../garments/garment-edits';
import { PartRow } from '../../garments/part.entity';
import { UserRow } from '../../users/user.entity';
import { bodyOf, cutSheetRow, viewCutSheet } from './cut-sheet-view';
import { CutSheetRow } from './cut-sheet.entity';
import { refuseStrangePattern } from './pattern-picture';

/** What a maker needs of a part. It has a version of its own, for it is written beside the record, not in it. */
@Injectable()
export class CutSheetsService {
  constructor(
    private readonly work: Work,
    private readonly garments: GarmentEdits,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  async read(partId: string): Promise<CutSheet> {
    await partRow(this.work.reader, partId);
    return viewCutSheet(this.work.reader, partId);
  }

  /**
   * Keeps a cut sheet whole. Sending again what is kept already changes nothing, whichever version was seen.
   * @throws Refusal 404, 409 `record.locked`, 412 where somebody wrote in between, 400 for a picture of another garment
   */
  write(partId: string, seen: number, sheet: NewCutSheet, actor: Actor): Promise<CutSheet> {
    const body = keptCutSheet(sheet);
    return this.work.run(async (tx) => {
      const part = await partRow(tx, partId);
      if (same(bodyOf(await cutSheetRow(tx, partId)), body)) return viewCutSheet(tx, partId);
      await this.garments.noteMeasuring(tx, actor, part.garmentId);
      // Asked again now that the garment is locked: the same request may have been under way beside this one.
      const before = await cutSheetRow(tx, partId);
      if (same(bodyOf(before), body)) return viewCutSheet(tx, partId);
      await refuseStale(tx, before, seen);
      await refuseStrangePattern(tx, part.garmentId, body.pattern);
      await this.keep(tx, actor, part, before, body);
      return viewCutSheet(tx, partId);
    });
  }

  private async keep(
    tx: Tx,
    actor: Actor,
    part: PartRow,
    before: CutSheetRow | null,
    body: CutSheetBody,
  ): Promise<void> {
    const version = before?.version ?? 0;
    const next = { body, version: version + 1, updatedAt: this.clock.now(), updatedBy: actor.id };
    if (!before) await tx.insert(CutSheetRow, { partId: part.id, ...next });
    else {
      const { affected } = await tx.update(CutSheetRow, { partId: part.id, version }, next);
      if (affected !== 1) throw staleVersion(version, version + 1, null, null);
    }
    await this.audit.note(tx, actor, {
      verb: 'edit',
      subjectKind: 'part',
      subjectId: part.id,
      summary: `${actor.name} wrote the cut sheet of ${part.name}`,
      facts: { changed: changedSections(bodyOf(before), body), version: next.version },
    });
  }
}

async function partRow(tx: Tx, id: string): Promise<PartRow> {
  const part = await tx.findOne(PartRow, { where: { id } });
  if (!part) throw notFound('part.unknown', 'part');
  return part;
}

async function refuseStale(tx: Tx, row: CutSheetRow | null, seen: number): Promise<void> {
  const current = row?.version ?? 0;
  if (current === seen) return;
  const by = row && (await tx.findOne(UserRow, { where: { id: row.updatedBy } }));
  throw staleVersion(seen, current, by?.name ?? null, row?.updatedAt ?? null);
}

/** Both have been through the schema, which gives the fields their order. */
const same = (one: unknown, other: unknown) => JSON.stringify(one) === JSON.stringify(other);

function changedSections(before: CutSheetBody, after: CutSheetBody): string[] {
  const sections = Object.keys(after) as (keyof CutSheetBody)[];
  return sections.filter((section) => !same(before[section], after[section]));
}
