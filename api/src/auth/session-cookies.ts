import { Inject, Injectable } from '@nestjs/common';
import type { CookieOptions, Request, Response } from 'express';
import { Clock } from '../common/clock';
import { ENVIRONMENT } from '../common/environment.token';

interface CookieNames {
  readonly access: string;
  readonly refresh: string;
}

/** With TLS the browser itself holds the names to this host, to Secure and to the path `/`. */
export const cookieNames = (secure: boolean): CookieNames =>
  secure
    ? { access: '__Host-ellwand-access', refresh: '__Host-ellwand-refresh' }
    : { access: 'ellwand-access', refresh: 'ellwand-refresh' };

export interface SessionTokens {
  readonly accessToken: string;
  readonly accessEndsAt: Date;
  readonly refreshToken: string;
  readonly refreshEndsAt: Date;
}

/** The two cookies of a session: no script can read them, no other site can send them. */
@Injectable()
export class SessionCookies {
  private readonly names: CookieNames;
  private readonly options: CookieOptions;

  constructor(
    @Inject(ENVIRONMENT) environment: { readonly secure: boolean },
    private readonly clock: Clock,
  ) {
    this.names = cookieNames(environment.secure);
    this.options = { httpOnly: true, sameSite: 'strict', secure: environment.secure, path: '/' };
  }

  give(response: Response, tokens: SessionTokens): void {
    const now = this.clock.now().getTime();
    const lasting = (endsAt: Date) => ({ ...this.options, maxAge: Math.max(0, endsAt.getTime() - now) });
    response.cookie(this.names.access, tokens.accessToken, lasting(tokens.accessEndsAt));
    response.cookie(this.names.refresh, tokens.refreshToken, lasting(tokens.refreshEndsAt));
  }

  takeBack(response: Response): void {
    response.clearCookie(this.names.access, this.options);
    response.clearCookie(this.names.refresh, this.options);
  }

  accessToken(request: Request): string | null {
    return this.read(request, this.names.access);
  }

  refreshToken(request: Request): string | null {
    return this.read(request, this.names.refresh);
  }

  private read(request: Request, name: string): string | null {
    const cookies = request.cookies as Readonly<Record<string, unknown>> | undefined;
    const value = cookies?.[name];
    return typeof value === 'string' && value !== '' ? value : null;
  }
}
