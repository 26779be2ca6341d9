import { Global, Module } from '@nestjs/common';
import { APP_GUARD, DiscoveryModule } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { DiskFloorGuard } from '../common/disk-floor.guard';
import { LimitGuard, throttlerModule } from '../common/limit.guard';
import { OriginGuard } from '../common/origin.guard';
import { AccessTokens } from './access-token';
import { AccessStrategy } from './access.strategy';
import { EntryGuard } from './entry.guard';
import { EveryRouteDecided } from './every-route-decided';
import { PASSWORD_COST, passwordCost, Passwords } from './passwords.service';
import { Secrets } from './secrets';
import { SessionCookies } from './session-cookies';
import { Sessions } from './sessions.service';

/** Signing in, sessions, and the guards at every route, in the order in which they look. */
@Global()
@Module({
  imports: [DiscoveryModule, PassportModule, JwtModule.register({}), throttlerModule],
  providers: [
    Secrets,
    AccessTokens,
    SessionCookies,
    Sessions,
    AccessStrategy,
    Passwords,
    { provide: PASSWORD_COST, useValue: passwordCost },
    { provide: APP_GUARD, useClass: LimitGuard },
    { provide: APP_GUARD, useClass: OriginGuard },
    { provide: APP_GUARD, useClass: EntryGuard },
    { provide: APP_GUARD, useClass: DiskFloorGuard },
    EveryRouteDecided,
  ],
  exports: [Sessions, SessionCookies, Passwords, Secrets],
})
export class AuthModule {}
