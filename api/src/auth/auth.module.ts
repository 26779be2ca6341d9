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
import { FirstAdministratorController } from './first-administrator.controller';
import { FirstAdministratorService } from './first-administrator.service';
import { PASSWORD_COST, passwordCost, Passwords } from './passwords.service';
import { RefreshService } from './refresh.service';
import { Secrets } from './secrets';
import { SessionCookies } from './session-cookies';
import { SessionEndService } from './session-end.service';
import { SessionController } from './session.controller';
import { Sessions } from './sessions.service';
import { SignInService } from './sign-in.service';
import { SlowDown } from './slow-down.service';
import { Sweep } from './sweep.service';

/** Signing in, sessions, and the guards at every route, in the order in which they look. */
@Global()
@Module({
  imports: [DiscoveryModule, PassportModule, JwtModule.register({}), throttlerModule],
  controllers: [SessionController, FirstAdministratorController],
  providers: [
    Secrets,
    AccessTokens,
    SessionCookies,
    Sessions,
    AccessStrategy,
    Passwords,
    SlowDown,
    Sweep,
    SignInService,
    RefreshService,
    SessionEndService,
    FirstAdministratorService,
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
