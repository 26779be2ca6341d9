import type { AcceptInvitation, InvitationShown } from '@ellwand/shared/records/session';
import { Injectable } from '@nestjs/common';
import { IsNull, MoreThan, Not } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { Opened } from '../auth/opened';
import { refuseCommonPassword } from '../auth/password-rules';
import { Passwords } from '../auth/passwords.service';
import { hashOf } from '../auth/secrets';
import { Sessions } from '../auth/sessions.service';
import { Clock } from '../common/clock';
import { notFound } from '../common/refusal';
import { isDuplicate, type Tx, Work } from '../common/work';
import { InvitationRow } from './invitation.entity';
import { museumName } from './museum';
import { newUser, UserRow } from './user.entity';

/** Lets people in by the link of their invitation, once. Expired, used, withdrawn and made-up links look alike. */
@Injectable()
export class AcceptanceService {
  constructor(
    private readonly work: Work,
    private readonly clock: Clock,
    private readonly passwords: Passwords,
    private readonly sessions: Sessions,
    private readonly audit: AuditService,
  ) {}

  async show(token: string): Promise<InvitationShown> {
    const { reader } = this.work;
    const { email, name, roles } = await this.find(reader, token);
    return { email, name, roles, museum: await museumName(reader) };
  }

  async accept({ token, name, password }: AcceptInvitation, agent: string): Promise<Opened> {
    // Looked at before the half second that bcrypt takes, and again when it is used up.
    const { email } = await this.find(this.work.reader, token);
    refuseCommonPassword(password, { name, email });
    const passwordHash = await this.passwords.keep(password);
    const attempt = this.work.run(async (tx) => {
      const invitation = await this.find(tx, token);
      await this.useUp(tx, token);
      const user = newUser(
        { name, email: invitation.email },
        invitation.roles,
        passwordHash,
        this.clock.now(),
      );
      await tx.insert(UserRow, user);
      await this.audit.note(tx, user, {
        verb: 'accept-invitation',
        subjectKind: 'user',
        subjectId: user.id,
        summary: `${user.name} accepted the invitation`,
        facts: { roles: user.roles },
      });
      return { user, tokens: await this.sessions.open(tx, user.id, agent) };
    });
    // Two links to one address, both followed at once: the first one in is the person.
    return attempt.catch((fault: unknown) => {
      throw isDuplicate(fault) ? unknown() : fault;
    });
  }

  private async find(reader: Tx, token: string): Promise<InvitationRow> {
    const row = await reader.findOne(InvitationRow, { where: this.good(token) });
    if (!row) throw unknown();
    if (await reader.exists(UserRow, { where: { email: row.email } })) throw unknown();
    return row;
  }

  /** Only one of two requests at once finds the link unused. */
  private async useUp(tx: Tx, token: string): Promise<void> {
    const used = await tx.update(InvitationRow, this.good(token), { acceptedAt: this.clock.now() });
    if (used.affected !== 1) throw unknown();
  }

  /** The first administrator's own link, which nobody sent, opens another door. */
  private good(token: string) {
    return {
      tokenHash: hashOf(token),
      invitedBy: Not(IsNull()),
      acceptedAt: IsNull(),
      withdrawnAt: IsNull(),
      expiresAt: MoreThan(this.clock.now()),
    };
  }
}

const unknown = () => notFound('invitation.unknown', 'invitation, or it has been used');
