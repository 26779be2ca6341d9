import { Injectable } from '@nestjs/common';
import { AuditService } from '../audit/audit.service';
import { Clock } from '../common/clock';
import { Refusal } from '../common/refusal';
import { type Tx, Work } from '../common/work';
import { UserRow } from '../users/user.entity';
import type { Opened } from './opened';
import { isAncestor } from './refresh-chain';
import { hashOf, Secrets } from './secrets';
import { SessionRow } from './session.entity';
import { idleMs, Sessions } from './sessions.service';

/** A second tab, or a client whose answer was lost, may show the token before for this long. */
export const graceMs = 30_000;

/** Renews sessions: each refresh token is good once. Shown again later it has been stolen, and the session ends. */
@Injectable()
export class RefreshService {
  constructor(
    private readonly work: Work,
    private readonly clock: Clock,
    private readonly secrets: Secrets,
    private readonly sessions: Sessions,
    private readonly audit: AuditService,
  ) {}

  /** @throws Refusal 401 `session.ended` */
  async refresh(token: string): Promise<Opened> {
    const [, id, secret] = /^([0-9a-f-]{36})\.([\w-]{43})$/.exec(token) ?? [];
    if (!id || !secret) throw ended();
    // What is found stolen must stay ended: the refusal is thrown after the transaction, not out of it.
    const opened = await this.work.run((tx) => this.renew(tx, id, secret));
    if (!opened) throw ended();
    return opened;
  }

  private async renew(tx: Tx, id: string, secret: string): Promise<Opened | undefined> {
    const row = await tx.findOne(SessionRow, { where: { id }, lock: { mode: 'pessimistic_write' } });
    if (!row || !this.sessions.stands(row)) return undefined;
    const user = await tx.findOne(UserRow, { where: { id: row.userId, active: true } });
    if (!user) return undefined;
    const shown = hashOf(secret);
    const next = this.successor(secret);
    if (shown === row.refreshHash) return this.rotate(tx, row, user, next);
    if (shown === row.previousHash && this.withinGrace(row)) {
      return { user, tokens: this.sessions.tokens(user.id, id, next, row.idleEndsAt, row.endsAt) };
    }
    if (isAncestor(secret, row.refreshHash, this.successor)) await this.endStolen(tx, row, user);
    return undefined;
  }

  private async rotate(tx: Tx, row: SessionRow, user: UserRow, next: string): Promise<Opened> {
    const now = this.clock.now();
    const idleEndsAt = new Date(Math.min(now.getTime() + idleMs, row.endsAt.getTime()));
    await tx.update(
      SessionRow,
      { id: row.id },
      { refreshHash: hashOf(next), previousHash: row.refreshHash, rotatedAt: now, idleEndsAt },
    );
    return { user, tokens: this.sessions.tokens(user.id, row.id, next, idleEndsAt, row.endsAt) };
  }

  private async endStolen(tx: Tx, row: SessionRow, user: UserRow): Promise<void> {
    await this.sessions.end(tx, row.id);
    await this.audit.note(tx, user, {
      verb: 'session-stolen',
      subjectKind: 'session',
      subjectId: user.id,
      summary: 'A refresh token was shown a second time; the session was ended',
    });
  }

  private withinGrace({ rotatedAt }: SessionRow): boolean {
    return rotatedAt !== null && this.clock.now().getTime() - rotatedAt.getTime() <= graceMs;
  }

  private readonly successor = (secret: string): string => this.secrets.mac('refresh-successor', secret);
}

const ended = () => new Refusal(401, 'session.ended', 'Your session has ended; sign in again.');
