import { Inject, Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Request } from 'express';
import { Strategy } from 'passport-jwt';
import type { Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { ENVIRONMENT } from '../common/environment.token';
import { accessAudience, AccessClaims } from './access-token';
import { Secrets } from './secrets';
import { SessionCookies } from './session-cookies';
import { Sessions } from './sessions.service';

export const ACCESS = 'access';

/** The actor, and until when this access token is good. */
export interface SignedIn extends Actor {
  readonly accessEndsAt: Date;
}

/** Reads the access token from its cookie, and looks up at each request whether its session still stands. */
@Injectable()
export class AccessStrategy extends PassportStrategy(Strategy, ACCESS) {
  constructor(
    cookies: SessionCookies,
    secrets: Secrets,
    @Inject(ENVIRONMENT) environment: { readonly publicUrl: string },
    private readonly sessions: Sessions,
    private readonly clock: Clock,
  ) {
    super({
      jwtFromRequest: (request: Request) => cookies.accessToken(request),
      secretOrKey: secrets.key('access-token'),
      algorithms: ['HS256'],
      audience: accessAudience,
      issuer: environment.publicUrl,
      // The end is looked at below, by the same clock that set it.
      ignoreExpiration: true,
    });
  }

  async validate(payload: unknown): Promise<SignedIn | false> {
    const claims = AccessClaims.safeParse(payload);
    if (!claims.success || claims.data.exp * 1000 <= this.clock.now().getTime()) return false;
    const actor = await this.sessions.actorOf(claims.data.sid, claims.data.sub);
    return actor ? { ...actor, accessEndsAt: new Date(claims.data.exp * 1000) } : false;
  }
}
