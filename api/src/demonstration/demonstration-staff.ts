import { randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { Passwords } from '../auth/passwords.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { Work } from '../common/work';
import { newUser, UserRow } from '../users/user.entity';
import type { Demonstration } from './demonstration-data';
import type { Staff } from './demonstration-sheets';

export interface DemonstrationAccount {
  readonly role: string;
  readonly email: string;
  readonly password: string;
}

/** The invented staff. Passwords are random for each installation: there is no default account anywhere. */
@Injectable()
export class DemonstrationStaff {
  constructor(
    private readonly work: Work,
    private readonly passwords: Passwords,
    private readonly clock: Clock,
  ) {}

  async arrive({ people }: Demonstration): Promise<{ staff: Staff; accounts: DemonstrationAccount[] }> {
    const staff = new Map<string, Actor>();
    const accounts: DemonstrationAccount[] = [];
    for (const { key, name, email, roles } of people) {
      const password = randomBytes(12).toString('base64url');
      const passwordHash = await this.passwords.keep(password);
      const user = newUser({ name, email }, roles, passwordHash, this.clock.now());
      await this.work.reader.insert(UserRow, user);
      staff.set(key, { id: user.id, name, email, roles, sessionId: '' });
      accounts.push({ role: roles.join(', '), email, password });
    }
    return { staff, accounts };
  }
}
