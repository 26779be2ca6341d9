import { createHash } from 'node:crypto';
import { type ExecutionContext, Inject, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import {
  InjectThrottlerStorage,
  ThrottlerGuard,
  ThrottlerModule,
  type ThrottlerStorage,
} from '@nestjs/throttler';
import { entryOf } from './entry';
import { LIMITED_AS, type LimitKind, LIMITS, type Limits } from './limits';

const minuteMs = 60_000;

/** Limits requests per address: one account for each kind of route, not one for each route. */
@Injectable()
export class LimitGuard extends ThrottlerGuard {
  constructor(
    @Inject(LIMITS) limits: Limits,
    @InjectThrottlerStorage() storage: ThrottlerStorage,
    reflector: Reflector,
  ) {
    const limit = (context: ExecutionContext) => limits[kindOf(reflector, context)];
    super({ throttlers: [{ ttl: minuteMs, limit }] }, storage, reflector);
  }

  protected override generateKey(context: ExecutionContext, address: string): string {
    return createHash('sha256')
      .update(`${kindOf(this.reflector, context)} ${address}`)
      .digest('hex');
  }
}

function kindOf(reflector: Reflector, context: ExecutionContext): LimitKind {
  const named = reflector.getAllAndOverride<LimitKind | undefined>(LIMITED_AS, [
    context.getHandler(),
    context.getClass(),
  ]);
  if (named) return named;
  return entryOf(context.getHandler(), context.getClass()) === 'public' ? 'public' : 'workroom';
}

/** Brings the counters (in memory); the limits themselves are the guard's. */
export const throttlerModule = ThrottlerModule.forRoot({ throttlers: [] });
