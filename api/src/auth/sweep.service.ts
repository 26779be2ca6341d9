import { Injectable, Logger, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { LessThan } from 'typeorm';
import { Clock } from '../common/clock';
import { Work } from '../common/work';
import { SessionRow } from './session.entity';
import { SignInSlowdown } from './sign-in-slowdown.entity';
import { forgottenAfterMs } from './slow-down';

const hourMs = 3_600_000;
/** Sessions that have ended tell when somebody worked, and on what: kept no longer than a question about them may come up. */
export const endedSessionsKeptMs = 30 * 24 * hourMs;

/** Erases what is no longer needed of people, once an hour. */
@Injectable()
export class Sweep implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly log = new Logger('sweep');
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly work: Work,
    private readonly clock: Clock,
  ) {}

  onApplicationBootstrap(): void {
    this.timer = setInterval(() => {
      this.sweep().catch(() =>
        this.log.warn('What is out of date could not be erased; tried again in an hour'),
      );
    }, hourMs);
  }

  onModuleDestroy(): void {
    clearInterval(this.timer);
  }

  async sweep(): Promise<void> {
    const now = this.clock.now().getTime();
    await this.work.reader.delete(SignInSlowdown, {
      lastFailedAt: LessThan(new Date(now - forgottenAfterMs)),
    });
    await this.work.reader.delete(SessionRow, { endsAt: LessThan(new Date(now - endedSessionsKeptMs)) });
  }
}
