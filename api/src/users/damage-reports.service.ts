import { Injectable } from '@nestjs/common';
import type { DamageReports } from '@ellwand/shared/records/noted';
import { In } from 'typeorm';
import { AuditService } from '../audit/audit.service';
import type { Actor } from '../common/actor';
import { Refusal } from '../common/refusal';
import { Work } from '../common/work';
import { DAMAGE_REPORTED_TO, namedForDamage } from './damage-reported-to';
import { SettingRow } from './setting.entity';
import { UserRow } from './user.entity';

/** Who is told of damage seen at the measuring table. */
@Injectable()
export class DamageReportsService {
  constructor(
    private readonly work: Work,
    private readonly audit: AuditService,
  ) {}

  async read(): Promise<DamageReports> {
    return { userIds: await namedForDamage(this.work.reader) };
  }

  /** @throws Refusal 400 where somebody is named who does not work here */
  set({ userIds }: DamageReports, actor: Actor): Promise<DamageReports> {
    const ids = [...new Set(userIds)];
    return this.work.run(async (tx) => {
      const people = await tx.findBy(UserRow, { id: In(ids), active: true });
      if (people.length < ids.length) {
        const errors = [{ pointer: '/userIds', detail: 'Name people who work here now' }];
        throw new Refusal(400, 'setting.unknown-person', 'Somebody named does not work here.', {}, errors);
      }
      await tx
        .createQueryBuilder()
        .insert()
        .into(SettingRow)
        .values({ name: DAMAGE_REPORTED_TO, value: ids })
        .orUpdate(['value'])
        .execute();
      const names = people.length > 0 ? people.map(({ name }) => name).join(', ') : 'every curator';
      await this.audit.note(tx, actor, {
        verb: 'set',
        subjectKind: 'user',
        subjectId: null,
        summary: `${actor.name} set who is told of damage seen at the table: ${names}`,
        facts: { userIds: ids },
      });
      return { userIds: ids };
    });
  }
}
