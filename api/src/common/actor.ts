import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Role } from '@ellwand/shared/records/roles';
import type { Request } from 'express';

/** Whoever makes the request: read from the session by the guard, never from the body. */
export interface Actor {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly sessionId: string;
}

/** Hands a controller the signed-in person; the guard has made sure there is one. */
export const CurrentActor = createParamDecorator((_: unknown, context: ExecutionContext): Actor => {
  const { user } = context.switchToHttp().getRequest<Request & { user?: Actor }>();
  if (!user) throw new Error('A route that reads the actor must require a permission');
  return user;
});
