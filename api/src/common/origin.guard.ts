import { type CanActivate, type ExecutionContext, Inject, Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { ENVIRONMENT } from './environment.token';
import { forbidden } from './refusal';

const readingMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Whether a request changes nothing, whatever it is answered. */
export const isReading = (request: Pick<Request, 'method'>) => readingMethods.has(request.method);

/**
 * Lets a change through only when the browser says that our own pages asked for it. Cookies are SameSite=Strict
 * already; this also stops what shares our site but not our origin, such as another port of this machine.
 */
@Injectable()
export class OriginGuard implements CanActivate {
  private readonly own: string;

  constructor(@Inject(ENVIRONMENT) environment: { readonly publicUrl: string }) {
    this.own = new URL(environment.publicUrl).origin;
  }

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    if (isReading(request) || request.headers.origin === this.own) return true;
    throw forbidden('origin.refused', 'Changes are taken only from this museum’s own pages.');
  }
}
