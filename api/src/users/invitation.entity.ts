import type { Role } from '@ellwand/shared/records/roles';
import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity({ name: 'invitation', database: 'ellwand' })
export class InvitationRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ type: 'varchar', length: 254 }) email: string;
  @Column({ type: 'varchar', length: 120 }) name: string;
  @Column({ type: 'json' }) roles: Role[];
  /** SHA-256 of the link's secret, hex: the secret itself is kept nowhere. */
  @Column({ name: 'token_hash', type: 'char', length: 64 }) tokenHash: string;
  /** Null for the first administrator's own. */
  @Column({ name: 'invited_by', type: 'uuid', nullable: true }) invitedBy: string | null;
  @Column({ name: 'created_at', type: 'datetime', precision: 3 }) createdAt: Date;
  @Column({ name: 'expires_at', type: 'datetime', precision: 3 }) expiresAt: Date;
  @Column({ name: 'accepted_at', type: 'datetime', precision: 3, nullable: true }) acceptedAt: Date | null;
  @Column({ name: 'withdrawn_at', type: 'datetime', precision: 3, nullable: true }) withdrawnAt: Date | null;
}
