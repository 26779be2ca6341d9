import { Injectable } from '@nestjs/common';
import { v7 as uuidv7 } from 'uuid';
import { Clock } from '../common/clock';
import type { Tx } from '../common/work';
import { Letter } from './letter';
import { MailOutboxRow } from './mail-outbox.entity';

/** Puts letters into the outbox, in the transaction of what they tell of: both stand or neither does. */
@Injectable()
export class MailSender {
  constructor(private readonly clock: Clock) {}

  /** @throws ZodError where the recipient is not exactly one address, or the subject more than one line */
  async send(tx: Tx, letter: Letter): Promise<void> {
    const { to, subject, text, html } = Letter.parse(letter);
    const now = this.clock.now();
    await tx.insert(MailOutboxRow, {
      id: uuidv7(),
      recipient: to,
      subject,
      bodyText: text,
      bodyHtml: html,
      createdAt: now,
      sentAt: null,
      attempts: 0,
      nextAttemptAt: now,
      lastFault: null,
    });
  }
}
