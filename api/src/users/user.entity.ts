import type { Role } from '@ellwand/shared/records/roles';
import { Column, Entity, PrimaryColumn } from 'typeorm';
import { v7 as uuidv7 } from 'uuid';

@Entity({ name: 'user', database: 'ellwand' })
export class UserRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ type: 'varchar', length: 254 }) email: string;
  @Column({ type: 'varchar', length: 120 }) name: string;
  @Column({ type: 'json' }) roles: Role[];
  /** bcrypt of the pre-hashed password; null until an invitation is accepted. */
  @Column({ name: 'password_hash', type: 'char', length: 60, nullable: true }) passwordHash: string | null;
  @Column({ type: 'boolean' }) active: boolean;
  @Column({ type: 'int', unsigned: true }) version: number;
  @Column({ name: 'created_at', type: 'datetime', precision: 3 }) createdAt: Date;
  @Column({ name: 'last_sign_in_at', type: 'datetime', precision: 3, nullable: true })
  lastSignInAt: Date | null;
}

/** A person as they are on their first day. Addresses are kept in small letters, so that one is one. */
export function newUser(
  { name, email }: { readonly name: string; readonly email: string },
  roles: Role[],
  passwordHash: string,
  now: Date,
): UserRow {
  return {
    id: uuidv7(),
    email: email.toLowerCase(),
    name,
    roles,
    passwordHash,
    active: true,
    version: 1,
    createdAt: now,
    lastSignInAt: null,
  };
}
