import type { Role } from '@ellwand/shared/records/roles';
import { Column, Entity, PrimaryColumn } from 'typeorm';

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
