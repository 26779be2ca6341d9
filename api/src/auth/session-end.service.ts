import { Injectable } from '@nestjs/common';
import { AuditService } from '../audit/audit.service';
import type { Actor } from '../common/actor';
import { Work } from '../common/work';
import { Sessions } from './sessions.service';

/** Signs people out: the cookies are worth nothing afterwards, also where somebody has kept a copy. */
@Injectable()
export class SessionEndService {
  constructor(
    private readonly work: Work,
    private readonly sessions: Sessions,
    private readonly audit: AuditService,
  ) {}

  signOut(actor: Actor): Promise<void> {
    return this.work.run(async (tx) => {
      await this.sessions.end(tx, actor.sessionId);
      await this.audit.note(tx, actor, {
        verb: 'sign-out',
        subjectKind: 'session',
        subjectId: actor.id,
        summary: 'Signed out',
      });
    });
  }
}
