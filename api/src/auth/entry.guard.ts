import { type ExecutionContext, Injectable } from '@nestjs/common';
import { AuthGuard } from '@nestjs/passport';
import { may } from '@ellwand/shared/records/roles';
import type { Request } from 'express';
import type { Actor } from '../common/actor';
import { entryOf } from '../common/entry';
import { forbidden, Refusal } from '../common/refusal';
import { SIGNED_IN } from '../common/requires.decorator';
import { ACCESS } from './access.strategy';
import { SessionCookies } from './session-cookies';

/** Stands at every route: whoever is not let in by its decorator stays out, also where a route says nothing. */
@Injectable()
export class EntryGuard extends AuthGuard(ACCESS) {
  constructor(private readonly cookies: SessionCookies) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const entry = entryOf(context.getHandler(), context.getClass());
    if (entry === 'public') return true;
    if (entry === 'nobody') throw refused();
    await super.canActivate(context);
    const { user } = context.switchToHttp().getRequest<Request & { user: Actor }>();
    if (entry !== SIGNED_IN && !may(user.roles, entry)) throw refused();
    return true;
  }

  /** @throws Refusal 401 that says whether there was a session that has ended, or none at all */
  override handleRequest<TUser>(
    fault: unknown,
    user: TUser,
    _info: unknown,
    context: ExecutionContext,
  ): TUser {
    if (fault instanceof Error) throw fault;
    if (user) return user;
    const request = context.switchToHttp().getRequest<Request>();
    const had = this.cookies.accessToken(request) ?? this.cookies.refreshToken(request);
    throw had
      ? new Refusal(401, 'session.ended', 'Your session has ended; sign in again.')
      : new Refusal(401, 'session.none', 'Sign in first.');
  }
}

const refused = () => forbidden('permission.refused', 'Your roles do not allow this.');
