import { Injectable } from '@nestjs/common';
import { IsNull, LessThan } from 'typeorm';
import { Clock } from '../../common/clock';
import { Work } from '../../common/work';
import { ImageRow } from '../image.entity';

/** A maker that has not been heard of for so long is dead, and another may go on with its picture. */
const leaseMs = 15_000;
const renewEveryMs = 5_000;

/** Which process makes which picture's forms: a lease on the picture's own row. */
@Injectable()
export class FormsClaims {
  constructor(
    private readonly work: Work,
    private readonly clock: Clock,
  ) {}

  /** The oldest picture that waits and that nobody holds; rows another process is just claiming are passed over. */
  async claim(): Promise<ImageRow | null> {
    return this.work.run(async (tx) => {
      const waiting = (['received', 'making'] as const).flatMap((state) => [
        { state, deletedAt: IsNull(), claimedUntil: IsNull() },
        { state, deletedAt: IsNull(), claimedUntil: LessThan(this.clock.now()) },
      ]);
      const row = await tx.findOne(ImageRow, {
        where: waiting,
        order: { createdAt: 'ASC' },
        lock: { mode: 'pessimistic_write', onLocked: 'skip_locked' },
      });
      if (row) await tx.update(ImageRow, { id: row.id }, { state: 'making', claimedUntil: this.leaseEnd() });
      return row && { ...row, state: 'making' };
    });
  }

  /** Counts a form as made. @returns false where it had been counted already or the picture is gone */
  async count(id: string, made: number): Promise<boolean> {
    const before = { id, state: 'making', formsMade: made, deletedAt: IsNull() } as const;
    const { affected } = await this.work.reader.update(ImageRow, before, {
      formsMade: made + 1,
      claimedUntil: this.leaseEnd(),
    });
    return affected === 1;
  }

  keepRenewing(id: string): NodeJS.Timeout {
    const renew = () =>
      this.work.reader
        .update(ImageRow, { id, state: 'making' }, { claimedUntil: this.leaseEnd() })
        .catch(() => undefined);
    const timer = setInterval(() => void renew(), renewEveryMs);
    return timer.unref();
  }

  async release(id: string): Promise<void> {
    await this.work.reader.update(ImageRow, { id }, { claimedUntil: null });
  }

  private leaseEnd(): Date {
    return new Date(this.clock.now().getTime() + leaseMs);
  }
}
