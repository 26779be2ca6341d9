import { Injectable, Logger, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Work } from '../common/work';
import { backOffMs } from './back-off';
import type { Letter } from './letter';
import { MailOutboxRow } from './mail-outbox.entity';
import { MailTransport } from './transport';

const lookEveryMs = 1_000;
/** A process that dies while it sends keeps the letter from the others for this long. */
const leaseMs = 60_000;
const oldestMs = 3 * 24 * 3_600_000;

/**
 * Sends what lies in the outbox, at least once. Any number of processes may do so side by side: each claims a letter
 * before it sends it, and the connection to the database is free while the mail server takes its time.
 */
@Injectable()
export class MailDispatcher implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly log = new Logger('mail');
  private timer: NodeJS.Timeout | undefined;
  private underWay: Promise<void> = Promise.resolve();

  constructor(
    private readonly work: Work,
    private readonly clock: Clock,
    private readonly transport: MailTransport,
  ) {}

  onApplicationBootstrap(): void {
    this.timer = setTimeout(() => void this.look(), lookEveryMs);
  }

  async onModuleDestroy(): Promise<void> {
    clearTimeout(this.timer);
    this.timer = undefined;
    await this.underWay;
  }

  /** Sends everything that is due now, and resolves when that is done. */
  dispatchDue(): Promise<void> {
    this.underWay = this.underWay.then(() => this.sendAll());
    return this.underWay;
  }

  private async look(): Promise<void> {
    await this.dispatchDue();
    this.timer &&= setTimeout(() => void this.look(), lookEveryMs);
  }

  private async sendAll(): Promise<void> {
    try {
      for (let row = await this.claim(); row; row = await this.claim()) await this.sendOne(row);
    } catch {
      this.log.warn('The outbox cannot be read just now');
    }
  }

  private claim(): Promise<MailOutboxRow | null> {
    return this.work.run(async (tx) => {
      const now = this.clock.now();
      const row = await tx
        .createQueryBuilder(MailOutboxRow, 'letter')
        .where('letter.sent_at IS NULL AND letter.next_attempt_at <= :now', { now })
        .andWhere('letter.created_at > :oldest', { oldest: new Date(now.getTime() - oldestMs) })
        .orderBy('letter.next_attempt_at')
        .limit(1)
        .setLock('pessimistic_write')
        .setOnLocked('skip_locked')
        .getOne();
      if (!row) return null;
      const attempts = row.attempts + 1;
      const nextAttemptAt = new Date(now.getTime() + leaseMs);
      await tx.update(MailOutboxRow, { id: row.id }, { attempts, nextAttemptAt });
      return { ...row, attempts };
    });
  }

  private async sendOne(row: MailOutboxRow): Promise<void> {
    const letter: Letter = {
      to: row.recipient,
      subject: row.subject,
      text: row.bodyText,
      html: row.bodyHtml,
    };
    try {
      await this.transport.send(row.id, letter);
    } catch (fault) {
      await this.putBack(row, fault);
      return;
    }
    // Its links are secrets of the recipient: once it is sent nobody needs to read it here.
    const sent = { sentAt: this.clock.now(), bodyText: '', bodyHtml: '', lastFault: null };
    await this.work.reader.update(MailOutboxRow, { id: row.id }, sent);
  }

  private async putBack({ id, attempts }: MailOutboxRow, fault: unknown): Promise<void> {
    const lastFault = describe(fault);
    this.log.warn(`Letter ${id} was not taken at attempt ${attempts}: ${lastFault}`);
    const nextAttemptAt = new Date(this.clock.now().getTime() + backOffMs(attempts));
    await this.work.reader.update(MailOutboxRow, { id }, { nextAttemptAt, lastFault });
  }
}

/** Codes only: what a mail server says back often repeats the address. */
function describe(fault: unknown): string {
  if (!(fault instanceof Error)) return 'unknown';
  const code = 'code' in fault ? String(fault.code) : fault.name;
  const answer = 'responseCode' in fault ? ` ${String(fault.responseCode)}` : '';
  return `${code}${answer}`.slice(0, 500);
}
