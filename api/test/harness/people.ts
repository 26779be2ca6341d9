import { type Role, roleLabels } from '@ellwand/shared/records/roles';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { v7 as uuidv7 } from 'uuid';
import { Passwords } from '../../src/auth/passwords.service';
import { Work } from '../../src/common/work';
import { UserRow } from '../../src/users/user.entity';

export interface TestPerson {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly password: string;
}

export const testPassword = 'seven brass hooks and eyes';

/** Puts a person into the house directly, past invitations. Each has an address of its own. */
export async function insertPerson(
  application: NestExpressApplication,
  role: Role | readonly Role[],
  name?: string,
): Promise<TestPerson> {
  const roles = typeof role === 'string' ? [role] : [...role];
  const id = uuidv7();
  const person = {
    id,
    name: name ?? `${roles.map((each) => roleLabels[each]).join(' and ')} ${id.slice(-4)}`,
    email: `${roles[0] ?? 'nobody'}.${id.slice(-12)}@larkmoor.example`,
    roles,
  };
  const passwordHash = await application.get(Passwords).keep(testPassword);
  await application.get(Work).reader.insert(UserRow, {
    ...person,
    passwordHash,
    active: true,
    version: 1,
    createdAt: new Date(),
    lastSignInAt: null,
  });
  return { ...person, password: testPassword };
}
