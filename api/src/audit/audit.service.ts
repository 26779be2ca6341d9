import { Injectable } from '@nestjs/common';
import { v7 as uuidv7 } from 'uuid';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import type { Tx } from '../common/work';
import { AuditEntryRow } from './audit-entry.entity';

/** What an entry tells of: the verb, the thing, one sentence, and the facts behind it. */
export interface AuditNote {
  readonly verb: string;
  readonly subjectKind:
    'garment' | 'part' | 'sheet' | 'reading' | 'protocol' | 'image' | 'user' | 'invitation' | 'session';
  readonly subjectId: string | null;
  readonly summary: string;
  readonly facts?: Readonly<Record<string, string | number | boolean | null | readonly string[]>>;
}

/** Writes the audit trail, in the transaction of the verb it tells of: both stand or neither does. */
@Injectable()
export class AuditService {
  constructor(private readonly clock: Clock) {}

  async note(tx: Tx, actor: Pick<Actor, 'id' | 'name'> | null, note: AuditNote): Promise<void> {
    await tx.insert(AuditEntryRow, {
      id: uuidv7(),
      at: this.clock.now(),
      actorId: actor?.id ?? null,
      actorName: actor?.name ?? null,
      verb: note.verb,
      subjectKind: note.subjectKind,
      subjectId: note.subjectId,
      summary: note.summary.slice(0, 500),
      facts: note.facts ?? {},
    });
  }
}
