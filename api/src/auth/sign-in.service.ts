import { Injectable } from '@nestjs/common';
import type { SignIn } from '@ellwand/shared/records/session';
import { AuditService } from '../audit/audit.service';
import { Refusal } from '../common/refusal';
import { Work } from '../common/work';
import { UserRow } from '../users/user.entity';
import { Passwords } from './passwords.service';
import type { Opened } from './opened';
import { Sessions } from './sessions.service';
import { SlowDown } from './slow-down.service';

/** Where a sign-in comes from. */
export interface Caller {
  /** See `addressOf`. */
  readonly address: string;
  /** The browser's own name for itself. */
  readonly agent: string;
}

/** Lets people in by address and password. Who does not exist, and whose password is wrong, look alike. */
@Injectable()
export class SignInService {
  constructor(
    private readonly work: Work,
    private readonly passwords: Passwords,
    private readonly sessions: Sessions,
    private readonly slowDown: SlowDown,
    private readonly audit: AuditService,
  ) {}

  async signIn({ email: typed, password }: SignIn, caller: Caller): Promise<Opened> {
    const email = typed.toLowerCase();
    const counted = await this.slowDown.count(email, caller.address);
    const fits = await this.passwords.fits(password, await this.keptHash(email));
    const known = fits ? await this.work.reader.findOne(UserRow, { where: { email, active: true } }) : null;
    if (!known) {
      throw new Refusal(401, 'sign-in.refused', 'This address and this password do not belong together.');
    }
    await this.slowDown.succeeded(counted);
    return this.open(known, caller);
  }

  /**
   * The hash that is kept for an address, or null. The answer is one row of one column in either case: to build
   * a whole person only where there is one took measurably longer.
   */
  private async keptHash(email: string): Promise<string | null> {
    const rows: { hash: string | null }[] = await this.work.reader.query(
      `SELECT person.password_hash AS hash FROM (SELECT 1) AS always
         LEFT JOIN ellwand.user AS person ON person.email = ? AND person.active`,
      [email],
    );
    return rows[0]?.hash ?? null;
  }

  private open(user: UserRow, caller: Caller): Promise<Opened> {
    return this.work.run(async (tx) => {
      const tokens = await this.sessions.open(tx, user.id, caller.agent);
      await this.audit.note(tx, user, {
        verb: 'sign-in',
        subjectKind: 'session',
        subjectId: user.id,
        summary: 'Signed in',
      });
      return { user, tokens };
    });
  }
}
