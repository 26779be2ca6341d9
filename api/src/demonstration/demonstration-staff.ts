import { randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { v7 as uuidv7 } from 'uuid';
import { Passwords } from '../auth/passwords.service';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { Work } from '../common/work';
import { UserRow } from '../users/user.entity';
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
      const id = uuidv7();
      const password = randomBytes(12).toString('base64url');
      await this.work.reader.insert(UserRow, {
        id,
        email,
        name,
        roles,
        passwordHash: await this.passwords.keep(password),
        active: true,
        version: 1,
        createdAt: this.clock.now(),
        lastSignInAt: null,
      });
      staff.set(key, { id, name, email, roles, sessionId: '' });
      accounts.push({ role: roles.join(', '), email, password });
    }
    return { staff, accounts };
  }
}
