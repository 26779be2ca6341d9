import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity({ name: 'session', database: 'ellwand' })
export class SessionRow {
  @PrimaryColumn('uuid') id: string;
  @Column({ name: 'user_id', type: 'uuid' }) userId: string;
  /** SHA-256 of the refresh token that is good now, hex. */
  @Column({ name: 'refresh_hash', type: 'char', length: 64 }) refreshHash: string;
  /** The one before it: within the grace a second tab may still show it; later it means theft. */
  @Column({ name: 'previous_hash', type: 'char', length: 64, nullable: true }) previousHash: string | null;
  @Column({ name: 'rotated_at', type: 'datetime', precision: 3, nullable: true }) rotatedAt: Date | null;
  @Column({ name: 'created_at', type: 'datetime', precision: 3 }) createdAt: Date;
  @Column({ name: 'idle_ends_at', type: 'datetime', precision: 3 }) idleEndsAt: Date;
  @Column({ name: 'ends_at', type: 'datetime', precision: 3 }) endsAt: Date;
  @Column({ name: 'revoked_at', type: 'datetime', precision: 3, nullable: true }) revokedAt: Date | null;
  @Column({ type: 'varchar', length: 200 }) agent: string;
}
