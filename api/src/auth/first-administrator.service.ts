import { randomBytes } from 'node:crypto';
import type { FirstAdministrator } from '@ellwand/shared/records/session';
import { Injectable } from '@nestjs/common';
import { IsNull, MoreThan, type EntityManager } from 'typeorm';
import { v7 as uuidv7 } from 'uuid';
import { AuditService } from '../audit/audit.service';
import { Clock } from '../common/clock';
import { notFound } from '../common/refusal';
import { type Tx, Work } from '../common/work';
import { InvitationRow } from '../users/invitation.entity';
import { newUser, UserRow } from '../users/user.entity';
import type { Opened } from './opened';
import { refuseCommonPassword } from './password-rules';
import { Passwords } from './passwords.service';
import { hashOf } from './secrets';
import { Sessions } from './sessions.service';

const dayMs = 86_400_000;
/** Whoever sets up a museum does so this week, or starts it again. */
const validDays = 7;

/**
 * Makes the secret of a one-time address, which replaces any made before.
 * @returns undefined where the house is not empty any more
 */
export async function newFirstToken(tx: EntityManager, now: Date): Promise<string | undefined> {
  if (await tx.exists(UserRow)) return undefined;
  await tx.update(InvitationRow, { invitedBy: IsNull(), withdrawnAt: IsNull() }, { withdrawnAt: now });
  const token = randomBytes(32).toString('base64url');
  await tx.insert(InvitationRow, {
    id: uuidv7(),
    email: '',
    name: '',
    roles: ['administrator'],
    tokenHash: hashOf(token),
    invitedBy: null,
    createdAt: now,
    expiresAt: new Date(now.getTime() + validDays * dayMs),
    acceptedAt: null,
    withdrawnAt: null,
  });
  return token;
}

/** Lets the first administrator into an empty house, once, by the address printed when it was opened. */
@Injectable()
export class FirstAdministratorService {
  constructor(
    private readonly work: Work,
    private readonly clock: Clock,
    private readonly passwords: Passwords,
    private readonly sessions: Sessions,
    private readonly audit: AuditService,
  ) {}

  async enter(first: FirstAdministrator, agent: string): Promise<Opened> {
    if (!(await this.open(this.work.reader, first.token))) throw unknown();
    refuseCommonPassword(first.password, first);
    const passwordHash = await this.passwords.keep(first.password);
    return this.work.run(async (tx) => {
      await this.useUp(tx, first.token);
      const user = newUser(first, ['administrator'], passwordHash, this.clock.now());
      await tx.insert(UserRow, user);
      await this.audit.note(tx, user, {
        verb: 'first-administrator',
        subjectKind: 'user',
        subjectId: user.id,
        summary: 'Became the first administrator',
      });
      return { user, tokens: await this.sessions.open(tx, user.id, agent) };
    });
  }

  private async open(reader: Tx, token: string): Promise<boolean> {
    return (
      (await reader.exists(InvitationRow, { where: this.good(token) })) && !(await reader.exists(UserRow))
    );
  }

  /** Only one of two requests at once finds the token unused. */
  private async useUp(tx: Tx, token: string): Promise<void> {
    const used = await tx.update(InvitationRow, this.good(token), { acceptedAt: this.clock.now() });
    if (used.affected !== 1 || (await tx.exists(UserRow))) throw unknown();
  }

  private good(token: string) {
    return {
      tokenHash: hashOf(token),
      invitedBy: IsNull(),
      acceptedAt: IsNull(),
      withdrawnAt: IsNull(),
      expiresAt: MoreThan(this.clock.now()),
    };
  }
}

const unknown = () => notFound('invitation.unknown', 'invitation, or it has been used');
