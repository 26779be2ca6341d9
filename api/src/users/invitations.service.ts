import { randomBytes } from 'node:crypto';
import type { Invitation, NewInvitation } from '@ellwand/shared/records/session';
import { Inject, Injectable } from '@nestjs/common';
import { In, IsNull, Not } from 'typeorm';
import { v7 as uuidv7 } from 'uuid';
import { AuditService } from '../audit/audit.service';
import { hashOf } from '../auth/secrets';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { ENVIRONMENT } from '../common/environment.token';
import { conflict, notFound } from '../common/refusal';
import { type Tx, Work } from '../common/work';
import type { Environment } from '../config/environment';
import { MailSender } from '../mail/sender.service';
import { invitationLetter } from '../mail/templates/invitation';
import { invitationView } from './invitation-view';
import { InvitationRow } from './invitation.entity';
import { museumName } from './museum';
import { UserRow } from './user.entity';

const validMs = 7 * 86_400_000;
/** The list is for the people page: invitations of long ago are in the audit trail. */
const longestList = 200;

/** Asks people in by e-mail, and takes invitations back. */
@Injectable()
export class InvitationsService {
  constructor(
    private readonly work: Work,
    private readonly clock: Clock,
    private readonly mail: MailSender,
    private readonly audit: AuditService,
    @Inject(ENVIRONMENT) private readonly environment: Environment,
  ) {}

  async list(): Promise<{ items: Invitation[] }> {
    const { reader } = this.work;
    const rows = await reader.find(InvitationRow, {
      where: { invitedBy: Not(IsNull()) },
      order: { createdAt: 'DESC' },
      take: longestList,
    });
    const inviters = rows.flatMap((row) => row.invitedBy ?? []);
    const people = await reader.find(UserRow, { where: { id: In(inviters) } });
    const names = new Map(people.map((person) => [person.id, person.name]));
    const now = this.clock.now();
    return { items: rows.map((row) => invitationView(row, names.get(row.invitedBy ?? '') ?? '', now)) };
  }

  /** A second invitation to the same address takes the first one's place. */
  invite(wanted: NewInvitation, actor: Actor): Promise<Invitation> {
    const email = wanted.email.toLowerCase();
    const token = randomBytes(32).toString('base64url');
    return this.work.run(async (tx) => {
      if (await tx.exists(UserRow, { where: { email } })) {
        throw conflict('invitation.known', 'Somebody with this address works here already.');
      }
      await this.withdrawOpen(tx, { email });
      const row = this.newRow({ ...wanted, email }, token, actor);
      await tx.insert(InvitationRow, row);
      await this.mail.send(tx, await this.letter(tx, row, token, actor));
      await this.note(tx, actor, 'invite', row, `Invited ${row.name}`);
      return invitationView(row, actor.name, this.clock.now());
    });
  }

  withdraw(id: string, actor: Actor): Promise<void> {
    return this.work.run(async (tx) => {
      const row = await tx.findOne(InvitationRow, { where: { id, invitedBy: Not(IsNull()) } });
      if (!row) throw notFound('invitation.unknown', 'invitation');
      if (!(await this.withdrawOpen(tx, { id }))) {
        throw conflict('invitation.closed', 'It has been accepted or withdrawn already.');
      }
      await this.note(tx, actor, 'withdraw-invitation', row, `Withdrew the invitation of ${row.name}`);
    });
  }

  private async withdrawOpen(tx: Tx, which: { id: string } | { email: string }): Promise<boolean> {
    const open = { ...which, acceptedAt: IsNull(), withdrawnAt: IsNull() };
    const { affected } = await tx.update(InvitationRow, open, { withdrawnAt: this.clock.now() });
    return (affected ?? 0) > 0;
  }

  private newRow(wanted: NewInvitation, token: string, actor: Actor): InvitationRow {
    const now = this.clock.now();
    return {
      id: uuidv7(),
      email: wanted.email,
      name: wanted.name,
      roles: [...new Set(wanted.roles)],
      tokenHash: hashOf(token),
      invitedBy: actor.id,
      createdAt: now,
      expiresAt: new Date(now.getTime() + validMs),
      acceptedAt: null,
      withdrawnAt: null,
    };
  }

  private async letter(tx: Tx, row: InvitationRow, token: string, actor: Actor) {
    return invitationLetter({
      to: row.email,
      name: row.name,
      roles: row.roles,
      expiresAt: row.expiresAt,
      invitedBy: actor.name,
      museum: await museumName(tx),
      link: `${this.environment.publicUrl}/workroom/invitation#${token}`,
    });
  }

  private note(tx: Tx, actor: Actor, verb: string, row: InvitationRow, summary: string): Promise<void> {
    const facts = { roles: row.roles };
    return this.audit.note(tx, actor, {
      verb,
      subjectKind: 'invitation',
      subjectId: row.id,
      summary,
      facts,
    });
  }
}
