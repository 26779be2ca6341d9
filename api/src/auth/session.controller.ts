import { Body, Controller, Delete, Get, HttpCode, Post, Req, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../common/actor';
import { LimitedAs } from '../common/limits';
import { Public } from '../common/public.decorator';
import { Refusal } from '../common/refusal';
import { Requires, SIGNED_IN } from '../common/requires.decorator';
import type { SignedIn } from './access.strategy';
import { addressOf } from './address-of';
import { SessionDto, SignInDto } from './dto/session.dto';
import { sessionShown } from './opened';
import { RefreshService } from './refresh.service';
import { SessionCookies } from './session-cookies';
import { SessionEndService } from './session-end.service';
import { SignInService } from './sign-in.service';

@ApiTags('Session')
@Controller('session')
export class SessionController {
  constructor(
    private readonly signIns: SignInService,
    private readonly refreshes: RefreshService,
    private readonly ends: SessionEndService,
    private readonly cookies: SessionCookies,
  ) {}

  @Post()
  @Public()
  @LimitedAs('sign-in')
  @ZodResponse({ status: 200, type: SessionDto })
  async signIn(
    @Body() signIn: SignInDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    const opened = await this.signIns.signIn(signIn, callerOf(request));
    this.cookies.give(response, opened.tokens);
    return sessionShown(opened);
  }

  @Get()
  @Requires(SIGNED_IN)
  @ZodResponse({ status: 200, type: SessionDto })
  show(@CurrentActor() { id, name, email, roles, accessEndsAt }: SignedIn) {
    return { user: { id, name, email, roles: [...roles] }, accessEndsAt: accessEndsAt.toISOString() };
  }

  @Post('refresh')
  @Public()
  @LimitedAs('workroom')
  @ZodResponse({ status: 200, type: SessionDto })
  async refresh(@Req() request: Request, @Res({ passthrough: true }) response: Response) {
    const token = this.cookies.refreshToken(request);
    if (!token) throw new Refusal(401, 'session.none', 'Sign in first.');
    const opened = await this.refreshes.refresh(token);
    this.cookies.give(response, opened.tokens);
    return sessionShown(opened);
  }

  @Delete()
  @Requires(SIGNED_IN)
  @HttpCode(204)
  async signOut(@CurrentActor() actor: Actor, @Res({ passthrough: true }) response: Response): Promise<void> {
    await this.ends.signOut(actor);
    this.cookies.takeBack(response);
  }
}

export const callerOf = (request: Request) => ({
  address: addressOf(request),
  agent: request.get('user-agent') ?? '',
});
