import type { Role } from '@ellwand/shared/records/roles';
import type { Person, PersonChange } from '@ellwand/shared/records/session';
import { Injectable } from '@nestjs/common';
import { IsNull } from 'typeorm';
import { AuditEntryRow } from '../audit/audit-entry.entity';
import { AuditService } from '../audit/audit.service';
import { Sessions } from '../auth/sessions.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { staleVersion } from '../common/if-match';
import { conflict, notFound } from '../common/refusal';
import { type Tx, Work } from '../common/work';
import { InvitationRow } from './invitation.entity';
import { UserRow } from './user.entity';

interface Page {
  readonly page: number;
  readonly size: number;
}

/** Who works here, as what. */
@Injectable()
export class PeopleService {
  constructor(
    private readonly work: Work,
    private readonly sessions: Sessions,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  async list({ page, size }: Page) {
    const [rows, total] = await this.work.reader.findAndCount(UserRow, {
      order: { active: 'DESC', name: 'ASC', id: 'ASC' },
      skip: (page - 1) * size,
      take: size,
    });
    return { total, page, size, items: rows.map(personView) };
  }

  /** Whoever may be named on a sheet. */
  async colleagues(): Promise<{ items: { id: string; name: string }[] }> {
    const rows = await this.work.reader.find(UserRow, { where: { active: true }, order: { name: 'ASC' } });
    return { items: rows.map(({ id, name }) => ({ id, name })) };
  }

  /** Takes effect with that person's next request; whoever no longer works here is signed out everywhere. */
  change(id: string, seen: number, change: PersonChange, actor: Actor): Promise<Person> {
    return this.work.run(async (tx) => {
      const administrators = await lockAdministrators(tx);
      const row = await tx.findOne(UserRow, { where: { id } });
      if (!row) throw notFound('user.unknown', 'person');
      const changed = { ...row, ...withoutAbsent(change), version: seen + 1 };
      refuseLastAdministrator(administrators, changed);
      const { name, roles, active, version } = changed;
      const set = { name, roles: [...new Set<Role>(roles)], active, version };
      const { affected } = await tx.update(UserRow, { id, version: seen }, set);
      if (affected !== 1) throw await staleSince(tx, row, seen);
      if (!active) await this.sessions.endAllOf(tx, id);
      if (!active || !roles.includes('administrator')) await this.withdrawInvitationsOf(tx, id);
      await this.note(tx, actor, row, set);
      return personView({ ...row, ...set });
    });
  }

  /** Whoever may invite nobody any more leaves no open door behind. */
  private async withdrawInvitationsOf(tx: Tx, id: string): Promise<void> {
    const open = { invitedBy: id, acceptedAt: IsNull(), withdrawnAt: IsNull() };
    await tx.update(InvitationRow, open, { withdrawnAt: this.clock.now() });
  }

  private note(tx: Tx, actor: Actor, before: UserRow, after: Pick<UserRow, 'name' | 'roles' | 'active'>) {
    const left = before.active && !after.active;
    return this.audit.note(tx, actor, {
      verb: left ? 'deactivate-user' : 'change-user',
      subjectKind: 'user',
      subjectId: before.id,
      summary: left ? `${before.name} no longer works here` : `Changed ${after.name}`,
      facts: { rolesBefore: before.roles, roles: after.roles, active: after.active },
    });
  }
}

/** Who changed this person meanwhile, and when, as the audit trail has it. */
async function staleSince(tx: Tx, row: UserRow, seen: number) {
  const last = await tx.findOne(AuditEntryRow, { where: { subjectId: row.id }, order: { at: 'DESC' } });
  return staleVersion(seen, row.version, last?.actorName ?? null, last?.at ?? null);
}

const personView = (row: UserRow): Person => ({
  id: row.id,
  email: row.email,
  name: row.name,
  roles: row.roles,
  active: row.active,
  version: row.version,
  lastSignInAt: row.lastSignInAt?.toISOString() ?? null,
});

/** A field that is not sent stays as it is. */
function withoutAbsent(change: PersonChange): Partial<Pick<UserRow, 'name' | 'roles' | 'active'>> {
  return Object.fromEntries(Object.entries(change).filter(([, value]) => value !== undefined));
}

/** Held until the end of the transaction: two administrators who dismiss one another at once must not both succeed. */
async function lockAdministrators(tx: Tx): Promise<readonly string[]> {
  const rows = await tx.query<{ id: string }[]>(
    `SELECT id FROM ellwand.user WHERE active AND JSON_CONTAINS(roles, '"administrator"') FOR UPDATE`,
  );
  return rows.map((row) => row.id);
}

function refuseLastAdministrator(administrators: readonly string[], changed: UserRow): void {
  const isStill = changed.active && changed.roles.includes('administrator');
  if (!isStill && administrators.every((id) => id === changed.id) && administrators.length > 0) {
    throw conflict(
      'user.last-administrator',
      'Somebody must remain who can invite people: name another first.',
    );
  }
}
