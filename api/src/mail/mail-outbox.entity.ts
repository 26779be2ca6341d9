import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A letter that was committed together with what it tells of, and is sent afterwards at least once. */
@Entity({ name: 'mail_outbox', database: 'ellwand' })
export class MailOutboxRow {
  /** Also the Message-ID, so that a letter sent twice is seen as one. */
  @PrimaryColumn('uuid') id: string;
  @Column({ type: 'varchar', length: 254 }) recipient: string;
  @Column({ type: 'varchar', length: 300 }) subject: string;
  @Column({ name: 'body_text', type: 'text' }) bodyText: string;
  @Column({ name: 'body_html', type: 'mediumtext' }) bodyHtml: string;
  @Column({ name: 'created_at', type: 'datetime', precision: 3 }) createdAt: Date;
  @Column({ name: 'sent_at', type: 'datetime', precision: 3, nullable: true }) sentAt: Date | null;
  @Column({ type: 'int', unsigned: true }) attempts: number;
  @Column({ name: 'next_attempt_at', type: 'datetime', precision: 3 }) nextAttemptAt: Date;
  @Column({ name: 'last_fault', type: 'varchar', length: 500, nullable: true }) lastFault: string | null;
}
