import { Body, Controller, Post, Req, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import {
  AcceptInvitationDto,
  InvitationShownDto,
  InvitationTokenDto,
  SessionDto,
} from '../auth/dto/session.dto';
import { sessionShown } from '../auth/opened';
import { SessionCookies } from '../auth/session-cookies';
import { LimitedAs } from '../common/limits';
import { Public } from '../common/public.decorator';
import { AcceptanceService } from './acceptance.service';

/** For whoever holds the link of an invitation. It travels in bodies alone: addresses end up in logs. */
@ApiTags('Session')
@Public()
@LimitedAs('sign-in')
@Controller('invitations')
export class AcceptanceController {
  constructor(
    private readonly acceptance: AcceptanceService,
    private readonly cookies: SessionCookies,
  ) {}

  @Post('look-up')
  @ZodResponse({ status: 200, type: InvitationShownDto })
  show(@Body() { token }: InvitationTokenDto) {
    return this.acceptance.show(token);
  }

  @Post('accept')
  @ZodResponse({ status: 200, type: SessionDto })
  async accept(
    @Body() body: AcceptInvitationDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    const opened = await this.acceptance.accept(body, request.get('user-agent') ?? '');
    this.cookies.give(response, opened.tokens);
    return sessionShown(opened);
  }
}
