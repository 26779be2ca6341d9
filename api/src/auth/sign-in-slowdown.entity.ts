import { Column, Entity, PrimaryColumn } from 'typeorm';

/** Failed sign-ins of one account from one address, under a keyed hash of both. */
@Entity({ name: 'sign_in_slowdown', database: 'ellwand' })
export class SignInSlowdown {
  @PrimaryColumn({ name: 'key_hash', type: 'char', length: 64 }) keyHash: string;
  @Column({ type: 'int', unsigned: true }) failures: number;
  @Column({ name: 'last_failed_at', type: 'datetime', precision: 3 }) lastFailedAt: Date;
}
