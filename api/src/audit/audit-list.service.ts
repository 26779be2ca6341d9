import { Injectable } from '@nestjs/common';
import { Work } from '../common/work';
import { AuditEntryRow } from './audit-entry.entity';

interface AuditQuery {
  readonly page: number;
  readonly size: number;
  readonly subjectId?: string | undefined;
}

/** Reads the audit trail, latest first. */
@Injectable()
export class AuditListService {
  constructor(private readonly work: Work) {}

  async list({ page, size, subjectId }: AuditQuery) {
    const [rows, total] = await this.work.reader.findAndCount(AuditEntryRow, {
      where: subjectId ? { subjectId } : {},
      // Ids are UUIDv7: within a millisecond they keep the order of writing.
      order: { at: 'DESC', id: 'DESC' },
      skip: (page - 1) * size,
      take: size,
    });
    const items = rows.map(({ id, at, actorName, verb, subjectKind, subjectId: subject, summary }) => ({
      id,
      at: at.toISOString(),
      actor: actorName,
      verb,
      subjectKind,
      subjectId: subject,
      summary,
    }));
    return { total, page, size, items };
  }
}
