import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Refusal } from '../common/refusal';
import { type Tx, Work } from '../common/work';
import { Secrets } from './secrets';
import { SignInSlowdown } from './sign-in-slowdown.entity';
import { forgottenAfterMs, type SlowDownKind, waitAfter } from './slow-down';

/** A try at a password, counted as failed until it has succeeded: a burst at once cannot pass before the first fails. */
export interface CountedTry {
  readonly accountKey: string;
  readonly addressKey: string;
}

/**
 * Slows guessing down for an account *from one address*, and for an address over all accounts. The owner, at
 * another address, is never kept out; and accounts that do not exist are counted just the same.
 */
@Injectable()
export class SlowDown {
  constructor(
    private readonly work: Work,
    private readonly clock: Clock,
    private readonly secrets: Secrets,
  ) {}

  /** @throws Refusal 429 with Retry-After, while a wait is due; the try is then not counted */
  async count(email: string, address: string): Promise<CountedTry> {
    const counted = {
      accountKey: this.key(`account ${email} ${address}`),
      addressKey: this.key(`address ${address}`),
    };
    await this.work.run(async (tx) => {
      await this.countOne(tx, 'address', counted.addressKey);
      await this.countOne(tx, 'account', counted.accountKey);
    });
    return counted;
  }

  /** Forgets the account's failures from there. The address keeps its others: one own account must not wash it clean. */
  async succeeded({ accountKey, addressKey }: CountedTry): Promise<void> {
    await this.work.run(async (tx) => {
      await tx.delete(SignInSlowdown, { keyHash: accountKey });
      await tx.decrement(SignInSlowdown, { keyHash: addressKey }, 'failures', 1);
    });
  }

  private async countOne(tx: Tx, kind: SlowDownKind, keyHash: string): Promise<void> {
    const now = this.clock.now();
    // Makes the row before it is read: two first tries at once would else both find none. The update that changes
    // nothing locks the row for writing at once; INSERT IGNORE takes a shared lock first, and two of those deadlock.
    await tx
      .createQueryBuilder()
      .insert()
      .into(SignInSlowdown)
      .values({ keyHash, failures: 0, lastFailedAt: now })
      .orUpdate(['key_hash'], ['key_hash'])
      .execute();
    const row = await tx.findOneOrFail(SignInSlowdown, {
      where: { keyHash },
      lock: { mode: 'pessimistic_write' },
    });
    const sinceMs = now.getTime() - row.lastFailedAt.getTime();
    const failures = sinceMs > forgottenAfterMs ? 0 : row.failures;
    const leftMs = waitAfter(kind, failures) - sinceMs;
    if (leftMs > 0) throw tooSoon(Math.ceil(leftMs / 1000));
    await tx.update(SignInSlowdown, { keyHash }, { failures: failures + 1, lastFailedAt: now });
  }

  private key(text: string): string {
    return Buffer.from(this.secrets.mac('slow-down', text), 'base64url').toString('hex');
  }
}

function tooSoon(seconds: number): Refusal {
  const wait = seconds < 90 ? `${seconds} seconds` : `${Math.ceil(seconds / 60)} minutes`;
  const headers = { 'Retry-After': String(seconds) };
  return new Refusal(429, 'sign-in.too-soon', `Too many tries; wait ${wait}.`, { seconds }, [], headers);
}
