import { protocolPointIds } from '@ellwand/shared/protocols/protocol';
import type { Sheet } from '@ellwand/shared/records/sheet';
import { Injectable } from '@nestjs/common';
import type { z } from 'zod';
import { AuditService } from '../../audit/audit.service';
import type { Actor } from '../../common/actor';
import { conflict } from '../../common/refusal';
import { Work } from '../../common/work';
import { ReadingRow } from '../readings/reading.entity';
import { SheetEdits } from '../sheets/sheet-edits';
import { SheetView } from '../sheets/sheet-view';
import { ProtocolBook } from './protocol-book';

/** A sheet keeps the protocol it was opened with, unless nothing has been read on it yet. */
@Injectable()
export class SheetProtocolService {
  constructor(
    private readonly work: Work,
    private readonly sheets: SheetEdits,
    private readonly view: SheetView,
    private readonly protocols: ProtocolBook,
    private readonly audit: AuditService,
  ) {}

  /** Moves an open sheet without readings to the newest version. @throws Refusal 409 where it may not */
  takeNewest(id: string, seen: number, actor: Actor): Promise<z.output<typeof Sheet>> {
    return this.work.run(async (tx) => {
      const { sheet, part } = await this.sheets.takeAt(tx, actor, id, seen);
      if (sheet.state === 'complete')
        throw conflict('sheet.complete', 'This sheet is complete. Open it again to change it.');
      if (await tx.existsBy(ReadingRow, { sheetId: id })) {
        throw conflict(
          'sheet.has-readings',
          `Readings were taken by version ${sheet.protocolVersion} of the protocol, so the sheet keeps it.`,
        );
      }
      const newest = await this.protocols.current(tx, part);
      if (newest.version === sheet.protocolVersion) return this.view.of(tx, id);
      const asked = protocolPointIds(newest);
      await this.sheets.set(tx, actor, sheet, {
        protocolVersion: newest.version,
        repeatPoints: sheet.repeatPoints.filter((pointId) => asked.includes(pointId)),
      });
      await this.audit.note(tx, actor, {
        verb: 'edit',
        subjectKind: 'sheet',
        subjectId: id,
        summary: `${actor.name} moved the measuring sheet of ${part.name} to version ${newest.version} of its protocol`,
        facts: { before: sheet.protocolVersion, after: newest.version },
      });
      return this.view.of(tx, id);
    });
  }
}
