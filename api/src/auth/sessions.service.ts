import { randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { IsNull } from 'typeorm';
import { v7 as uuidv7 } from 'uuid';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { type Tx, Work } from '../common/work';
import { UserRow } from '../users/user.entity';
import { AccessTokens } from './access-token';
import { hashOf } from './secrets';
import type { SessionTokens } from './session-cookies';
import { SessionRow } from './session.entity';

const hourMs = 3_600_000;
/** A session that nobody uses ends after this long, and each one at the latest after a week. */
export const idleMs = 8 * hourMs;
export const longestMs = 7 * 24 * hourMs;

/** Opens and ends sessions, and says who is behind one now. */
@Injectable()
export class Sessions {
  constructor(
    private readonly work: Work,
    private readonly clock: Clock,
    private readonly accessTokens: AccessTokens,
  ) {}

  /** @param agent the browser's own name for itself, shown to the person in a list of sessions */
  async open(tx: Tx, userId: string, agent: string): Promise<SessionTokens> {
    const now = this.clock.now();
    const id = uuidv7();
    const secret = randomBytes(32).toString('base64url');
    const idleEndsAt = new Date(now.getTime() + idleMs);
    const endsAt = new Date(now.getTime() + longestMs);
    await tx.insert(SessionRow, {
      id,
      userId,
      refreshHash: hashOf(secret),
      previousHash: null,
      rotatedAt: null,
      createdAt: now,
      idleEndsAt,
      endsAt,
      revokedAt: null,
      agent: agent.slice(0, 200),
    });
    await tx.update(UserRow, { id: userId }, { lastSignInAt: now });
    return this.tokens(userId, id, secret, idleEndsAt, endsAt);
  }

  tokens(userId: string, id: string, secret: string, idleEndsAt: Date, endsAt: Date): SessionTokens {
    const access = this.accessTokens.make(userId, id, endsAt);
    return {
      accessToken: access.token,
      accessEndsAt: access.endsAt,
      refreshToken: `${id}.${secret}`,
      refreshEndsAt: idleEndsAt,
    };
  }

  async end(tx: Tx, id: string): Promise<void> {
    await tx.update(SessionRow, { id, revokedAt: IsNull() }, { revokedAt: this.clock.now() });
  }

  /** At once: the next request of any of them is refused. */
  async endAllOf(tx: Tx, userId: string): Promise<void> {
    await tx.update(SessionRow, { userId, revokedAt: IsNull() }, { revokedAt: this.clock.now() });
  }

  /** Who is behind a session now; null where it has ended, or the person may no longer work here. */
  async actorOf(sessionId: string, userId: string): Promise<Actor | null> {
    const row = await this.work.reader
      .createQueryBuilder(SessionRow, 'session')
      .innerJoinAndMapOne('session.user', UserRow, 'user', 'user.id = session.user_id')
      .where('session.id = :sessionId AND session.user_id = :userId', { sessionId, userId })
      .getOne();
    return row && this.stands(row) ? actorFrom(row) : null;
  }

  stands(row: SessionRow): boolean {
    const now = this.clock.now();
    return row.revokedAt === null && row.endsAt > now && row.idleEndsAt > now;
  }
}

function actorFrom(row: SessionRow & { user?: UserRow }): Actor | null {
  const { user } = row;
  if (!user?.active) return null;
  return { id: user.id, name: user.name, email: user.email, roles: user.roles, sessionId: row.id };
}
