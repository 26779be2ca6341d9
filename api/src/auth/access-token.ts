import { Inject, Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { z } from 'zod';
import { Clock } from '../common/clock';
import { ENVIRONMENT } from '../common/environment.token';
import { Secrets } from './secrets';

export const accessMinutes = 10;
export const accessAudience = 'ellwand-workroom';

/** What the access token says. Roles are not in it: they are read anew for each request. */
export const AccessClaims = z.object({
  sub: z.uuid(),
  sid: z.uuid(),
  purpose: z.literal('access'),
  exp: z.number().int(),
});
export type AccessClaims = z.infer<typeof AccessClaims>;

/** Makes the short-lived token that each request of the Workroom carries. */
@Injectable()
export class AccessTokens {
  constructor(
    private readonly jwt: JwtService,
    private readonly clock: Clock,
    private readonly secrets: Secrets,
    @Inject(ENVIRONMENT) private readonly environment: { readonly publicUrl: string },
  ) {}

  /** @param notAfter end of the session: a token never outlives it */
  make(userId: string, sessionId: string, notAfter: Date): { token: string; endsAt: Date } {
    const now = this.clock.now().getTime();
    const exp = Math.floor(Math.min(now + accessMinutes * 60_000, notAfter.getTime()) / 1000);
    const claims = { sub: userId, sid: sessionId, purpose: 'access', iat: Math.floor(now / 1000), exp };
    const token = this.jwt.sign(claims, {
      algorithm: 'HS256',
      audience: accessAudience,
      issuer: this.environment.publicUrl,
      secret: this.secrets.key('access-token'),
    });
    return { token, endsAt: new Date(exp * 1000) };
  }
}
