import { Body, Controller, Post, Req, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { LimitedAs } from '../common/limits';
import { Public } from '../common/public.decorator';
import { FirstAdministratorDto, SessionDto } from './dto/session.dto';
import { FirstAdministratorService } from './first-administrator.service';
import { sessionShown } from './opened';
import { SessionCookies } from './session-cookies';

@ApiTags('Session')
@Controller('first-administrator')
export class FirstAdministratorController {
  constructor(
    private readonly first: FirstAdministratorService,
    private readonly cookies: SessionCookies,
  ) {}

  @Post()
  @Public()
  @LimitedAs('sign-in')
  @ZodResponse({ status: 200, type: SessionDto })
  async enter(
    @Body() body: FirstAdministratorDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ) {
    const opened = await this.first.enter(body, request.get('user-agent') ?? '');
    this.cookies.give(response, opened.tokens);
    return sessionShown(opened);
  }
}
